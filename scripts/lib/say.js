// @ts-check
// What the scripts say: plain lines, and a clear sentence in place of a stack trace.

/** Something that the person at the machine can put right; its message is a whole sentence for them. */
export class Trouble extends Error {}

/** @param {string} [line] */
export const say = (line = '') => {
  process.stdout.write(`${line}\n`);
};

/** @param {unknown} error @returns {error is NodeJS.ErrnoException} */
const isSystemError = (error) => error instanceof Error && 'code' in error;

/** Says what went wrong: a sentence where we know one, else everything there is to know. @param {unknown} error */
export const complain = (error) => {
  if (error instanceof Trouble) {
    process.stderr.write(`\n${error.message}\n`);
  } else if (isSystemError(error) && error.code === 'ENOSPC') {
    process.stderr.write('\nThere is no room left on the disk. Make some room and start again.\n');
  } else if (isSystemError(error) && (error.code === 'EACCES' || error.code === 'EROFS') && error.path) {
    process.stderr.write(
      `\nThis user may not use ${error.path}. Give it the right to, or run as its owner.\n`,
    );
  } else {
    process.stderr.write(`\n${error instanceof Error ? error.stack : String(error)}\n`);
  }
};
