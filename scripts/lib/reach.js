// @ts-check
// Whether another user can get at a folder.
import { spawnSync } from 'node:child_process';

/**
 * Whether the account may enter the folder, through all the folders above it too.
 * @param {string} folder @param {import('./postgres-binaries.js').Account} [account] ourselves when left out
 */
export const canReach = (folder, account) =>
  spawnSync('test', ['-x', folder], { cwd: '/', ...account }).status === 0;
