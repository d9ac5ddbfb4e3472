import type { EntityManager } from 'typeorm';
import type { Dialect, Role } from '@second-spanner/shared/contracts/people';
import type { ShopScope } from '../platform/database/database.js';
import { PersonEntity } from './person.entity.js';
import { ShopEntity } from './shop.entity.js';

/** What signing in needs to know of an account before its shop is known. */
export interface Account {
  readonly id: string;
  readonly shopId: string;
  readonly passwordHash: string;
  readonly lockedAt: Date | null;
}

/** A person as others see them: nothing more leaves the database. */
export type PersonNameRow = Pick<PersonEntity, 'id' | 'name' | 'role'>;

const ofShop = `
  SELECT id, name, role FROM people
  WHERE shop_id = $1 AND ($2::text[] IS NULL OR role = ANY ($2::text[]) OR id = $3::uuid)
  ORDER BY name, id`;

/** One shop and its people. */
export class PeopleRepository {
  constructor(private readonly scope: ShopScope) {}

  /** Everybody by name, or only those of some roles and one person besides. */
  async list(only?: { readonly roles: readonly Role[]; readonly orId: string }): Promise<PersonNameRow[]> {
    const values = [this.scope.shopId, only?.roles ?? null, only?.orId ?? null];
    return this.scope.prepared('people-of-shop', ofShop, values);
  }

  async find(id: string): Promise<PersonEntity | null> {
    return this.scope.manager.findOneBy(PersonEntity, { id, shopId: this.scope.shopId });
  }

  async passwordHash(id: string): Promise<string | null> {
    const found = await this.scope.manager.findOne(PersonEntity, {
      select: { id: true, passwordHash: true },
      where: { id, shopId: this.scope.shopId },
    });
    return found?.passwordHash ?? null;
  }

  async setDialect(id: string, dialect: Dialect | null): Promise<void> {
    await this.scope.manager.update(PersonEntity, { id, shopId: this.scope.shopId }, { dialect });
  }

  async insert(person: Omit<PersonEntity, 'shopId' | 'lockedAt' | 'dialect'>): Promise<void> {
    await this.scope.manager.insert(PersonEntity, { ...person, shopId: this.scope.shopId });
  }

  async insertShop(shop: Omit<ShopEntity, 'id'>): Promise<void> {
    await this.scope.manager.insert(ShopEntity, { ...shop, id: this.scope.shopId });
  }
}

/** The account with an e-mail address, of whichever shop; through the door that is open for that address. */
export async function findAccount(manager: EntityManager, email: string): Promise<Account | null> {
  const rows: Account[] = await manager.query(
    `SELECT id, shop_id AS "shopId", password_hash AS "passwordHash", locked_at AS "lockedAt"
     FROM people WHERE email = $1`,
    [email],
  );
  return rows[0] ?? null;
}

/** Whether each shop is a demo's; through the door for setting up. */
export async function demoFlags(manager: EntityManager): Promise<boolean[]> {
  const shops = await manager.find(ShopEntity, { select: { id: true, demo: true } });
  return shops.map(({ demo }) => demo);
}
