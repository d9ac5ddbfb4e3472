// @ts-check
// What an answer costs, as a share of what a bare Express answers: read through the whole middleware, calculate, read a sheet.
import { median, ms, two } from './figures.js';
import { statementsOf } from './heard.js';
import { run } from './load.js';
import { asLoader, copySheet } from './sheets.js';
import { get, signIn } from './sign-in.js';

/** @typedef {import('./stage.js').Stage} Stage */
/** @typedef {import('./load.js').Load} Load */
/** @typedef {import('./load.js').Outcome} Outcome */
/** @typedef {import('./table.js').Row} Row */

const rounds = 3;
const fewReaders = 4;

/** A V8 with its order and its rotor as many have them. */
const capMap = { firingOrder: [1, 8, 4, 3, 6, 5, 7, 2], rotation: 'clockwise' };

/**
 * Loads each address in turn and again, the bare Express before each: machines are not as fast at one moment as at another.
 * @param {Stage} stage @param {Record<string, Load>} loads
 */
const measureInTurn = async ({ bare, seconds }, loads) => {
  const each = { seconds: Math.max(1, Math.round(seconds / rounds)) };
  /** @type {Record<string, { outcome: Outcome, ratio: number }[]>} */
  const found = {};
  for (const load of [{ url: bare }, ...Object.values(loads)]) await run({ ...load, seconds: 2 });
  for (let round = 0; round < rounds; round += 1) {
    for (const [name, load] of Object.entries(loads)) {
      const { perSecond } = await run({ url: bare, ...each });
      const outcome = await run({ ...load, ...each });
      (found[name] ??= []).push({ outcome, ratio: outcome.perSecond / perSecond });
    }
  }
  return (/** @type {string} */ name) => {
    const all = found[name] ?? [];
    const ratio = median(all.map((one) => one.ratio));
    const p99 = median(all.map(({ outcome }) => outcome.p99));
    return { ratio, p99, perSecond: median(all.map(({ outcome }) => outcome.perSecond)) };
  };
};

/** @param {string} what @param {number} goal @param {{ ratio: number, perSecond: number }} found @returns {Row} */
const ratioRow = (what, goal, { ratio, perSecond }) => ({
  what,
  goal: `≥ ${goal.toFixed(2)} of bare Express`,
  measured: `${two(ratio)} (${Math.round(perSecond)} a second)`,
  met: ratio >= goal,
});

/** @param {Stage} stage @returns {Promise<Row[]>} */
export const measureRatios = async (stage) => {
  const { address, bare, seconds } = stage;
  const headers = await signIn(address, 'nell');
  const [short, long] = await asLoader(stage.database, async (client) => [
    await copySheet(client, { from: 'LM-0147', code: 'B-0040', steps: 40 }),
    await copySheet(client, { from: 'LM-0147', code: 'B-0400', steps: 400 }),
  ]);
  const sheet = `${address}/api/sheets/${short}`;
  const found = await measureInTurn(stage, {
    people: { url: `${address}/api/people`, headers },
    'cap map': { url: `${address}/api/calculations/cap-map`, method: 'POST', body: capMap, headers },
    sheet: { url: sheet, headers },
  });
  const calibration = await run({ url: bare, seconds });
  const longSheet = await run({
    ...{ url: `${address}/api/sheets/${long}`, headers, seconds },
    connections: fewReaders,
  });
  const statements = await statementsOf(stage, () => get(sheet, headers));
  const calculated = found('cap map');
  return [
    {
      what: 'bare Express, 20 connections (calibration = 1.00)',
      goal: '',
      measured: `${Math.round(calibration.perSecond)} a second, p99 ${ms(calibration.p99)}`,
    },
    ratioRow('GET /people, signed in, logged, limited', 0.45, found('people')),
    ratioRow('cap map of a V8', 0.35, calculated),
    {
      what: 'cap map of a V8, 20 connections',
      goal: 'p99 ≤ 15 ms',
      measured: ms(calculated.p99),
      met: calculated.p99 <= 15,
    },
    ratioRow('sheet of 40 steps read', 0.22, found('sheet')),
    {
      what: 'sheet of 40 steps, statements (session included)',
      goal: '≤ 3',
      measured: String(statements),
      met: statements <= 3,
    },
    {
      what: `sheet of 400 steps, ${fewReaders} readers`,
      goal: 'p95 ≤ 40 ms',
      measured: ms(longSheet.p95),
      met: longSheet.p95 <= 40,
    },
  ];
};
