import type { DataSource } from 'typeorm';

/** Any number that nobody else uses for an advisory lock in this database. */
const MIGRATION_LOCK = 7_261_961;

/** Brings the schema up to date; api processes that start together wait for one another. */
export async function migrate(dataSource: DataSource): Promise<void> {
  const runner = dataSource.createQueryRunner();
  try {
    await runner.query('SELECT pg_advisory_lock($1)', [MIGRATION_LOCK]);
    await dataSource.runMigrations();
  } finally {
    await runner.query('SELECT pg_advisory_unlock($1)', [MIGRATION_LOCK]).catch(() => undefined);
    await runner.release();
  }
}

/** Empties the database and lays the schema again. Everything in it is lost. */
export async function rebuild(dataSource: DataSource): Promise<void> {
  await dataSource.query('DROP SCHEMA public CASCADE');
  await dataSource.query('CREATE SCHEMA public');
  await migrate(dataSource);
}

/** Whether the role at hand passes by row-level security, the second wall between shops. */
export async function passesRowSecurity(dataSource: DataSource): Promise<boolean> {
  const rows: { passes: boolean }[] = await dataSource.query(
    'SELECT rolsuper OR rolbypassrls AS passes FROM pg_roles WHERE rolname = current_user',
  );
  return rows[0]?.passes ?? false;
}
