import { randomBytes } from 'node:crypto';
import pg from 'pg';
import { createDataSource } from '../database/data-source.js';
import { migrate } from '../database/migrate.js';
import { createLog } from '../log.js';

export interface TestDatabase {
  /** As the application's role, which row-level security binds. */
  readonly url: string;
  readonly dataSource: ReturnType<typeof createDataSource>;
  /** One statement as the application's role, seeing one shop, or none. */
  sql<Row extends object>(shopId: string | null, statement: string, values?: unknown[]): Promise<Row[]>;
  /** Closes everything and takes the database and its role away. */
  drop(): Promise<void>;
}

/** A database of its own with all tables, owned by a role that is no superuser, as in the workshop. */
export async function createTestDatabase(): Promise<TestDatabase> {
  const superUrl = process.env['TEST_DATABASE_URL'];
  if (!superUrl) throw new Error('TEST_DATABASE_URL must name a PostgreSQL server, as its superuser.');
  const name = `test_${randomBytes(8).toString('hex')}`;
  await asSuperuser(superUrl, [
    `CREATE ROLE ${name} LOGIN NOSUPERUSER NOBYPASSRLS PASSWORD '${name}'`,
    `CREATE DATABASE ${name} OWNER ${name}`,
  ]);
  const url = Object.assign(new URL(superUrl), { username: name, password: name, pathname: `/${name}` }).href;
  const dataSource = createDataSource({ url, poolSize: 8, log: createLog('silent') });
  await dataSource.initialize();
  await migrate(dataSource);
  const pool = new pg.Pool({ connectionString: url, max: 4 });
  return {
    url,
    dataSource,
    sql: (shopId, statement, values) => statementAs(pool, shopId, statement, values),
    drop: async () => {
      await pool.end();
      await dataSource.destroy();
      await asSuperuser(superUrl, [`DROP DATABASE ${name} WITH (FORCE)`, `DROP ROLE ${name}`]);
    },
  };
}

async function asSuperuser(url: string, statements: readonly string[]): Promise<void> {
  const client = new pg.Client({ connectionString: url });
  await client.connect();
  try {
    for (const statement of statements) await client.query(statement);
  } finally {
    await client.end();
  }
}

async function statementAs<Row extends object>(
  pool: pg.Pool,
  shopId: string | null,
  statement: string,
  values: unknown[] = [],
): Promise<Row[]> {
  const client = await pool.connect();
  try {
    await client.query(`SELECT set_config('second_spanner.shop', $1, false)`, [shopId ?? '']);
    return (await client.query<Row>(statement, values)).rows;
  } finally {
    client.release();
  }
}
