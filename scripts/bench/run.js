// @ts-check
// The body of `npm run bench`.
import { cpus, loadavg } from 'node:os';
import { parseArgs } from 'node:util';
import { ensureBuilt, ensureCompiled } from '../lib/build.js';
import { closeAll, closeOnSignal, runBody } from '../lib/closing.js';
import { installPackages, installPostgres } from '../lib/install.js';
import { complain, say, Trouble } from '../lib/say.js';
import { measureBenchPage } from './bench-page.js';
import { two } from './figures.js';
import { measurePaper } from './paper.js';
import { measureRatios } from './ratios.js';
import { measureRecords } from './records.js';
import { measureSigning } from './signing.js';
import { measureSizes } from './sizes.js';
import { openStage } from './stage.js';
import { notMeasured, printTable } from './table.js';

/** @typedef {import('./table.js').Row} Row */

/** In this order: the large shop comes last, so that nothing else is measured in it. */
const parts = {
  ratios: measureRatios,
  records: measureRecords,
  signing: measureSigning,
  paper: measurePaper,
  'bench-page': measureBenchPage,
};

const names = [...Object.keys(parts), 'sizes'];

const readOptions = () => {
  const options = /** @type {const} */ ({
    full: { type: 'boolean', default: false },
    only: { type: 'string', default: names.join(',') },
    seconds: { type: 'string', default: '10' },
  });
  const { values } = parseArgs({ options });
  const only = values.only.split(',');
  const unknown = only.find((name) => !names.includes(name));
  if (unknown !== undefined) throw new Trouble(`There is no part "${unknown}": ${names.join(', ')}.`);
  const seconds = Number(values.seconds);
  if (!Number.isInteger(seconds) || seconds < 1) throw new Trouble('--seconds takes a whole number from 1.');
  return { full: values.full, only, seconds };
};

/** @returns {Row[]} */
const elsewhere = () =>
  [
    ['in the browser, throttled: LCP, CLS, INP', '≤ 1.8 s, ≤ 0.02, ≤ 100 ms'],
    ['in the browser: performance, accessibility, best practices', '≥ 95, 100, 100'],
    ['npm start, first and again', '≤ 3 minutes, ≤ 10 s'],
    ['npm test on 2 cores', '≤ 10 minutes'],
  ].map(([what = '', goal = '']) => ({ what, goal, measured: notMeasured }));

/** One part; its trouble is a row of the table, and the others go on. @param {string} name @param {() => Promise<Row[]>} measure @returns {Promise<Row[]>} */
const attempt = async (name, measure) => {
  say(`Measuring: ${name} …`);
  try {
    return await measure();
  } catch (error) {
    complain(error);
    return [{ what: name, goal: '', measured: 'could not be measured, see above', met: false }];
  }
};

const tellMachine = () => {
  const [lately = 0] = loadavg();
  say(`${cpus().length} × ${cpus()[0]?.model ?? 'unknown'}, Node ${process.version}, load ${two(lately)}`);
  if (lately > 0.5) say('The machine is busy with something else: these figures say little.');
};

await runBody(async () => {
  closeOnSignal(130);
  const { full, only, seconds } = readOptions();
  await Promise.all([installPackages(), installPostgres()]);
  await (only.includes('sizes') ? ensureBuilt() : ensureCompiled());
  tellMachine();
  /** @type {Row[]} */
  const rows = [];
  const onStage = Object.entries(parts).filter(([name]) => only.includes(name));
  if (onStage.length > 0) {
    say('Starting the database and the api, and loading the demo …');
    const stage = await openStage({ seconds, full });
    for (const [name, measure] of onStage) rows.push(...(await attempt(name, () => measure(stage))));
  }
  if (only.includes('sizes')) rows.push(...(await attempt('sizes', measureSizes)));
  printTable([...rows, ...elsewhere()]);
  await closeAll();
  process.exit(0);
});
