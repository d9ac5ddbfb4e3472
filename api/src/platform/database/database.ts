import type { ClientBase, QueryResultRow } from 'pg';
import type { DataSource, EntityManager, QueryRunner } from 'typeorm';
import type { SheetChanged } from '@second-spanner/shared/contracts/sheets';

/** What a repository is made from: one shop, on a connection that sees nothing but this shop. */
export interface ShopScope {
  readonly shopId: string;
  readonly manager: EntityManager;
  /** A query that every request makes: PostgreSQL plans it once a connection, under its name. */
  prepared<Row extends QueryResultRow>(name: string, text: string, values: unknown[]): Promise<Row[]>;
  /** Told to everybody who looks at the sheet, once the transaction is committed. */
  announce(change: SheetChanged): void;
}

/** Narrow doors through row-level security, each open for one transaction and one value. */
export type Door = 'sign_in' | 'verification' | 'setup';

type Announcer = (changes: readonly SheetChanged[]) => void;

/** Shop by shop access to the database. */
export class Database {
  /** Which shop each connection is set to, so that an unchanged one costs nothing. */
  private readonly shopOf = new WeakMap<object, string>();

  constructor(
    private readonly dataSource: DataSource,
    private readonly announcer: Announcer = () => undefined,
  ) {}

  /** Work in one transaction: everything or nothing. */
  async withShop<T>(shopId: string, work: (scope: ShopScope) => Promise<T>): Promise<T> {
    const changes: SheetChanged[] = [];
    const result = await this.onConnection(async (runner) => {
      const client = await this.clientFor(runner, shopId);
      const scope = scopeOf(shopId, runner, client, (change) => changes.push(change));
      return inTransaction(runner, () => work(scope));
    });
    if (changes.length > 0) this.announcer(changes);
    return result;
  }

  /** Reads without a transaction: for queries that stand each for itself. */
  async readShop<T>(shopId: string, work: (scope: ShopScope) => Promise<T>): Promise<T> {
    return this.onConnection(async (runner) => {
      const client = await this.clientFor(runner, shopId);
      return work(scopeOf(shopId, runner, client, refuseAnnouncement));
    });
  }

  /** Reads through one narrow door: the rows that `value` names, of whichever shop. */
  async through<T>(door: Door, value: string, work: (manager: EntityManager) => Promise<T>): Promise<T> {
    return this.onConnection((runner) =>
      inTransaction(runner, async () => {
        // For this transaction the connection forgets its shop, so that the door is all it sees through.
        await runner.query(`SELECT set_config('second_spanner.shop', '', true), set_config($1, $2, true)`, [
          `second_spanner.${door}`,
          value,
        ]);
        return work(runner.manager);
      }),
    );
  }

  /** Whether the database answers. */
  async ping(): Promise<void> {
    await this.dataSource.query('SELECT 1');
  }

  private async onConnection<T>(work: (runner: QueryRunner) => Promise<T>): Promise<T> {
    const runner = this.dataSource.createQueryRunner();
    try {
      return await work(runner);
    } finally {
      await runner.release();
    }
  }

  /** The runner's connection, set to the shop. */
  private async clientFor(runner: QueryRunner, shopId: string): Promise<ClientBase> {
    const client = (await runner.connect()) as ClientBase;
    if (this.shopOf.get(client) !== shopId) {
      // Outside any transaction: a rollback would take the setting back unseen.
      await client.query(`SELECT set_config('second_spanner.shop', $1, false)`, [shopId]);
      this.shopOf.set(client, shopId);
    }
    return client;
  }
}

const scopeOf = (
  shopId: string,
  { manager }: QueryRunner,
  client: ClientBase,
  announce: ShopScope['announce'],
): ShopScope => ({
  ...{ shopId, manager, announce },
  prepared: async <Row extends QueryResultRow>(name: string, text: string, values: unknown[]) =>
    (await client.query<Row>({ name, text, values })).rows,
});

async function inTransaction<T>(runner: QueryRunner, work: () => Promise<T>): Promise<T> {
  await runner.startTransaction();
  try {
    const result = await work();
    await runner.commitTransaction();
    return result;
  } catch (error) {
    // The first error is the one to tell; a lost connection cannot roll back.
    await runner.rollbackTransaction().catch(() => undefined);
    throw error;
  }
}

function refuseAnnouncement(): never {
  throw new Error('Changes are announced from a transaction.');
}
