import type { RequestHandler } from 'express';
import { pino, type Logger } from 'pino';
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

/** The log: one JSON line an event, to standard output, written in bundles at least every half second. */
export const createLog = (level: string): Logger =>
  pino(
    { level, base: undefined, redact: { paths: secrets, censor: '[hidden]' } },
    pino.destination({ dest: 1, sync: false, minLength: 8192, periodicFlush: 500 }),
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
