// @ts-check
// The folder that holds everything of one installation: database, files, mail, secrets.
import { createHash, randomBytes } from 'node:crypto';
import {
  chmodSync,
  existsSync,
  mkdirSync,
  readFileSync,
  realpathSync,
  rmSync,
  statfsSync,
  writeFileSync,
} from 'node:fs';
import { homedir } from 'node:os';
import { dirname, join, resolve } from 'node:path';
import { root } from './places.js';
import { versionOf } from './postgres-binaries.js';
import { canReach } from './reach.js';
import { Trouble } from './say.js';

const megabyte = 1_000_000;
const forAll = '/var/lib/second-spanner';
const isRoot = () => process.getuid?.() === 0;

/** @param {string} path */
const shortHash = (path) => createHash('sha256').update(path).digest('hex').slice(0, 12);

/** Where this clone's data lies: SECOND_SPANNER_DATA, or a folder of its own outside the clone. */
export const dataFolder = () => {
  const chosen = process.env['SECOND_SPANNER_DATA'];
  if (chosen) return resolve(chosen);
  const own = process.env['XDG_DATA_HOME'] || join(homedir(), '.local/share');
  return join(isRoot() ? forAll : join(own, 'second-spanner'), shortHash(realpathSync(root)));
};

/** Makes the data folder and its parts. PostgreSQL's account may pass through it, and read nothing. @param {string} folder */
export const makeDataFolder = (folder) => {
  if (!existsSync(folder)) {
    mkdirSync(dirname(folder), { recursive: true });
    mkdirSync(folder);
    chmodSync(folder, isRoot() ? 0o711 : 0o700);
  }
  for (const part of ['files', 'mail']) {
    mkdirSync(join(folder, part), { recursive: true, mode: 0o700 });
  }
};

/**
 * The folder of the cluster: in the data folder, unless PostgreSQL's account can't get there.
 * @param {string} folder the data folder @param {import('./postgres-binaries.js').Account} [account]
 */
export const clusterFolder = (folder, account) => {
  if (canReach(folder, account)) return join(folder, 'postgres');
  const elsewhere = join(forAll, `database-${shortHash(folder)}`);
  mkdirSync(elsewhere, { recursive: true });
  chmodSync(forAll, 0o711);
  chmodSync(elsewhere, 0o711);
  return join(elsewhere, 'postgres');
};

/** @param {string} path @returns {string} the folder itself, or the nearest above it that is there */
const nearest = (path) => (existsSync(path) ? path : nearest(dirname(path)));

/** Refuses to begin on a disk that is nearly full. @param {string} folder the data folder */
export const ensureRoom = (folder) => {
  const needed = versionOf(join(folder, 'postgres')) === undefined ? 500 : 100;
  for (const place of [folder, root]) {
    const { bavail, bsize } = statfsSync(nearest(place));
    const free = Math.floor((bavail * bsize) / megabyte);
    if (free < needed) {
      throw new Trouble(
        `There is too little room on the disk for ${place}: ${free} MB are free, ${needed} MB are needed. ` +
          'Make some room, or choose another place for the data with SECOND_SPANNER_DATA, and start again.',
      );
    }
  }
};

/** A secret that is made once and kept in the data folder, for its owner's eyes only. @param {string} folder @param {string} name */
export const keptSecret = (folder, name) => {
  const path = join(folder, name);
  if (!existsSync(path)) writeFileSync(path, randomBytes(32).toString('base64url'), { mode: 0o600 });
  return readFileSync(path, 'utf8').trim();
};

/** The port that the database had last time, if any. @param {string} folder */
export const rememberedPort = (folder) => {
  try {
    return Number(readFileSync(join(folder, 'database-port'), 'utf8'));
  } catch {
    return undefined;
  }
};

/** @param {string} folder @param {number} port */
export const rememberPort = (folder, port) => {
  writeFileSync(join(folder, 'database-port'), `${port}\n`);
};

/** @typedef {{ pid: number, api?: number, address: string }} RunNote who runs on this folder now */

/** @param {string} folder */
const notePath = (folder) => join(folder, 'running.json');

/** @param {string} folder @param {RunNote} note */
export const writeRunNote = (folder, note) => {
  writeFileSync(notePath(folder), `${JSON.stringify(note)}\n`);
};

/** @param {string} folder */
export const removeRunNote = (folder) => {
  rmSync(notePath(folder), { force: true });
};

/** @param {string} folder @returns {RunNote | undefined} */
export const readRunNote = (folder) => {
  try {
    return JSON.parse(readFileSync(notePath(folder), 'utf8'));
  } catch {
    return undefined;
  }
};
