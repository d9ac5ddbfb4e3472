// @ts-check
// The body of `npm test`.
import { mkdirSync } from 'node:fs';
import { join } from 'node:path';
import { buildPages, compile } from './build.js';
import { closeAll, closeOnSignal, runBody } from './closing.js';
import { installChromium, installPackages, installPostgres } from './install.js';
import { freePort } from './ports.js';
import { runTool } from './run.js';
import { say } from './say.js';
import { checked, playwrightTally, sum, vitestTally } from './tally.js';
import { startThrowAway } from './throw-away.js';

/** @typedef {import('./tally.js').Tally} Tally */
/** @typedef {(report: string) => Promise<Tally>} Step gets the file to leave its report in */

const vitest = 'vitest/vitest.mjs';
const typeProjects = ['shared/tsconfig.spec.json', 'api/tsconfig.spec.json', 'client/tsconfig.spec.json'];
const ownProjects = ['client/e2e/tsconfig.json', 'scripts/tsconfig.json'];

const types = async () => {
  const codes = [await compile()];
  for (const project of [...typeProjects, ...ownProjects]) {
    codes.push(await runTool('typescript/bin/tsc', ['--noEmit', '-p', project]));
  }
  return Math.max(...codes);
};

/** @param {string} folder @param {string} report */
const vitestIn = (folder, report) => {
  // A machine that is busy with other things is slow, not wrong.
  const patience = ['--testTimeout=30000', '--hookTimeout=60000'];
  const reporting = ['--reporter=default', '--reporter=json', `--outputFile.json=${report}`];
  return ['run', '--root', folder, ...patience, ...reporting];
};

/** @param {string} databaseUrl @param {number} port @returns {Record<string, Step>} */
const stepsAgainst = (databaseUrl, port) => {
  const env = {
    ...process.env,
    TEST_DATABASE_URL: databaseUrl,
    E2E_PORT: String(port),
    NG_CLI_ANALYTICS: 'false',
  };
  let built = false;
  return {
    format: async () => checked(await runTool('prettier/bin/prettier.cjs', ['--check', '.'])),
    lint: async () => checked(await runTool('eslint/bin/eslint.js', ['.', '--max-warnings', '0'])),
    types: async () => checked(await types()),
    'tests of shared': async (report) =>
      vitestTally(await runTool(vitest, vitestIn('shared', report)), report),
    'tests of the api': async (report) =>
      vitestTally(await runTool(vitest, vitestIn('api', report), { env }), report),
    'tests of the client': async (report) => {
      const reporters = ['--reporters=json', '--reporters=default', `--output-file=${report}`];
      const args = ['test', '--watch=false', '--no-progress', ...reporters];
      return vitestTally(await runTool('@angular/cli/bin/ng.js', args, { env }), report);
    },
    build: async () => {
      const code = await buildPages();
      built = code === 0;
      return checked(code);
    },
    'tests in the browser': async (report) => {
      if (!built) {
        say('Not run: the application could not be built.');
        return checked(1);
      }
      const args = ['test', '-c', 'client/playwright.config.ts'];
      const reporting = { env: { ...env, E2E_REPORT: report } };
      return playwrightTally(await runTool('@playwright/test/cli.js', args, reporting), report);
    },
  };
};

/** @param {Record<string, Step>} steps @param {string} reports the folder for their reports */
const runAll = async (steps, reports) => {
  mkdirSync(reports);
  /** @type {[string, Tally, number][]} */
  const results = [];
  for (const [name, step] of Object.entries(steps)) {
    say(`\n──── ${name}`);
    const began = Date.now();
    const tally = await step(join(reports, `${results.length}.json`));
    results.push([name, tally, Math.round((Date.now() - began) / 1000)]);
  }
  return results;
};

await runBody(async () => {
  closeOnSignal(130);
  await Promise.all([installPackages(), installPostgres().then(installChromium)]);
  const { folder, url } = await startThrowAway();
  const results = await runAll(stepsAgainst(url, await freePort()), join(folder, 'reports'));
  await closeAll();

  say('\n────');
  for (const [name, { passed, failed }, seconds] of results) {
    const verdict = failed === 0 ? 'ok    ' : 'FAILED';
    say(`${verdict} ${name}: ${passed} passed, ${failed} failed (${seconds} s)`);
  }
  const total = sum(results.map(([, tally]) => tally));
  say(`${total.passed} passed, ${total.failed} failed`);
  process.exit(total.failed === 0 ? 0 : 1);
});
