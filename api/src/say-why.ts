import { ConfigError } from './config.js';

/** What can be wrong around the application when it starts, by the error's code. */
const sentences: Readonly<Record<string, string>> = {
  ECONNREFUSED: 'No database answers at the address that DATABASE_URL names.',
  ENOTFOUND: 'There is no host of the name that DATABASE_URL gives.',
  ETIMEDOUT: 'The database that DATABASE_URL names does not answer in time.',
  '28P01': 'The database refuses the user or the password of DATABASE_URL.',
  '28000': 'The database refuses the user of DATABASE_URL.',
  '3D000': 'There is no database of the name that DATABASE_URL gives.',
  '42501': 'The user of DATABASE_URL may not make tables in that database.',
  EADDRINUSE: 'The port is taken by another program. Choose another with PORT.',
  EACCES: 'This user may not open that port. Choose one above 1023 with PORT.',
  EADDRNOTAVAIL: 'HOST names an address that this machine does not have.',
};

/** Says on standard error why the process cannot go on, and ends it with a failure. */
export function sayWhy(error: unknown): never {
  process.stderr.write(`${wordsFor(error)}\n`);
  process.exit(1);
}

function wordsFor(error: unknown): string {
  if (!(error instanceof Error)) return String(error);
  if (error instanceof ConfigError) return error.message;
  const { code } = error as { code?: unknown };
  const sentence = typeof code === 'string' ? sentences[code] : undefined;
  return sentence ? `${sentence} (${error.message})` : (error.stack ?? error.message);
}
