// @ts-check
// Sheets are signed, two a second, the password hashed each time; what does everybody else notice?
import { ms, two } from './figures.js';
import { run } from './load.js';
import { asLoader, copySheet } from './sheets.js';
import { password, signIn } from './sign-in.js';

/** @typedef {import('./stage.js').Stage} Stage */
/** @typedef {import('./table.js').Row} Row */

const perSecond = 2;
const others = { connections: 5, rate: 100 };

/** Copies of the demo's released sheet, with everything recorded on it, ready to be signed. @param {Stage} stage @param {number} count */
const sheetsToSign = (stage, count) =>
  asLoader(stage.database, async (client) => {
    const { rows } = await client.query(
      "SELECT code, steps_total AS steps FROM sheets WHERE state = 'released' AND code LIKE 'LM-%' ORDER BY code LIMIT 1",
    );
    const { code: from, steps } = rows[0] ?? {};
    const sheets = [];
    for (let number = 1; number <= count; number += 1) {
      sheets.push(await copySheet(client, { from, code: `S-${number}`, steps, records: true }));
    }
    await client.query('ANALYZE');
    return sheets;
  });

/** @param {Stage} stage @returns {Promise<Row[]>} */
export const measureSigning = async (stage) => {
  const { address, seconds } = stage;
  const sheets = await sheetsToSign(stage, (seconds + 3) * perSecond);
  const headers = await signIn(address, 'tomasz');
  const reading = { url: `${address}/api/people`, headers, ...others, seconds };
  const sign = () => ({
    path: `/api/sheets/${sheets.pop()}/signatures`,
    ...{ headers, body: { meaning: 'built', password } },
  });
  await run({ ...reading, seconds: 2 });
  const quiet = await run(reading);
  const [signed, meanwhile] = await Promise.all([
    run({ url: address, amount: seconds * perSecond, rate: perSecond, connections: 2, next: () => sign }),
    run(reading),
  ]);
  const times = meanwhile.p99 / quiet.p99;
  return [
    {
      what: `sheet signed, ${perSecond} a second, password hashed`,
      goal: 'p95 ≤ 400 ms',
      measured: ms(signed.p95),
      met: signed.p95 <= 400,
    },
    {
      what: `other routes meanwhile (${others.rate} a second)`,
      goal: 'p99 at most doubled',
      measured: `× ${two(times)} (${ms(quiet.p99)} to ${ms(meanwhile.p99)})`,
      met: times <= 2,
    },
  ];
};
