// @ts-check
// What a device keeps for work without a network: the pages from the first visit on, each working once it was
// opened. The builder's notes say which files are there for workings alone.
import { readFileSync, writeFileSync } from 'node:fs';
import { root } from './places.js';
import { run, runTool } from './run.js';

/**
 * @typedef {{ path: string, kind: string }} Import
 * @typedef {{ entryPoint?: string, imports: Import[] }} Output
 * @typedef {Record<string, Output>} Outputs
 */

/** A working, or the page that shows it. */
const aWorking = /(^|\/)(shared\/(dist|src)\/workings|client\/src\/app\/workings\/working)\//;

/** @param {Outputs} outputs */
const isOpenedLater =
  (outputs) =>
  (/** @type {Import} */ { path, kind }) =>
    kind === 'dynamic-import' && aWorking.test(outputs[path]?.entryPoint ?? '');

/**
 * The scripts that no page needs before a working is opened: those that can't be come by from the first one
 * without opening a working.
 * @param {Outputs} outputs
 */
export const filesOfWorkings = (outputs) => {
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
 * Writes the service worker's list again, the files of workings apart. The exit code.
 * @param {typeof run} [runner]
 */
export const partOffline = async (runner = run) => {
  const folder = 'client/dist';
  /** @type {{ outputs: Outputs }} */
  const { outputs } = JSON.parse(readFileSync(`${root}/${folder}/stats.json`, 'utf8'));
  /** @type {{ assetGroups: object[] }} */
  const config = JSON.parse(readFileSync(`${root}/client/ngsw-config.json`, 'utf8'));
  const files = filesOfWorkings(outputs).map((name) => `/${name}`);
  const workings = { name: 'workings', installMode: 'lazy', updateMode: 'prefetch', resources: { files } };
  const parted = `${folder}/ngsw-config.json`;
  writeFileSync(
    `${root}/${parted}`,
    JSON.stringify({ ...config, assetGroups: [workings, ...config.assetGroups] }),
  );
  return runTool('@angular/service-worker/ngsw-config.js', [`${folder}/browser`, parted], { runner });
};
