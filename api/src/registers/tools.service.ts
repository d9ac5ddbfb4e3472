import { randomUUID } from 'node:crypto';
import type { Tool } from '@second-spanner/shared/contracts/registers';
import type { Database, ShopScope } from '../platform/database/database.js';
import type { SignedIn } from '../platform/signing-in/signed-in.js';
import { toTool } from './tool.mapper.js';
import { ToolsRepository } from './tools.repository.js';

/** The shop's measuring tools. */
export class ToolsService {
  constructor(private readonly database: Database) {}

  async list({ shop }: SignedIn): Promise<Tool[]> {
    return this.database.readShop(shop.id, (scope) => this.listIn(scope));
  }

  /** All tools, within somebody else's work on the database. */
  async listIn(scope: ShopScope): Promise<Tool[]> {
    return (await new ToolsRepository(scope).list()).map(toTool);
  }

  /** One tool, within somebody else's work on the database. */
  async findIn(scope: ShopScope, id: string): Promise<Tool | null> {
    const tool = await new ToolsRepository(scope).find(id);
    return tool && toTool(tool);
  }

  /** Puts a tool into the register and answers its id. */
  async add(shopId: string, tool: Omit<Tool, 'id'>): Promise<string> {
    const id = randomUUID();
    const { uncertainty = null, uncertaintyShare = null, length = null } = tool;
    await this.database.withShop(shopId, (scope) =>
      new ToolsRepository(scope).insert({ ...tool, id, uncertainty, uncertaintyShare, length }),
    );
    return id;
  }
}
