import type { ShopScope } from '../platform/database/database.js';
import type { Paging } from '../platform/validation/paging.js';
import { CarEntity, type CarRow } from './car.entity.js';

/** The cars of one shop, or of one owner in it. */
export class CarsRepository {
  constructor(
    private readonly scope: ShopScope,
    /** Only this person's cars, where given. */
    private readonly ownerId: string | null = null,
  ) {}

  /** One row more than the page holds, by code. */
  async list({ after, limit }: Paging): Promise<CarRow[]> {
    return this.scope.manager.query(
      `${this.select()} AND ($3::text IS NULL OR car.code > $3) ORDER BY car.code LIMIT $4`,
      [this.scope.shopId, this.ownerId, after?.[0] ?? null, limit + 1],
    );
  }

  async find(id: string): Promise<CarRow | null> {
    const values = [this.scope.shopId, this.ownerId, id];
    const rows: CarRow[] = await this.scope.manager.query(`${this.select()} AND car.id = $3`, values);
    return rows[0] ?? null;
  }

  async insert(car: Omit<CarEntity, 'shopId'>): Promise<void> {
    await this.scope.manager.insert(CarEntity, { ...car, shopId: this.scope.shopId });
  }

  private select(): string {
    return `
      SELECT car.id, car.code, car.name, car.year, car.engine_code AS "engineCode",
        car.engine_number AS "engineNumber", coalesce(owner.name, car.owner_name) AS "ownerName",
        car.chassis_number AS "chassisNumber", car.registration, car.colour, car.notes,
        (SELECT count(*)::int FROM sheets
          WHERE sheets.shop_id = car.shop_id AND sheets.car_id = car.id) AS "sheetCount"
      FROM cars car
      LEFT JOIN people owner ON owner.id = car.owner_id
      WHERE car.shop_id = $1 AND ($2::uuid IS NULL OR car.owner_id = $2)`;
  }
}
