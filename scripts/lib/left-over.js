// @ts-check
// Processes that a killed run has left behind.
import { readFileSync } from 'node:fs';
import { setTimeout as pause } from 'node:timers/promises';
import { readRunNote } from './data-folder.js';
import { apiMain } from './places.js';

/** @param {number} pid */
const commandOf = (pid) => {
  try {
    return readFileSync(`/proc/${pid}/cmdline`, 'utf8').split('\0');
  } catch {
    return [];
  }
};

/** The script that runs on the data folder now: npm start or npm run dev. @param {string} folder */
export const runningScript = (folder) => {
  const note = readRunNote(folder);
  if (!note) return undefined;
  return commandOf(note.pid).some((part) => /scripts\/(start|dev)\.js$/.test(part)) ? note : undefined;
};

/** Ends an api process of this clone that nobody looks after any more. @param {number} pid */
export const endLeftOver = async (pid) => {
  const isOurs = () => commandOf(pid).includes(apiMain);
  if (!isOurs()) return;
  process.kill(pid, 'SIGTERM');
  const forceAt = Date.now() + 5000;
  while (isOurs()) {
    await pause(50);
    if (Date.now() > forceAt && isOurs()) process.kill(pid, 'SIGKILL');
  }
};
