import type { ShopScope } from '../platform/database/database.js';
import { SessionEntity, type EndReason, type SessionRow } from './session.entity.js';

const running = `
  SELECT s.id AS "sessionId", p.id, p.name, p.email, p.role, p.dialect,
    h.name AS "shopName", h.dialect AS "shopDialect", h.demo AS "shopDemo"
  FROM sessions s
  JOIN people p ON p.id = s.person_id
  JOIN shops h ON h.id = s.shop_id
  WHERE s.id = ANY ($1::uuid[]) AND s.shop_id = $2 AND s.ended_at IS NULL AND s.expires_at > now()
    AND p.locked_at IS NULL`;

/** The sessions of one shop's people. */
export class SessionsRepository {
  constructor(private readonly scope: ShopScope) {}

  /** Those of the sessions that still run, whose people are not locked out: one query by primary keys. */
  async running(ids: readonly string[]): Promise<SessionRow[]> {
    return this.scope.prepared('running-sessions', running, [ids, this.scope.shopId]);
  }

  /** The session, its row locked, so that one token is renewed once. */
  async lock(id: string): Promise<SessionEntity | null> {
    return this.scope.manager.findOne(SessionEntity, {
      where: { id, shopId: this.scope.shopId },
      lock: { mode: 'pessimistic_write' },
    });
  }

  async insert(session: Pick<SessionEntity, 'id' | 'personId' | 'tokenHash' | 'expiresAt'>): Promise<void> {
    await this.scope.manager.insert(SessionEntity, {
      ...session,
      shopId: this.scope.shopId,
      renewedAt: new Date(),
    });
  }

  async renew(id: string, tokenHash: string, expiresAt: Date): Promise<void> {
    const next = { tokenHash, expiresAt, renewedAt: new Date() };
    await this.scope.manager.update(SessionEntity, { id, shopId: this.scope.shopId }, next);
  }

  async end(id: string, endReason: EndReason): Promise<void> {
    const { shopId, manager } = this.scope;
    await manager
      .createQueryBuilder()
      .update(SessionEntity)
      .set({ endedAt: new Date(), endReason })
      .where('id = :id AND shop_id = :shopId AND ended_at IS NULL', { id, shopId })
      .execute();
  }
}
