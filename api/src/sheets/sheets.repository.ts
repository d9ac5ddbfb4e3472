import type { SheetState } from '@second-spanner/shared/contracts/sheets';
import type { ShopScope } from '../platform/database/database.js';
import type { Paging } from '../platform/validation/paging.js';
import type { SheetContent } from './sheet-content.js';
import { SheetEntity, type LockedSheetRow, type SheetRow, type WholeSheetRow } from './sheet.entity.js';

const name = (alias: string): string =>
  `json_build_object('id', ${alias}.id, 'name', ${alias}.name, 'role', ${alias}.role)`;

const columns = `
  s.id, s.code, s.state, s.version, s.car_id AS "carId", c.name AS "carName", c.engine_code AS "engineCode",
  e.edition AS "specEdition", ${name('b')} AS builder, ${name('k')} AS countersigner,
  s.steps_done AS "stepsDone", s.steps_total AS "stepsTotal", s.open_snags AS "openSnags",
  s.next_step AS "nextStep", s.changed_at AS "changedAt"`;

const wholeColumns = `
  ${columns}, s.sign_round AS "signRound", c.engine_number AS "engineNumber",
  coalesce(o.name, c.owner_name) AS "ownerName", e.spec_id AS "specId", p.title AS "specTitle",
  e.id AS "specEditionId", e.hash AS "specHash", s.content_hash AS "contentHash",
  s.verification_code AS "verificationCode", s.stages,
  (SELECT coalesce(json_agg(json_build_object('meaning', g.meaning, 'person', ${name('r')}, 'at', g.at,
      'binding', g.binding, 'contentHash', g.content_hash) ORDER BY g.at, g.meaning), '[]')
    FROM signatures g JOIN people r ON r.id = g.person_id
    WHERE g.sheet_id = s.id AND g.sign_round = s.sign_round) AS signatures`;

const beside = `
  JOIN cars c ON c.id = s.car_id
  JOIN people b ON b.id = s.builder_id
  JOIN people k ON k.id = s.countersigner_id
  JOIN spec_editions e ON e.id = s.spec_edition_id`;

const visible = 's.shop_id = $1 AND ($2::uuid IS NULL OR c.owner_id = $2)';

export interface SheetFilter {
  readonly state: SheetState | null;
  readonly carId: string | null;
}

/** The sheets of one shop, or of one owner's cars in it. */
export class SheetsRepository {
  constructor(
    private readonly scope: ShopScope,
    private readonly ownerId: string | null = null,
  ) {}

  /** One row more than the page holds, newest change first. */
  async list({ state, carId }: SheetFilter, { after, limit }: Paging): Promise<SheetRow[]> {
    const [changedAt = null, id = null] = after ?? [];
    return this.scope.manager.query(
      `SELECT ${columns}
       FROM (
         SELECT s.* FROM sheets s
         WHERE s.shop_id = $1
           AND ($2::uuid IS NULL OR s.car_id IN (SELECT id FROM cars WHERE owner_id = $2))
           AND ($3::text IS NULL OR s.state = $3) AND ($4::uuid IS NULL OR s.car_id = $4)
           AND ($5::timestamptz IS NULL OR (s.changed_at, s.id) < ($5, $6::uuid))
         ORDER BY s.changed_at DESC, s.id DESC LIMIT $7) s
       ${beside}
       ORDER BY s.changed_at DESC, s.id DESC`,
      [this.scope.shopId, this.ownerId, state, carId, changedAt, id, limit + 1],
    );
  }

  async ofCar(carId: string): Promise<SheetRow[]> {
    return this.scope.manager.query(
      `SELECT ${columns} FROM sheets s ${beside} WHERE ${visible} AND s.car_id = $3
       ORDER BY s.changed_at DESC, s.id DESC LIMIT 200`,
      [this.scope.shopId, this.ownerId, carId],
    );
  }

  async find(id: string): Promise<WholeSheetRow | null> {
    const rows: WholeSheetRow[] = await this.scope.manager.query(
      `SELECT ${wholeColumns}
       FROM sheets s ${beside} JOIN specs p ON p.id = e.spec_id LEFT JOIN people o ON o.id = c.owner_id
       WHERE ${visible} AND s.id = $3`,
      [this.scope.shopId, this.ownerId, id],
    );
    return rows[0] ?? null;
  }

  /** What a released sheet was frozen with; null for any other. */
  async frozenContent(id: string): Promise<SheetContent | null> {
    const rows: { content: SheetContent | null }[] = await this.scope.manager.query(
      `SELECT s.frozen -> 'content' AS content FROM sheets s JOIN cars c ON c.id = s.car_id
       WHERE ${visible} AND s.id = $3`,
      [this.scope.shopId, this.ownerId, id],
    );
    return rows[0]?.content ?? null;
  }

  /** Only the version, for somebody who has the sheet already. */
  async version(id: string): Promise<number | null> {
    const rows: { version: number }[] = await this.scope.manager.query(
      `SELECT s.version FROM sheets s JOIN cars c ON c.id = s.car_id WHERE ${visible} AND s.id = $3`,
      [this.scope.shopId, this.ownerId, id],
    );
    return rows[0]?.version ?? null;
  }

  /** Locks the sheet's row: whoever writes on a sheet waits here for their turn. */
  async lock(id: string): Promise<LockedSheetRow | null> {
    const rows: LockedSheetRow[] = await this.scope.manager.query(
      `SELECT s.id, s.code, s.state, s.version, s.sign_round AS "signRound", s.steps_done AS "stepsDone",
         s.steps_total AS "stepsTotal", s.open_snags AS "openSnags", c.name AS "carName",
         ${name('b')} AS builder, ${name('k')} AS countersigner
       FROM sheets s
       JOIN cars c ON c.id = s.car_id
       JOIN people b ON b.id = s.builder_id
       JOIN people k ON k.id = s.countersigner_id
       WHERE s.shop_id = $1 AND s.id = $2 FOR UPDATE OF s`,
      [this.scope.shopId, id],
    );
    return rows[0] ?? null;
  }

  async insert(sheet: Omit<SheetEntity, 'shopId' | 'frozen' | 'releasedAt'>): Promise<void> {
    await this.scope.manager.insert(SheetEntity, { ...sheet, shopId: this.scope.shopId });
  }

  async update(id: string, change: Partial<SheetEntity>): Promise<void> {
    await this.scope.manager.update(SheetEntity, { id, shopId: this.scope.shopId }, change);
  }

  /** The number that the next sheet gets; others who lay out in this shop wait until this one is done. */
  async nextNumber(): Promise<number> {
    const { manager, shopId } = this.scope;
    await manager.query('SELECT pg_advisory_xact_lock(hashtextextended($1, 0))', [`sheet codes ${shopId}`]);
    const rows: { next: number }[] = await manager.query(
      `SELECT coalesce(max(substring(code from '[0-9]{1,8}$')::int), 0) + 1 AS next
       FROM sheets WHERE shop_id = $1`,
      [shopId],
    );
    return rows[0]?.next ?? 1;
  }
}
