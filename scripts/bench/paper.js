// @ts-check
// A build sheet of six to ten pages, one after another, and what the api's event loop suffers meanwhile.
import { setTimeout as pause } from 'node:timers/promises';
import { ms } from './figures.js';
import { run } from './load.js';
import { asLoader, copySheet } from './sheets.js';
import { get, signIn } from './sign-in.js';

/** @typedef {import('./stage.js').Stage} Stage */
/** @typedef {import('./table.js').Row} Row */

const steps = 55;
const sheets = 60;

/** @param {Buffer} pdf */
const pagesOf = (pdf) => [...pdf.toString('latin1').matchAll(/\/Type \/Page\b/g)].length;

/** @param {Stage} stage @returns {Promise<Row[]>} */
export const measurePaper = async (stage) => {
  const { address, probe } = stage;
  const headers = await signIn(address, 'nell');
  const id = await asLoader(stage.database, async (client) => {
    const { rows } = await client.query(
      "SELECT code FROM sheets WHERE state = 'released' AND code LIKE 'LM-%' ORDER BY code LIMIT 1",
    );
    return copySheet(client, { from: rows[0]?.code, code: 'B-PDF', steps, records: true });
  });
  const url = `${address}/api/sheets/${id}/build-sheet.pdf`;
  const [first, again] = [await get(url, headers), await get(url, headers)];
  await run({ url, headers, connections: 1, amount: 10 });
  await pause(1000);
  await get(`${probe}/reset`, {});
  const found = await run({ url, headers, connections: 1, amount: sheets });
  const { p99: delay } = JSON.parse((await get(probe, {})).toString('utf8'));
  const same = first.equals(again);
  return [
    {
      what: `build sheet (PDF), ${pagesOf(first)} pages`,
      goal: 'p95 ≤ 150 ms',
      measured: ms(found.p95),
      met: found.p95 <= 150,
    },
    { what: 'event loop late meanwhile', goal: 'p99 ≤ 30 ms', measured: ms(delay), met: delay <= 30 },
    {
      what: 'build sheet made twice',
      goal: 'the same to the byte',
      measured: same ? 'the same' : 'different',
      met: same,
    },
  ];
};
