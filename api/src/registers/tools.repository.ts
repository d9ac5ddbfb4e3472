import type { ShopScope } from '../platform/database/database.js';
import { ToolEntity } from './tool.entity.js';

/** The measuring tools of one shop. */
export class ToolsRepository {
  constructor(private readonly scope: ShopScope) {}

  async list(): Promise<ToolEntity[]> {
    const { shopId, manager } = this.scope;
    return manager.find(ToolEntity, { where: { shopId }, order: { code: 'ASC' } });
  }

  async find(id: string): Promise<ToolEntity | null> {
    return this.scope.manager.findOneBy(ToolEntity, { id, shopId: this.scope.shopId });
  }

  async insert(tool: Omit<ToolEntity, 'shopId'>): Promise<void> {
    await this.scope.manager.insert(ToolEntity, { ...tool, shopId: this.scope.shopId });
  }
}
