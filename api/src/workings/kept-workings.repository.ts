import type { ShopScope } from '../platform/database/database.js';
import type { Paging } from '../platform/validation/paging.js';
import { KeptWorkingEntity, type KeptWorkingRow } from './kept-working.entity.js';

const select = `
  SELECT kept.id, kept.car_id AS "carId", kept.working, kept.title, kept.typed,
    keeper.name AS "keptByName", kept.kept_at AS "keptAt"
  FROM kept_workings kept JOIN people keeper ON keeper.id = kept.kept_by
  WHERE kept.shop_id = $1 AND kept.car_id = $2`;

/** The workings kept with one car of a shop. Who may see the car may see them. */
export class KeptWorkingsRepository {
  constructor(
    private readonly scope: ShopScope,
    private readonly carId: string,
  ) {}

  /** One row more than the page holds, the newest first. */
  async list({ after, limit }: Paging): Promise<KeptWorkingRow[]> {
    const [keptAt = null, id = null] = after ?? [];
    return this.scope.manager.query(
      `${select} AND ($3::timestamptz IS NULL OR (kept.kept_at, kept.id) < ($3, $4::uuid))
       ORDER BY kept.kept_at DESC, kept.id DESC LIMIT $5`,
      [this.scope.shopId, this.carId, keptAt, id, limit + 1],
    );
  }

  async find(id: string): Promise<KeptWorkingRow | null> {
    const values = [this.scope.shopId, this.carId, id];
    const rows: KeptWorkingRow[] = await this.scope.manager.query(`${select} AND kept.id = $3`, values);
    return rows[0] ?? null;
  }

  async insert(kept: Omit<KeptWorkingEntity, 'shopId' | 'carId'>): Promise<void> {
    const { shopId, manager } = this.scope;
    await manager.insert(KeptWorkingEntity, { ...kept, shopId, carId: this.carId });
  }
}
