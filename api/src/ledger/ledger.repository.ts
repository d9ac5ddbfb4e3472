import { LessThan } from 'typeorm';
import type { ShopScope } from '../platform/database/database.js';
import { LedgerLineEntity } from './ledger-line.entity.js';

/** The ledgers of one shop's sheets. */
export class LedgerRepository {
  constructor(private readonly scope: ShopScope) {}

  async last(sheetId: string): Promise<Pick<LedgerLineEntity, 'seq' | 'hash'> | null> {
    const { shopId, manager } = this.scope;
    const rows: { seq: number; hash: string }[] = await manager.query(
      `SELECT seq, hash FROM ledger_lines WHERE sheet_id = $1 AND shop_id = $2 ORDER BY seq DESC LIMIT 1`,
      [sheetId, shopId],
    );
    return rows[0] ?? null;
  }

  async insertAll(lines: readonly Omit<LedgerLineEntity, 'shopId'>[]): Promise<void> {
    const { shopId, manager } = this.scope;
    await manager.insert(
      LedgerLineEntity,
      lines.map((line) => ({ ...line, shopId })),
    );
  }

  /** From the first line on. */
  async all(sheetId: string): Promise<LedgerLineEntity[]> {
    const { shopId, manager } = this.scope;
    return manager.find(LedgerLineEntity, { where: { sheetId, shopId }, order: { seq: 'ASC' } });
  }

  /** Newest first, older than `before` where it is given. */
  async newest(sheetId: string, before: number | null, limit: number): Promise<LedgerLineEntity[]> {
    const { shopId, manager } = this.scope;
    return manager.find(LedgerLineEntity, {
      where: { sheetId, shopId, ...(before !== null && { seq: LessThan(before) }) },
      order: { seq: 'DESC' },
      take: limit,
    });
  }
}
