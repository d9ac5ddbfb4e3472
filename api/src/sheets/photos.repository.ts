import type { ShopScope } from '../platform/database/database.js';

/** The photos of one shop, as far as sheets ask for them. */
export class PhotosRepository {
  constructor(private readonly scope: ShopScope) {}

  async isStored(id: string): Promise<boolean> {
    const rows: unknown[] = await this.scope.manager.query(
      'SELECT 1 FROM files WHERE shop_id = $1 AND id = $2',
      [this.scope.shopId, id],
    );
    return rows.length > 0;
  }
}
