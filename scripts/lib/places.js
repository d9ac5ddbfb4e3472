// @ts-check
// Where things are: the project, and the files that stand for its parts.
import { fileURLToPath } from 'node:url';

/** The project's folder, without a slash at the end. */
export const root = fileURLToPath(new URL('../..', import.meta.url)).replace(/\/$/, '');
export const apiMain = `${root}/api/dist/main.js`;
export const apiReload = `${root}/api/dist/seed.js`;
export const clientBuilt = `${root}/client/dist/browser`;
