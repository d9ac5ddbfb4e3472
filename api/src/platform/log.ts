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
    pino.destination({ dest: 1, sync: false, minLength: 4096, periodicFlush: 500 }),
  );

/** One line a request: what was asked, how it ended, how long it took. Headers and bodies stay out. */
export const requestLog = (log: Logger): RequestHandler =>
  pinoHttp({
    logger: log,
    quietReqLogger: true,
    serializers: {
      req: ({ id, method, url }: { id: unknown; method: string; url: string }) => ({
        id,
        method,
        path: url.split('?', 1)[0],
      }),
      res: ({ statusCode }: { statusCode: number }) => ({ statusCode }),
    },
    customLogLevel: (_request, response, error) => {
      if (error !== undefined || response.statusCode >= 500) return 'error';
      return response.statusCode >= 400 ? 'warn' : 'info';
    },
  });
