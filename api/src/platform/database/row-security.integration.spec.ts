import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { SheetRows } from '../../testing/sheet-rows.js';
import { startTestApp, type TestApp } from '../../testing/test-app.js';
import { openWorkshop, type Workshop } from '../../testing/workshop.js';

let app: TestApp;
let workshop: Workshop;

beforeAll(async () => {
  app = await startTestApp();
  workshop = await openWorkshop(app.services);
  const rows = await SheetRows.make(app.db, workshop);
  await rows.entry(workshop.people.tomasz);
});
afterAll(() => app.close());

const count = async (shopId: string | null, table: string): Promise<number> => {
  const rows = await app.db.sql<{ n: number }>(shopId, `SELECT count(*)::int AS n FROM ${table}`);
  return rows[0]?.n ?? -1;
};

describe('row-level security', () => {
  it('stands, forced, before every table that holds a shop’s things', async () => {
    const open = await app.db.sql(
      null,
      `SELECT relname FROM pg_class
       WHERE relkind = 'r' AND relnamespace = 'public'::regnamespace AND relname NOT IN ('migrations', 'loading')
         AND NOT (relrowsecurity AND relforcerowsecurity)`,
    );
    expect(open).toEqual([]);
  });

  it.each(['shops', 'people', 'cars', 'tools', 'specs', 'spec_editions', 'sheets', 'steps', 'entries'])(
    'shows no rows of %s without a shop, nor to another shop',
    async (table) => {
      expect(await count(workshop.shop, table)).toBeGreaterThan(0);
      expect(await count(null, table)).toBe(0);
      expect(await app.db.sql(workshop.otherShop, `SELECT FROM ${table} WHERE ${own(table)}`)).toEqual([]);
    },
  );

  const own = (table: string): string => `${table === 'shops' ? 'id' : 'shop_id'} = '${workshop.shop}'`;

  it('takes no row for another shop', async () => {
    await expect(
      app.db.sql(
        workshop.otherShop,
        `INSERT INTO specs (id, shop_id, code, title) VALUES (gen_random_uuid(), $1, 'X', 'X')`,
        [workshop.shop],
      ),
    ).rejects.toThrow('row-level security');
  });

  it('lets nothing of this shop point at another shop’s things', async () => {
    await expect(
      app.db.sql(workshop.otherShop, 'UPDATE cars SET owner_id = $1', [workshop.people.ravi]),
    ).rejects.toThrow('cars_shop_id_owner_id_fkey');
  });

  it('opens the door for signing in to one address alone, and only to read', async () => {
    const seen = await app.database.through('sign_in', 'nell@lowmill.example', (manager) =>
      manager.query<{ email: string }[]>('SELECT email FROM people'),
    );
    expect(seen).toEqual([{ email: 'nell@lowmill.example' }]);
    const changed = await app.database.through('sign_in', 'nell@lowmill.example', (manager) =>
      manager.query<[object[], number]>(`UPDATE people SET role = 'builder'`),
    );
    expect(changed[1]).toBe(0);
  });

  it('leaves a connection on its shop when a transaction is taken back', async () => {
    const failing = app.database.withShop(workshop.otherShop, () => Promise.reject(new Error('taken back')));
    await expect(failing).rejects.toThrow('taken back');
    const names = await app.database.readShop(workshop.otherShop, ({ manager }) =>
      manager.query<{ name: string }[]>('SELECT name FROM people'),
    );
    expect(names).toEqual([{ name: 'Hana Whitlock' }]);
  });
});

describe('entities', () => {
  it('have the columns that the migrations made', async () => {
    for (const { tableName, columns } of app.db.dataSource.entityMetadatas) {
      const made = await app.db.sql<{ name: string; type: string; nullable: boolean }>(
        null,
        `SELECT attname AS name, format_type(atttypid, atttypmod) AS type, NOT attnotnull AS nullable
         FROM pg_attribute WHERE attrelid = $1::regclass AND attnum > 0`,
        [tableName],
      );
      const types: Record<string, string> = { int: 'integer', timestamptz: 'timestamp with time zone' };
      for (const column of columns) {
        const type = types[String(column.type)] ?? String(column.type);
        expect(made).toContainEqual({
          name: column.databaseName,
          type: column.isArray ? `${type}[]` : type,
          nullable: column.isNullable,
        });
      }
    }
  });
});
