// @ts-check
// Ends everything that a script started, last started first, whichever way the script ends.
import { complain } from './say.js';

/** @type {(() => unknown)[]} */
const closers = [];
/** @type {Promise<void> | undefined} */
let closing;

const closeInTurn = async () => {
  for (let close = closers.pop(); close; close = closers.pop()) {
    try {
      await close();
    } catch (error) {
      complain(error);
    }
  }
};

export const isClosing = () => closing !== undefined;

/** @param {() => unknown} close what ends the thing just started */
export const onClose = (close) => {
  closers.push(close);
};

/** Ends everything; a second call waits for the first. */
export const closeAll = () => (closing ??= closeInTurn());

/**
 * On Ctrl-C, a plain kill or a closed terminal: ends everything, then the process itself.
 * @param {number} exitCode
 */
export const closeOnSignal = (exitCode) => {
  for (const signal of /** @type {const} */ (['SIGINT', 'SIGTERM', 'SIGHUP'])) {
    process.on(signal, () => {
      void closeAll().then(() => process.exit(exitCode));
    });
  }
};

/** Runs a script's body; when it fails, says why, ends what was started and exits with 1. @param {() => Promise<void>} body */
export const runBody = async (body) => {
  try {
    await body();
  } catch (error) {
    if (!isClosing()) complain(error);
    await closeAll();
    process.exit(1);
  }
};
