// @ts-check
// What everything is measured on: a throw-away PostgreSQL that waits for its disk, the api with the demo, and a bare
// Express beside it, each a process of its own.
import { randomBytes } from 'node:crypto';
import { existsSync, mkdirSync } from 'node:fs';
import { join } from 'node:path';
import { setTimeout as pause } from 'node:timers/promises';
import { fileURLToPath, pathToFileURL } from 'node:url';
import { apiEnvironment, startApi } from '../lib/api.js';
import { freePort } from '../lib/ports.js';
import { begin } from '../lib/run.js';
import { Trouble } from '../lib/say.js';
import { ensureDatabase, withDatabase } from '../lib/sql.js';
import { careful, startThrowAway } from '../lib/throw-away.js';

/**
 * @typedef {object} Stage
 * @property {string} address of the api
 * @property {string} bare address of the bare Express
 * @property {string} probe where the api's event loop tells how late it is
 * @property {string} database its address, for a superuser
 * @property {string} log PostgreSQL's log
 * @property {boolean} explains whether PostgreSQL can tell the plans it works by
 * @property {number} seconds how long a load lasts
 * @property {boolean} full whether the large shop is to be as large as its goal says
 */

/** @param {string} file */
const beside = (file) => fileURLToPath(new URL(file, import.meta.url));

const startBare = async () => {
  const port = await freePort();
  begin(process.execPath, [beside('bare.js')], {
    env: { ...process.env, NODE_ENV: 'production', PORT: String(port) },
    stdio: ['ignore', 'ignore', 'inherit'],
  });
  const address = `http://127.0.0.1:${port}`;
  for (let tries = 0; tries < 300; tries += 1) {
    try {
      await fetch(address);
      return address;
    } catch {
      await pause(100);
    }
  }
  throw new Trouble('The bare Express did not answer.');
};

/** @param {string} superUrl @param {string} name */
const canExplain = (superUrl, name) =>
  withDatabase(superUrl, async (client) => {
    const found = await client.query("SELECT setting FROM pg_config WHERE name = 'PKGLIBDIR'");
    if (!existsSync(join(String(found.rows[0]?.setting), 'auto_explain.so'))) return false;
    await client.query(`ALTER DATABASE ${name} SET session_preload_libraries = 'auto_explain'`);
    return true;
  });

/** Starts everything. @param {Pick<Stage, 'seconds' | 'full'>} options @returns {Promise<Stage>} */
export const openStage = async ({ seconds, full }) => {
  const { startMailbox } = await import('../lib/mailbox.js');
  const { folder, log, url: superUrl } = await startThrowAway(careful);
  const [files, mail] = [join(folder, 'files'), join(folder, 'mail')];
  mkdirSync(files);
  mkdirSync(mail);
  const name = 'bench';
  const password = randomBytes(18).toString('base64url');
  await ensureDatabase(superUrl, { name, role: name, password });
  const explains = await canExplain(superUrl, name);
  const [port, probePort] = [await freePort(), await freePort()];
  const databaseUrl = Object.assign(new URL(superUrl), {
    username: name,
    password,
    pathname: `/${name}`,
  }).href;
  const { smtpUrl } = await startMailbox(mail);
  const env = apiEnvironment({
    ...{ port, databaseUrl, files, smtpUrl },
    secret: randomBytes(32).toString('base64url'),
  });
  const { address } = await startApi(
    // Limits and log are at work; the limit itself is out of reach.
    {
      ...env,
      NODE_ENV: 'production',
      LOG_LEVEL: 'info',
      REQUESTS_PER_MINUTE: '100000000',
      PROBE_PORT: String(probePort),
    },
    { quiet: true, nodeArgs: ['--import', pathToFileURL(beside('probe.js')).href] },
  );
  return {
    ...{ address, bare: await startBare(), probe: `http://127.0.0.1:${probePort}` },
    database: Object.assign(new URL(superUrl), { pathname: `/${name}` }).href,
    ...{ log, explains, seconds, full },
  };
};
