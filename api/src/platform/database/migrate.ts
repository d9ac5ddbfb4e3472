import type { DataSource } from 'typeorm';

/** Any number that nobody else uses for an advisory lock in this database. */
const SETUP_LOCK = 7_261_961;

/** Work that only one api process does at a time; others that start meanwhile wait for it. */
export async function oneAtATime<T>(dataSource: DataSource, work: () => Promise<T>): Promise<T> {
  const runner = dataSource.createQueryRunner();
  try {
    await runner.query('SELECT pg_advisory_lock($1)', [SETUP_LOCK]);
    return await work();
  } finally {
    await runner.query('SELECT pg_advisory_unlock($1)', [SETUP_LOCK]).catch(() => undefined);
    await runner.release();
  }
}

/** Brings the schema up to date. */
export async function migrate(dataSource: DataSource): Promise<void> {
  await oneAtATime(dataSource, () => dataSource.runMigrations());
}

/** Empties the database and lays the schema again. Everything in it is lost. */
export async function rebuild(dataSource: DataSource): Promise<void> {
  await dataSource.query('DROP SCHEMA public CASCADE');
  await dataSource.query('CREATE SCHEMA public');
  await dataSource.runMigrations();
}

/** Whether the role at hand passes by row-level security, the second wall between shops. */
export async function passesRowSecurity(dataSource: DataSource): Promise<boolean> {
  const rows: { passes: boolean }[] = await dataSource.query(
    'SELECT rolsuper OR rolbypassrls AS passes FROM pg_roles WHERE rolname = current_user',
  );
  return rows[0]?.passes ?? false;
}
