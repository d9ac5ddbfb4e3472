// @ts-check
// Builds what is out of date: shared and api with tsc, which knows by itself; the client by a fingerprint of
// everything that goes into it.
import { createHash } from 'node:crypto';
import { existsSync, readFileSync, readdirSync, statSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { clientBuilt, root } from './places.js';
import { runTool } from './run.js';
import { Trouble, say } from './say.js';

const stamp = `${root}/client/dist/fingerprint`;
const inputs = ['angular.json', 'package-lock.json', 'tsconfig.base.json', 'client', 'shared/src'];
const leftOut = new Set(['node_modules', 'dist', 'e2e', '.angular']);

/** @param {string} path below the project's folder @returns {string[]} the files there, in a fixed order */
const filesIn = (path) => {
  const here = join(root, path);
  if (!existsSync(here)) return [];
  if (statSync(here).isFile()) return [path];
  return readdirSync(here, { withFileTypes: true })
    .filter(({ name }) => !leftOut.has(name) && !name.endsWith('.spec.ts'))
    .sort((a, b) => (a.name < b.name ? -1 : 1))
    .flatMap((entry) => {
      const inside = `${path}/${entry.name}`;
      return entry.isDirectory() ? filesIn(inside) : [inside];
    });
};

const fingerprint = () => {
  const hash = createHash('sha256').update(process.versions.node);
  for (const file of inputs.flatMap(filesIn)) {
    hash.update(`\0${file}\0`).update(readFileSync(join(root, file)));
  }
  return hash.digest('hex');
};

const lastFingerprint = () => {
  try {
    return readFileSync(stamp, 'utf8');
  } catch {
    return undefined;
  }
};

/** Compiles shared and api where they are out of date. The exit code. */
export const compile = () => runTool('typescript/bin/tsc', ['-b', 'shared', 'api']);

/** Builds the client when anything in it has changed, or always. The exit code. @param {{ always?: boolean }} [options] */
export const buildClient = async ({ always = false } = {}) => {
  const current = fingerprint();
  if (!always && current === lastFingerprint() && existsSync(join(clientBuilt, 'index.html'))) return 0;
  say('Building the pages …');
  const env = { ...process.env, NG_CLI_ANALYTICS: 'false' };
  const code = await runTool('@angular/cli/bin/ng.js', ['build', '--no-progress'], { env });
  if (code === 0) writeFileSync(stamp, current);
  return code;
};

/** Builds everything that is out of date, or says that it could not. */
export const build = async () => {
  if ((await compile()) !== 0 || (await buildClient()) !== 0) {
    throw new Trouble('The application could not be built; the compiler says why above.');
  }
};
