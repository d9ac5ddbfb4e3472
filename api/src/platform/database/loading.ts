import type { DataSource } from 'typeorm';
import { oneAtATime, rebuild } from './migrate.js';

/** What is in the database: nothing, what `fill` makes and nothing else, or somebody's work. */
export type Holding = 'nothing' | 'demo' | 'work';

/**
 * Fills an empty database, and says whether it did. One that was cut off while it was being filled is emptied
 * first, so that there is never half of it.
 */
export async function fillWhenEmpty(
  dataSource: DataSource,
  holding: () => Promise<Holding>,
  fill: () => Promise<unknown>,
): Promise<boolean> {
  return oneAtATime(dataSource, async () => {
    const held = await holding();
    const half = held === 'demo' && (await wasCutOff(dataSource));
    if (half) await rebuild(dataSource);
    if (held !== 'nothing' && !half) return false;
    await fillWhole(dataSource, fill);
    return true;
  });
}

/** Empties the database and fills it again. Everything in it is lost. */
export async function refill(dataSource: DataSource, fill: () => Promise<unknown>): Promise<void> {
  await oneAtATime(dataSource, async () => {
    await rebuild(dataSource);
    await fillWhole(dataSource, fill);
  });
}

async function fillWhole(dataSource: DataSource, fill: () => Promise<unknown>): Promise<void> {
  await dataSource.query('DELETE FROM loading');
  await dataSource.query('INSERT INTO loading (since) VALUES (now())');
  await fill();
  await dataSource.query('DELETE FROM loading');
}

async function wasCutOff(dataSource: DataSource): Promise<boolean> {
  const rows: { cutOff: boolean }[] = await dataSource.query(
    'SELECT EXISTS (SELECT FROM loading) AS "cutOff"',
  );
  return rows[0]?.cutOff ?? false;
}
