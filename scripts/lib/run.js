// @ts-check
// Runs other programs. Each gets a process group of its own, so that Ctrl-C reaches only us and
// everything is ended in the right order.
import { spawn, spawnSync } from 'node:child_process';
import { isClosing, onClose } from './closing.js';
import { root } from './places.js';

/** @typedef {import('node:child_process').ChildProcess} ChildProcess */
/** @typedef {import('node:child_process').SpawnOptions} SpawnOptions */

/** @type {Set<ChildProcess>} */
const running = new Set();

/** @param {ChildProcess} child @param {NodeJS.Signals} signal */
const signalGroup = (child, signal) => {
  try {
    if (child.pid) process.kill(-child.pid, signal);
  } catch {
    // It has ended meanwhile, which is what we want.
  }
};

/** Ends a program and what it started: asked first, forced when it does not listen. @param {ChildProcess} child */
export const end = (child, patience = 8000) =>
  new Promise((resolve) => {
    if (!running.has(child)) {
      resolve(undefined);
      return;
    }
    const force = setTimeout(() => signalGroup(child, 'SIGKILL'), patience);
    child.once('exit', () => {
      clearTimeout(force);
      resolve(undefined);
    });
    signalGroup(child, 'SIGTERM');
  });

/**
 * Starts a program in the project's folder and leaves it running; it is ended with the script.
 * @param {string} command @param {string[]} args @param {SpawnOptions} [options]
 */
export const begin = (command, args, options = {}) => {
  const child = spawn(command, args, { cwd: root, stdio: 'inherit', detached: true, ...options });
  running.add(child);
  child.once('exit', () => running.delete(child));
  child.once('error', () => running.delete(child));
  onClose(() => end(child));
  return child;
};

/**
 * Runs a program to its end. Resolves to its exit code, 1 when it was killed or is not there.
 * @param {string} command @param {string[]} args @param {SpawnOptions} [options] @returns {Promise<number>}
 */
export const run = (command, args, options = {}) =>
  new Promise((resolve) => {
    const child = begin(command, args, { stdio: ['ignore', 'inherit', 'inherit'], ...options });
    child.once('error', () => resolve(1));
    child.once('exit', (code) => resolve(code ?? 1));
  });

/**
 * Runs one of the tools that npm installed.
 * @param {string} script its file below node_modules @param {string[]} args
 * @param {SpawnOptions & { runner?: typeof run }} [options] how it is run: aloud unless told otherwise
 */
export const runTool = (script, args, { runner = run, ...options } = {}) =>
  runner(process.execPath, [`${root}/node_modules/${script}`, ...args], options);

/**
 * Runs a program to its end and keeps what it says to itself, unless it fails. Resolves to its exit code.
 * @param {string} command @param {string[]} args @param {SpawnOptions} [options] @returns {Promise<number>}
 */
export const runQuietly = (command, args, options = {}) =>
  new Promise((resolve) => {
    const child = begin(command, args, { ...options, stdio: ['ignore', 'pipe', 'pipe'] });
    /** @type {Buffer[]} */
    const said = [];
    child.stdout?.on('data', (chunk) => said.push(chunk));
    child.stderr?.on('data', (chunk) => said.push(chunk));
    child.once('error', () => resolve(1));
    child.once('close', (code) => {
      if (code !== 0 && !isClosing()) process.stderr.write(Buffer.concat(said));
      resolve(code ?? 1);
    });
  });

/**
 * Runs a short program and waits for it. What it printed, or undefined when it failed or is not there.
 * @param {string} command @param {string[]} args @param {import('node:child_process').SpawnSyncOptions} [options]
 */
export const ask = (command, args, options = {}) => {
  const result = spawnSync(command, args, { encoding: 'utf8', ...options });
  return result.status === 0 ? String(result.stdout).trim() : undefined;
};
