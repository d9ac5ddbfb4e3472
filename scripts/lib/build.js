// @ts-check
// Builds what is out of date, which it knows by a fingerprint of everything that goes in.
import { existsSync, readFileSync, writeFileSync } from 'node:fs';
import { fingerprint } from './fingerprint.js';
import { partOffline } from './offline.js';
import { apiMain, clientBuilt, root } from './places.js';
import { run, runQuietly, runTool } from './run.js';
import { Trouble, say } from './say.js';

const compiled = {
  stamp: `${root}/api/dist/.fingerprint`,
  result: apiMain,
  // The compiler's notes stand for what it wrote: another compilation meanwhile shows in them.
  inputs: [
    'package-lock.json',
    'tsconfig.base.json',
    ...['shared', 'api'].flatMap((name) => [
      `${name}/tsconfig.json`,
      `${name}/package.json`,
      `${name}/src`,
      `${name}/dist/.tsbuildinfo`,
    ]),
  ],
};

const pages = {
  // The builder empties its folder, so that this is gone with what it stood for.
  stamp: `${root}/client/dist/.fingerprint`,
  result: `${clientBuilt}/index.html`,
  inputs: ['angular.json', 'package-lock.json', 'tsconfig.base.json', 'client', 'shared/src'],
};

/** @param {typeof pages} part */
const isUpToDate = ({ stamp, result, inputs }) =>
  existsSync(stamp) && existsSync(result) && readFileSync(stamp, 'utf8') === fingerprint(inputs);

/** Compiles shared and api. The exit code. */
export const compile = async () => {
  const code = await runTool('typescript/bin/tsc', ['-b', 'shared', 'api']);
  if (code === 0) writeFileSync(compiled.stamp, fingerprint(compiled.inputs));
  return code;
};

/** Builds the pages. The exit code. @param {typeof run} [runner] */
export const buildPages = async (runner = run) => {
  const current = fingerprint(pages.inputs);
  const env = { ...process.env, NG_CLI_ANALYTICS: 'false' };
  const built = await runTool('@angular/cli/bin/ng.js', ['build', '--no-progress'], { env, runner });
  const code = built === 0 ? await partOffline(runner) : built;
  if (code === 0) writeFileSync(pages.stamp, current);
  return code;
};

/** Compiles shared and api when they are out of date, or says that it could not. */
export const ensureCompiled = async () => {
  if (isUpToDate(compiled)) return;
  say('Compiling …');
  if ((await compile()) !== 0) {
    throw new Trouble('The api could not be built; the compiler says why above.');
  }
};

/** Builds everything that is out of date, or says that it could not. */
export const ensureBuilt = async () => {
  await ensureCompiled();
  if (isUpToDate(pages)) return;
  say('Building the pages …');
  if ((await buildPages(runQuietly)) !== 0) {
    throw new Trouble('The pages could not be built; the compiler says why above.');
  }
};
