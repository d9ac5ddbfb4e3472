// @ts-check
// Twenty people record, each on a sheet of their own, as fast as they are answered; then every ledger is followed.
import { createHash, randomUUID } from 'node:crypto';
import { addGauge, addSheets, placesOf, reading } from './blank-sheets.js';
import { ms, two } from './figures.js';
import { run } from './load.js';
import { asLoader } from './sheets.js';
import { signIn } from './sign-in.js';

/** @typedef {import('./stage.js').Stage} Stage */
/** @typedef {import('./table.js').Row} Row */

const writers = 20;
const steps = 170;
const places = placesOf(10);

/** What a writer sends next: the next place of the first step, and so on to the last. @param {string} sheet @param {string} toolId @param {Record<string, string>} signedIn */
const entriesOf = (sheet, toolId, signedIn) => {
  let sent = 0;
  return () => {
    const step = Math.floor(sent / places.length) + 1;
    const at = places[sent % places.length];
    sent += 1;
    const code = `${1 + Math.floor(((step - 1) * 10) / steps)}.${step}`;
    return {
      path: `/api/sheets/${sheet}/steps/${code}/entries`,
      headers: { ...signedIn, 'idempotency-key': randomUUID() },
      body: { content: { kind: 'measurement', at, value: reading, toolId } },
    };
  };
};

/** @param {{ seq: number, prevHash: string, hash: string, body: string }[]} lines whether each is bound to the one before */
const isBound = (lines) =>
  lines.every(({ seq, prevHash, hash, body }, index) => {
    const before = lines[index - 1]?.hash ?? '0'.repeat(64);
    const worked = createHash('sha256')
      .update(prevHash + body)
      .digest('hex');
    return seq === index + 1 && prevHash === before && hash === worked;
  });

/** How many entries the sheets' ledgers tell, and whether all ledgers are whole. @param {Stage} stage @param {string[]} sheets */
const followLedgers = (stage, sheets) =>
  asLoader(stage.database, async (client) => {
    let entries = 0;
    let whole = true;
    for (const sheet of sheets) {
      const { rows } = await client.query(
        'SELECT seq, prev_hash AS "prevHash", hash, body FROM ledger_lines WHERE sheet_id = $1 ORDER BY seq',
        [sheet],
      );
      entries += rows.filter(({ body }) => JSON.parse(body).kind === 'entry').length;
      whole &&= isBound(rows);
    }
    const stored = await client.query(
      'SELECT count(*)::int AS count FROM entries WHERE sheet_id = ANY ($1)',
      [sheets],
    );
    return { entries, whole: whole && stored.rows[0]?.count === entries };
  });

/** @param {Stage} stage @returns {Promise<Row[]>} */
export const measureRecords = async (stage) => {
  const { address, bare, seconds } = stage;
  const signedIn = await signIn(address, 'tomasz');
  const { tool, sheets } = await asLoader(stage.database, async (client) => ({
    tool: await addGauge(client),
    sheets: await addSheets(client, { prefix: 'W-', from: 1, to: writers, steps, places: places.length }),
  }));
  await run({ url: bare, seconds: 2 });
  const calibration = await run({ url: bare, seconds: Math.max(2, seconds / 2) });
  const found = await run({
    ...{ url: address, seconds, connections: writers },
    next: (connection) => entriesOf(sheets[connection % writers] ?? '', tool, signedIn),
  });
  const ratio = found.perSecond / calibration.perSecond;
  const { entries, whole } = await followLedgers(stage, sheets);
  const kept = whole && entries >= found.count;
  return [
    {
      what: `entry recorded, ${writers} writers, the disk waited for`,
      goal: '≥ 0.10 of bare Express',
      measured: `${two(ratio)} (${Math.round(found.perSecond)} a second)`,
      met: ratio >= 0.1,
    },
    { what: 'entry recorded', goal: 'p99 ≤ 40 ms', measured: ms(found.p99), met: found.p99 <= 40 },
    {
      what: 'ledgers followed after',
      goal: 'whole, every entry in them',
      measured: `${found.count} acknowledged, ${entries} in ledgers that are ${whole ? 'whole' : 'BROKEN'}`,
      met: kept,
    },
  ];
};
