// @ts-check
// The bench of a shop with very many sheets: how long it takes, and whether PostgreSQL finds it the same way as with a tenth.
import { say } from '../lib/say.js';
import { addSheets } from './blank-sheets.js';
import { ms } from './figures.js';
import { plansOf } from './heard.js';
import { run } from './load.js';
import { asLoader } from './sheets.js';
import { get, signIn } from './sign-in.js';
import { notMeasured } from './table.js';

/** @typedef {import('./stage.js').Stage} Stage */
/** @typedef {import('./table.js').Row} Row */
/** @typedef {import('./heard.js').Plan} Plan */

const allSheets = 2000;
const steps = 400;
const readers = 4;
const prefix = 'L-';

/** One sheet in forty is on the stand, one each signed by one, by two, and planned; the rest is released. */
const state = `CASE n % 40 WHEN 0 THEN 'on-the-stand' WHEN 1 THEN 'countersigning' WHEN 2 THEN 'signed-off'
  WHEN 3 THEN 'planned' ELSE 'released' END`;

/** Two and a half entries a step; on the stand some steps wait for a second person, and one for the foreman. */
const records = [
  `INSERT INTO entries (id, shop_id, sheet_id, step_id, round, content, verdict, reason, recorded_by, idempotency_key, body_hash)
   SELECT gen_random_uuid(), s.shop_id, s.sheet_id, s.id, 1,
     jsonb_build_object('kind', 'measurement', 'at', 'Place ' || n, 'value', '{"value": 0.045, "unit": "mm"}'::jsonb),
     'pass', 'Well inside.', h.builder_id, gen_random_uuid(), repeat('0', 64)
   FROM sheets h JOIN steps s ON s.sheet_id = h.id, LATERAL generate_series(1, 2 + s.position % 2) n
   WHERE h.id = ANY ($1)`,
  `UPDATE steps s SET done = of_total, verdict = 'pass', recorder_ids = ARRAY[h.builder_id]
   FROM sheets h WHERE h.id = s.sheet_id AND h.id = ANY ($1)`,
  `UPDATE steps s SET critical = true, second_check = 'measured-again', awaiting = 'second-check',
     awaiting_since = h.changed_at
   FROM sheets h WHERE h.id = s.sheet_id AND h.id = ANY ($1) AND h.state = 'on-the-stand' AND s.position % 50 = 0`,
  `UPDATE steps s SET verdict = 'fail', open_snags = 1, awaiting = 'snag', awaiting_since = h.changed_at
   FROM sheets h WHERE h.id = s.sheet_id AND h.id = ANY ($1) AND h.state = 'on-the-stand' AND s.position = 120`,
  `INSERT INTO snags (id, shop_id, sheet_id, step_id, round, cause, words, raised_by)
   SELECT gen_random_uuid(), s.shop_id, s.sheet_id, s.id, 1, 'failed', 'Too tight.', h.builder_id
   FROM steps s JOIN sheets h ON h.id = s.sheet_id WHERE h.id = ANY ($1) AND s.awaiting = 'snag'`,
];

/** Fills the shop up, a hundred sheets at a time. @param {Stage} stage @param {number} from @param {number} to */
const fill = async (stage, from, to) => {
  await asLoader(stage.database, async (client) => {
    for (let first = from; first <= to; first += 100) {
      const last = Math.min(to, first + 99);
      const sheets = await addSheets(client, { prefix, from: first, to: last, steps, places: 3, state });
      for (const text of records) await client.query(text, [sheets]);
      say(`  ${last} sheets, ${last * steps} steps, ${last * steps * 2.5} entries`);
    }
    await client.query('VACUUM ANALYZE');
  });
};

/** What grows without an end. The rest is small enough that PostgreSQL may as well read it whole. */
const growing = [
  'steps',
  'entries',
  'second_readings',
  'countersignatures',
  'snags',
  'snag_settlements',
  'calls',
];

/** @param {Plan | undefined} plan */
const waysToGrowing = (plan) =>
  (plan?.ways ?? [])
    .filter(({ table }) => growing.includes(table))
    .map(({ table, way }) => `${table} ${way}`)
    .sort()
    .join('; ');

/**
 * The queries that reach what grows in another way than before, told. Queries are asked side by side, in any order.
 * @param {Plan[]} some @param {Plan[]} all @returns {string[]}
 */
const differences = (some, all) => {
  const before = new Map(some.map((plan) => [plan.text, plan]));
  return all
    .filter((plan) => waysToGrowing(plan) !== waysToGrowing(before.get(plan.text)))
    .map(({ text, outline }) => `${text}\n    a tenth: ${before.get(text)?.outline}\n    all: ${outline}`);
};

/** @param {Stage} stage @returns {Promise<Row[]>} */
export const measureBenchPage = async (stage) => {
  const most = stage.full ? allSheets : allSheets / 10;
  const url = `${stage.address}/api/bench`;
  // Signed in anew each time: the filling takes longer than a sign-in lasts.
  const foreman = () => signIn(stage.address, 'nell');
  const plans = async () => {
    const headers = await foreman();
    return stage.explains ? plansOf(stage, () => get(url, headers)) : undefined;
  };
  say('Filling the shop …');
  await fill(stage, 1, most / 10);
  const some = await plans();
  await fill(stage, most / 10 + 1, most);
  const all = await plans();
  const load = { url, headers: await foreman(), connections: readers };
  await run({ ...load, seconds: 2 });
  const found = await run({ ...load, seconds: stage.seconds });
  const other = some && all && differences(some, all);
  for (const text of other ?? []) say(`  Worked in another way than with a tenth: ${text}`);
  return [
    {
      what: `bench page, ${most} sheets, ${most * steps} steps, ${most * steps * 2.5} entries, ${readers} readers`,
      goal: 'p95 ≤ 60 ms',
      measured: ms(found.p95),
      met: found.p95 <= 60,
    },
    {
      what: `bench page, ways of ${all?.length ?? 0} queries to steps and records`,
      goal: 'the same as with a tenth',
      measured: other ? (other.length === 0 ? 'the same' : `${other.length} differ`) : notMeasured,
      ...(other && { met: other.length === 0 }),
    },
  ];
};
