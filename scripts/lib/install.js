// @ts-check
// Installs what is missing: npm packages, PostgreSQL and Chromium from Debian's packages.
import { accessSync, constants, existsSync, readFileSync } from 'node:fs';
import { delimiter, join } from 'node:path';
import { root } from './places.js';
import { findPostgres } from './postgres-binaries.js';
import { ask, run, runQuietly } from './run.js';
import { Trouble, say } from './say.js';

/** @typedef {{ version?: string, optional?: boolean, link?: boolean }} Locked */

/** @param {string} path @returns {Record<string, Locked> | undefined} */
const lockedPackages = (path) => {
  try {
    return JSON.parse(readFileSync(path, 'utf8')).packages;
  } catch {
    return undefined;
  }
};

/** Whether every package of the lock file is installed in the version that it names. */
const packagesAreThere = () => {
  const wanted = lockedPackages(`${root}/package-lock.json`);
  const installed = lockedPackages(`${root}/node_modules/.package-lock.json`);
  if (!wanted || !installed) return false;
  return Object.entries(wanted).every(([path, { version, optional, link }]) => {
    const isPackage = path.includes('node_modules/');
    return !isPackage || link || optional || installed[path]?.version === version;
  });
};

/** @param {string} name a program's name @returns {string | undefined} where it is on the PATH */
export const onPath = (name) =>
  (process.env['PATH'] ?? '')
    .split(delimiter)
    .map((folder) => join(folder, name))
    .find((path) => {
      try {
        accessSync(path, constants.X_OK);
        return true;
      } catch {
        return false;
      }
    });

/** Runs `npm ci` unless node_modules holds what the lock file names. */
export const installPackages = async () => {
  if (packagesAreThere()) return;
  say('Installing the npm packages (a minute or two) …');
  const npm = process.env['npm_execpath'];
  const code = npm?.endsWith('.js')
    ? await run(process.execPath, [npm, 'ci', '--no-audit', '--no-fund'])
    : await run('npm', ['ci', '--no-audit', '--no-fund']);
  if (code !== 0) {
    throw new Trouble(
      'The npm packages could not be installed; npm says why above. Is the package registry reachable, and is there room on the disk?',
    );
  }
};

/**
 * Installs a Debian package; as an ordinary user through sudo, if that asks no password.
 * @param {string} name @param {string} purpose what it is, in a sentence's beginning @param {string} otherwise what else would do
 */
const installFromDebian = async (name, purpose, otherwise) => {
  if (!onPath('apt-get')) {
    throw new Trouble(
      `${purpose} is not on this machine, and there is no apt-get to install it with. ${otherwise}`,
    );
  }
  const isRoot = process.getuid?.() === 0;
  if (!isRoot && ask('sudo', ['-n', 'true']) === undefined) {
    throw new Trouble(
      `${purpose} is not on this machine, and this user may not install it. ` +
        `Run "apt-get install ${name}" as root, then start again. ${otherwise}`,
    );
  }
  say(`Installing ${name} from Debian's packages …`);
  const quietly = ['DEBIAN_FRONTEND=noninteractive', 'apt-get', '-qq', '-o', 'DPkg::Lock::Timeout=120'];
  const command = isRoot ? ['env', ...quietly] : ['sudo', '-n', 'env', ...quietly];
  await runQuietly(command[0] ?? '', [...command.slice(1), 'update']);
  const install = ['install', '-y', '--no-install-recommends', name];
  if ((await runQuietly(command[0] ?? '', [...command.slice(1), ...install])) !== 0) {
    throw new Trouble(`${name} could not be installed; apt-get says why above. ${otherwise}`);
  }
};

/** Installs PostgreSQL unless the machine has it. */
export const installPostgres = async () => {
  if (findPostgres().length > 0) return;
  const otherwise = 'Setting DATABASE_URL to a PostgreSQL database that you have will do instead.';
  await installFromDebian('postgresql', 'PostgreSQL', otherwise);
  if (findPostgres().length === 0) {
    throw new Trouble(`PostgreSQL was installed but its programs were not found. ${otherwise}`);
  }
};

/** Installs Chromium, for the browser tests, unless the machine has it. */
export const installChromium = async () => {
  if (existsSync('/usr/bin/chromium')) return;
  await installFromDebian('chromium', 'Chromium', 'The browser tests need it at /usr/bin/chromium.');
};
