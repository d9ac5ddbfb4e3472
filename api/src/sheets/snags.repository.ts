import type { ShopScope } from '../platform/database/database.js';

/** The snags of one shop's sheets. */
export class SnagsRepository {
  constructor(private readonly scope: ShopScope) {}

  /** The code of the step that a snag is on. */
  async stepOf(sheetId: string, snagId: string): Promise<string | null> {
    const rows: { code: string }[] = await this.scope.manager.query(
      `SELECT s.code FROM snags n JOIN steps s ON s.id = n.step_id
       WHERE n.shop_id = $1 AND n.sheet_id = $2 AND n.id = $3`,
      [this.scope.shopId, sheetId, snagId],
    );
    return rows[0]?.code ?? null;
  }
}
