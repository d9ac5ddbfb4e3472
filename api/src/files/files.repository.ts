import type { ShopScope } from '../platform/database/database.js';
import { StoredFileEntity } from './stored-file.entity.js';

/** The stored photos of one shop. */
export class FilesRepository {
  constructor(private readonly scope: ShopScope) {}

  async insert(file: Omit<StoredFileEntity, 'shopId'>): Promise<void> {
    await this.scope.manager.insert(StoredFileEntity, { ...file, shopId: this.scope.shopId });
  }

  /** A file of the shop; for a car's owner only one that stands on a sheet of their car. */
  async find(id: string, ownerId: string | null): Promise<StoredFileEntity | null> {
    const { shopId, manager } = this.scope;
    const file = await manager.findOneBy(StoredFileEntity, { id, shopId });
    if (!file || ownerId === null) return file;
    const rows: unknown[] = await manager.query(
      `SELECT 1 FROM cars c JOIN sheets s ON s.car_id = c.id JOIN entries e ON e.sheet_id = s.id
       WHERE c.shop_id = $1 AND c.owner_id = $2 AND e.content ->> 'fileId' = $3 LIMIT 1`,
      [shopId, ownerId, id],
    );
    return rows.length > 0 ? file : null;
  }
}
