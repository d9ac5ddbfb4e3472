// @ts-check
// What a device keeps for work without a network: the pages from the first visit on, each working once it was
// opened, and so what is of no use without a network. The builder's notes say which files are there for these alone.
import { readFileSync, writeFileSync } from 'node:fs';
import { root } from './places.js';
import { run, runTool } from './run.js';

/**
 * @typedef {{ path: string, kind: string }} Import
 * @typedef {{ entryPoint?: string, imports: Import[] }} Output
 * @typedef {Record<string, Output>} Outputs
 */

/** A working, the page that shows it, or the form that starts a sheet. */
const openedLater =
  /(^|\/)(shared\/(dist|src)\/workings|client\/src\/app\/(workings\/working|cars\/start))\//;

/** @param {Outputs} outputs */
const isOpenedLater =
  (outputs) =>
  (/** @type {Import} */ { path, kind }) =>
    kind === 'dynamic-import' && openedLater.test(outputs[path]?.entryPoint ?? '');

/**
 * The scripts that no page needs before such a part is opened: those that can't be come by from the first one
 * without opening one.
 * @param {Outputs} outputs
 */
export const filesOpenedLater = (outputs) => {
  const isLater = isOpenedLater(outputs);
  const needed = new Set(
    Object.keys(outputs).filter((name) => outputs[name]?.entryPoint?.endsWith('src/main.ts')),
  );
  for (const name of needed) {
    for (const each of outputs[name]?.imports ?? []) if (!isLater(each)) needed.add(each.path);
  }
  return Object.keys(outputs).filter((name) => name.endsWith('.js') && !needed.has(name));
};

/**
 * Writes the service worker's list again, what is opened later apart. The exit code.
 * @param {typeof run} [runner]
 */
export const partOffline = async (runner = run) => {
  const folder = 'client/dist';
  /** @type {{ outputs: Outputs }} */
  const { outputs } = JSON.parse(readFileSync(`${root}/${folder}/stats.json`, 'utf8'));
  /** @type {{ assetGroups: object[] }} */
  const config = JSON.parse(readFileSync(`${root}/client/ngsw-config.json`, 'utf8'));
  const files = filesOpenedLater(outputs).map((name) => `/${name}`);
  const later = { name: 'opened-later', installMode: 'lazy', updateMode: 'prefetch', resources: { files } };
  const parted = `${folder}/ngsw-config.json`;
  writeFileSync(
    `${root}/${parted}`,
    JSON.stringify({ ...config, assetGroups: [later, ...config.assetGroups] }),
  );
  return runTool('@angular/service-worker/ngsw-config.js', [`${folder}/browser`, parted], { runner });
};
