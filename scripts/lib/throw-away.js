// @ts-check
// The tests' own PostgreSQL: a fresh cluster in the folder for temporary files, gone when the script ends.
import { randomBytes } from 'node:crypto';
import { chmodSync, mkdtempSync, readdirSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { onClose } from './closing.js';
import { freePort } from './ports.js';
import { postgresFor, serverAccount } from './postgres-binaries.js';
import { makeCluster, ownerUrl, startCluster, stopCluster } from './postgres.js';
import { canReach } from './reach.js';

const prefix = 'second-spanner-test-';

/** As a database that is kept runs: what it has acknowledged is on the disk. */
export const careful = { max_connections: '200' };
// The tests can be run again; a crash may cost them their data, never a wait for the disk.
const careless = { ...careful, fsync: 'off', synchronous_commit: 'off', full_page_writes: 'off' };

/** @param {number} pid */
const isAlive = (pid) => {
  try {
    process.kill(pid, 0);
    return true;
  } catch (error) {
    return error instanceof Error && 'code' in error && error.code === 'EPERM';
  }
};

/** @param {string} folder @param {string} [password] @returns {import('./postgres.js').Cluster} */
const clusterIn = (folder, password = '') => {
  const cluster = join(folder, 'postgres');
  const account = serverAccount(cluster);
  return { bin: postgresFor(cluster).bin, folder: cluster, log: join(folder, 'log'), account, password };
};

/** Removes what runs that were killed have left behind. @param {string} parent */
const sweep = async (parent) => {
  for (const name of readdirSync(parent)) {
    const pid = Number(new RegExp(`^${prefix}(\\d+)-`).exec(name)?.[1]);
    if (!pid || isAlive(pid)) continue;
    const folder = join(parent, name);
    await stopCluster(clusterIn(folder));
    rmSync(folder, { recursive: true, force: true });
  }
};

/**
 * Starts a throw-away cluster. Where it lies, its log, and the address of its superuser's database.
 * @param {Record<string, string>} [settings]
 */
export const startThrowAway = async (settings = careless) => {
  const account = serverAccount('');
  const parent = [tmpdir(), '/tmp', '/var/tmp'].find((place) => canReach(place, account)) ?? tmpdir();
  await sweep(parent);
  const folder = mkdtempSync(join(parent, `${prefix}${process.pid}-`));
  onClose(() => rmSync(folder, { recursive: true, force: true }));
  chmodSync(folder, 0o711);
  const cluster = clusterIn(folder, randomBytes(18).toString('base64url'));
  await makeCluster(cluster, { lasting: false });
  const port = await freePort();
  onClose(() => stopCluster(cluster));
  await startCluster(cluster, port, settings);
  return { folder, log: cluster.log, url: ownerUrl(cluster, port, 'postgres') };
};
