import type { PersonName } from '@second-spanner/shared/contracts/people';
import type { ShopScope } from '../platform/database/database.js';

/** What has to be looked up before a sheet is laid out. */
export class LayOutRepository {
  constructor(private readonly scope: ShopScope) {}

  /** The code of a car's engine; null when the shop has no such car. */
  async engineOf(carId: string): Promise<string | null> {
    const rows: { engineCode: string }[] = await this.scope.manager.query(
      'SELECT engine_code AS "engineCode" FROM cars WHERE shop_id = $1 AND id = $2',
      [this.scope.shopId, carId],
    );
    return rows[0]?.engineCode ?? null;
  }

  /** Those of the people who belong to the shop and are not locked out. */
  async people(ids: readonly string[]): Promise<PersonName[]> {
    return this.scope.manager.query(
      'SELECT id, name, role FROM people WHERE shop_id = $1 AND id = ANY ($2) AND locked_at IS NULL',
      [this.scope.shopId, ids],
    );
  }
}
