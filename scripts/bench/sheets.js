// @ts-check
// Sheets beside the demo's, put into the database directly: triggers and foreign keys are asleep meanwhile.
import { withDatabase } from '../lib/sql.js';

/** @typedef {import('pg').Client} Client */

/** @template T @param {string} database @param {(client: Client) => Promise<T>} work */
export const asLoader = (database, work) =>
  withDatabase(database, async (client) => {
    await client.query("SET session_replication_role = 'replica'");
    return work(client);
  });

/** @param {Client} client @param {string} text @param {unknown[]} [values] @returns {Promise<any>} the first row */
export const one = async (client, text, values = []) => (await client.query(text, values)).rows[0];

/** @param {Client} client @param {string} table @returns {Promise<string[]>} */
const columnsOf = async (client, table) => {
  const found = await client.query(
    "SELECT column_name FROM information_schema.columns WHERE table_schema = 'public' AND table_name = $1",
    [table],
  );
  return found.rows.map(({ column_name: name }) => name);
};

/**
 * Copies rows with some columns changed.
 * @param {Client} client @param {string} table @param {Record<string, string>} changes SQL by column
 * @param {string} from the rest of the query; `t` is the table @param {unknown[]} [values]
 */
const copyRows = async (client, table, changes, from, values = []) => {
  const columns = await columnsOf(client, table);
  const sources = columns.map((column) => changes[column] ?? `t.${column}`);
  const text = `INSERT INTO ${table} (${columns.join(', ')}) SELECT ${sources.join(', ')} FROM ${table} t ${from}`;
  await client.query(text, values);
};

const fresh = 'gen_random_uuid()';

/**
 * Copies a sheet as one on the stand with some of its steps, repeated when they are too few, and what is recorded on them.
 * @param {Client} client
 * @param {{ from: string, code: string, steps: number, records?: boolean }} wanted `from` is a sheet's code
 * @returns {Promise<string>} its id
 */
export const copySheet = async (client, { from, code, steps, records = false }) => {
  const { old, id } = await one(client, `SELECT id AS old, ${fresh} AS id FROM sheets WHERE code = $1`, [
    from,
  ]);
  const running = {
    id: '$2',
    code: '$3',
    state: "'on-the-stand'",
    steps_total: '$4',
    steps_done: 'least(t.steps_done, $4)',
  };
  const unsigned = { content_hash: 'NULL', verification_code: 'NULL', frozen: 'NULL', released_at: 'NULL' };
  await copyRows(client, 'sheets', { ...running, ...unsigned }, 'WHERE id = $1', [old, id, code, steps]);
  await client.query(
    `CREATE TEMP TABLE copied AS
     SELECT t.id AS old, ${fresh} AS new, row_number() OVER (ORDER BY again, position) AS position, again
     FROM steps t, generate_series(0, 20) again WHERE sheet_id = $1 ORDER BY again, position LIMIT $2`,
    [old, steps],
  );
  const place = { id: 'c.new', sheet_id: '$1', position: 'c.position' };
  const named = { code: "t.code || CASE c.again WHEN 0 THEN '' ELSE '-' || c.again END" };
  await copyRows(client, 'steps', { ...place, ...named }, 'JOIN copied c ON c.old = t.id', [id]);
  if (records) await copyRecords(client, id);
  await client.query('DROP TABLE copied');
  return id;
};

/** @param {Client} client @param {string} sheet */
const copyRecords = async (client, sheet) => {
  const place = { id: fresh, sheet_id: '$1', step_id: 'c.new', idempotency_key: fresh };
  await client.query(
    `CREATE TEMP TABLE copied_entries AS SELECT id AS old, ${fresh} AS new FROM entries WHERE step_id IN (SELECT old FROM copied)`,
  );
  await copyRows(
    client,
    'entries',
    { ...place, id: 'e.new', replaces: 'r.new' },
    `JOIN copied c ON c.old = t.step_id JOIN copied_entries e ON e.old = t.id
     LEFT JOIN copied_entries r ON r.old = t.replaces`,
    [sheet],
  );
  for (const table of ['second_readings', 'countersignatures']) {
    await copyRows(client, table, place, 'JOIN copied c ON c.old = t.step_id', [sheet]);
  }
  await client.query('DROP TABLE copied_entries');
};
