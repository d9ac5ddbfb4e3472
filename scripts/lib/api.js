// @ts-check
// The api process: started, waited for, watched.
import { setTimeout as pause } from 'node:timers/promises';
import { apiMain, clientBuilt, root } from './places.js';
import { begin } from './run.js';
import { Trouble } from './say.js';

/**
 * @typedef {object} ApiPlace
 * @property {number} port
 * @property {string} databaseUrl
 * @property {string} files the folder for photos
 * @property {string} smtpUrl where it sends mail to
 * @property {string} secret what it signs its tokens with
 */

/**
 * @typedef {object} StartOptions
 * @property {string[]} [nodeArgs]
 * @property {boolean} [quiet] its log is left out
 * @property {(pid: number | undefined) => void} [onSpawn] told as soon as there is a process
 */

/** @param {ApiPlace} place */
export const apiEnvironment = ({ port, databaseUrl, files, smtpUrl, secret }) => ({
  ...process.env,
  PORT: String(port),
  HOST: '127.0.0.1',
  PUBLIC_URL: process.env['PUBLIC_URL'] ?? `http://127.0.0.1:${port}`,
  DATABASE_URL: databaseUrl,
  DATA_DIR: files,
  CLIENT_DIR: clientBuilt,
  SMTP_URL: process.env['SMTP_URL'] ?? smtpUrl,
  JWT_SECRET: secret,
  DEMO: process.env['DEMO'] ?? '1',
  LOG_LEVEL: process.env['LOG_LEVEL'] ?? 'warn',
});

/** @param {string} address */
const answers = async (address) => {
  try {
    const response = await fetch(`${address}/api/health`, { signal: AbortSignal.timeout(2000) });
    return response.status === 200;
  } catch {
    return false;
  }
};

/**
 * Starts the api and waits until it answers that it is well.
 * @param {NodeJS.ProcessEnv} env @param {StartOptions} [options]
 */
export const startApi = async (env, { nodeArgs = [], quiet = false, onSpawn } = {}) => {
  const stdout = quiet ? 'ignore' : 'inherit';
  const child = begin(process.execPath, [...nodeArgs, apiMain], {
    cwd: root,
    env,
    stdio: ['ignore', stdout, 'inherit'],
  });
  onSpawn?.(child.pid);
  const address = `http://${env['HOST']}:${env['PORT']}`;
  const giveUpAt = Date.now() + 300_000;
  while (!(await answers(address))) {
    if (child.exitCode !== null || child.signalCode !== null) {
      throw new Trouble('The api ended before it was ready; it says why above.');
    }
    if (Date.now() > giveUpAt) throw new Trouble('The api was not ready within five minutes.');
    await pause(100);
  }
  return { child, address };
};
