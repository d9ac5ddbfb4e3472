import type { RequestHandler } from 'express';
import { pino, type DestinationStream, type Logger } from 'pino';
import { pinoHttp } from 'pino-http';

/** What is never written, wherever it turns up in a line. */
const secrets = [
  'req.headers.cookie',
  'req.headers.authorization',
  'req.headers["x-xsrf-token"]',
  'res.headers["set-cookie"]',
  'password',
  '*.password',
];

/**
 * An error as it is logged: what it is and where it came from. A failed statement carries its SQL, its parameters
 * and the row that was refused: readings, hashes and names, which stay out.
 */
export function errorForLog(error: unknown): object {
  if (!(error instanceof Error)) return { type: typeof error };
  const { code } = error as { code?: unknown };
  return {
    type: error.constructor.name,
    message: error.message,
    ...((typeof code === 'string' || typeof code === 'number') && { code }),
    stack: error.stack,
  };
}

/** The log: one JSON line an event, to standard output, written in bundles at least every half second. */
export const createLog = (
  level: string,
  to: DestinationStream = pino.destination({ dest: 1, sync: false, minLength: 8192, periodicFlush: 500 }),
): Logger =>
  pino(
    {
      level,
      base: undefined,
      redact: { paths: secrets, censor: '[hidden]' },
      serializers: { err: errorForLog },
    },
    to,
  );

interface AskedFor {
  readonly id: unknown;
  readonly method: string;
  readonly originalUrl?: string;
  readonly url: string;
}

/** One line a request: what was asked, how it ended, how long it took. Headers and bodies stay out. */
export const requestLog = (log: Logger): RequestHandler =>
  pinoHttp({
    logger: log,
    // The request itself, not a copy with all its headers.
    wrapSerializers: false,
    serializers: {
      err: errorForLog,
      req: ({ id, method, originalUrl, url }: AskedFor) => ({
        id,
        method,
        path: (originalUrl ?? url).split('?', 1)[0],
      }),
      res: ({ statusCode }: { statusCode: number }) => ({ statusCode }),
    },
    customLogLevel: (_request, response, error) => {
      if (error !== undefined || response.statusCode >= 500) return 'error';
      return response.statusCode >= 400 ? 'warn' : 'info';
    },
  });
