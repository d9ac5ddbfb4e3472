// @ts-check
// Finds PostgreSQL's programs, and the user they run as.
import { accessSync, constants, readFileSync, readdirSync, realpathSync, statSync } from 'node:fs';
import { delimiter, dirname, join } from 'node:path';
import { ask } from './run.js';
import { Trouble } from './say.js';

/** @typedef {{ bin: string, major: number }} Postgres where its programs are, and its major version */
/** @typedef {{ uid: number, gid: number }} Account */

const debianFolder = '/usr/lib/postgresql';
const programs = ['initdb', 'pg_ctl', 'postgres'];

/** @param {string} folder */
const hasPrograms = (folder) => {
  try {
    programs.forEach((program) => accessSync(join(folder, program), constants.X_OK));
    return true;
  } catch {
    return false;
  }
};

const candidates = () => {
  /** @type {string[]} */
  let debian = [];
  try {
    debian = readdirSync(debianFolder).map((version) => join(debianFolder, version, 'bin'));
  } catch {
    // Not there: PostgreSQL may still be on the PATH.
  }
  const onPath = (process.env['PATH'] ?? '').split(delimiter).filter(hasPrograms);
  return [...debian, ...onPath.map((folder) => dirname(realpathSync(join(folder, 'pg_ctl'))))];
};

/** Every PostgreSQL on this machine, the newest first. @returns {Postgres[]} */
export const findPostgres = () =>
  [...new Set(candidates())]
    .filter(hasPrograms)
    .map((bin) => {
      const version = ask(join(bin, 'postgres'), ['-V']) ?? '';
      return { bin, major: Number(/(\d+)/.exec(version)?.[1] ?? 0) };
    })
    .filter(({ major }) => major > 0)
    .sort((a, b) => b.major - a.major);

/** The version that made a cluster, undefined when there is none in the folder. @param {string} folder */
export const versionOf = (folder) => {
  try {
    return Number(readFileSync(join(folder, 'PG_VERSION'), 'utf8').trim());
  } catch {
    return undefined;
  }
};

/** The PostgreSQL for a cluster: the one that made it, or the newest for a new one. @param {string} folder */
export const postgresFor = (folder) => {
  const found = findPostgres();
  const made = versionOf(folder);
  const fitting = made === undefined ? found[0] : found.find(({ major }) => major === made);
  if (fitting) return fitting;
  const here = found.map(({ major }) => major).join(' and ') || 'none';
  throw new Trouble(
    `The database in ${folder} was made by PostgreSQL ${made}; this machine has ${here}. ` +
      `Install PostgreSQL ${made} (Debian: apt-get install postgresql-${made}), ` +
      'or move that folder away to begin with an empty database.',
  );
};

/** @param {string} name @returns {Account | undefined} */
const accountNamed = (name) => {
  const line = readFileSync('/etc/passwd', 'utf8')
    .split('\n')
    .find((entry) => entry.startsWith(`${name}:`));
  const [, , uid, gid] = line?.split(':') ?? [];
  return uid && gid ? { uid: Number(uid), gid: Number(gid) } : undefined;
};

/**
 * The account that PostgreSQL runs as, when it can't be our own: it refuses root. An existing cluster's
 * owner, or `postgres`. Undefined for an ordinary user.
 * @param {string} cluster @returns {Account | undefined}
 */
export const serverAccount = (cluster) => {
  if (process.getuid?.() !== 0) return undefined;
  if (versionOf(cluster) !== undefined) {
    const { uid, gid } = statSync(cluster);
    if (uid !== 0) return { uid, gid };
  }
  const account = accountNamed('postgres');
  if (account) return account;
  throw new Trouble(
    'PostgreSQL refuses to run as root, and this machine has no user named "postgres" for it. ' +
      'Make one (useradd --system postgres), or run as an ordinary user.',
  );
};
