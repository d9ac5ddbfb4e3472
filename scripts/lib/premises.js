// @ts-check
// What npm start and npm run dev have in common: everything that the api needs around it.
import { join } from 'node:path';
import { onClose } from './closing.js';
import {
  dataFolder,
  ensureRoom,
  keptSecret,
  makeDataFolder,
  readRunNote,
  removeRunNote,
  writeRunNote,
} from './data-folder.js';
import { installPackages, installPostgres } from './install.js';
import { endLeftOver, runningScript } from './left-over.js';
import { portToServe } from './ports.js';
import { Trouble, say } from './say.js';

/** Refuses to run twice on one folder; ends what a killed run has left behind. @param {string} folder */
const takeOver = async (folder) => {
  const other = runningScript(folder);
  if (other) {
    throw new Trouble(
      `Second Spanner is running already, at ${other.address} (process ${other.pid}), on the data in ${folder}. ` +
        'End that one first, or give this one another PORT and a data folder of its own (SECOND_SPANNER_DATA).',
    );
  }
  const note = readRunNote(folder);
  if (note?.api !== undefined) await endLeftOver(note.api);
  removeRunNote(folder);
};

/** Checks that everything can be started, before anything is. */
export const enter = async () => {
  const folder = dataFolder();
  await takeOver(folder);
  const port = await portToServe();
  ensureRoom(folder);
  makeDataFolder(folder);
  onClose(() => removeRunNote(folder));
  writeRunNote(folder, { pid: process.pid, address: `http://127.0.0.1:${port}` });
  // Side by side: one waits for the network while the other writes to the disk.
  await Promise.all([process.env['DATABASE_URL'] ? undefined : installPostgres(), installPackages()]);
  return { folder, port };
};

/** Notes the api's process, for the next start to end if this one is killed. @param {string} folder @param {string} address @param {number | undefined} api */
export const noteApi = (folder, address, api) => {
  writeRunNote(folder, { pid: process.pid, api, address });
};

/** What the api gets from its surroundings. @param {string} folder */
export const surroundings = async (folder) => {
  // Both need packages that may only just have been installed.
  const { openDatabase } = await import('./database.js');
  const { startMailbox } = await import('./mailbox.js');
  const database = await openDatabase(folder);
  const mailbox = await startMailbox(join(folder, 'mail'));
  return { database, mailbox, files: join(folder, 'files'), secret: keptSecret(folder, 'token-secret') };
};

/**
 * Says where everything is.
 * @param {{ address: string, folder: string, database: string, mail: string }} places
 */
export const tellPlaces = ({ address, folder, database, mail }) => {
  say();
  say(`Second Spanner is at   ${address}`);
  say();
  say('Demo accounts (all data about them is invented), password parallel-spanners-61:');
  say('  nell@lowmill.example       foreman        Low Mill Motor Works');
  say('  tomasz@lowmill.example     builder');
  say('  imogen@lowmill.example     countersigner');
  say('  ravi@lowmill.example       car owner');
  say('  hana@harbourlane.example   foreman        Harbour Lane Engines');
  say();
  say(`Data       ${folder}`);
  say(`Database   ${database}`);
  say(`Mail       ${mail} (kept on this machine, nothing is sent)`);
  say();
  say('Ctrl-C ends everything; the data stays.');
};
