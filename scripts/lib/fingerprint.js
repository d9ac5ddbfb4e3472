// @ts-check
// A fingerprint of source files: the same as long as nothing in them has changed.
import { createHash } from 'node:crypto';
import { existsSync, readFileSync, readdirSync, statSync } from 'node:fs';
import { join } from 'node:path';
import { root } from './places.js';

const leftOut = new Set(['node_modules', 'dist', 'e2e', '.angular']);

/** @param {string} path below the project's folder @returns {string[]} the files there, in a fixed order */
const filesIn = (path) => {
  const here = join(root, path);
  if (!existsSync(here)) return [];
  if (statSync(here).isFile()) return [path];
  return readdirSync(here)
    .filter((name) => !leftOut.has(name) && !name.endsWith('.spec.ts'))
    .sort()
    .flatMap((name) => filesIn(`${path}/${name}`));
};

/** @param {string[]} paths files and folders below the project's folder; tests and built files are left out */
export const fingerprint = (paths) => {
  const hash = createHash('sha256').update(process.versions.node);
  for (const file of paths.flatMap(filesIn)) {
    hash.update(`\0${file}\0`).update(readFileSync(join(root, file)));
  }
  return hash.digest('hex');
};
