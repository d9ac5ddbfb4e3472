import express, { type NextFunction, type Request, type RequestHandler } from 'express';
import { badInput, HttpProblem } from '../errors/http-problem.js';

/** Half a character, or none: the database takes no such text. */
const unstorable = /[\0\p{Surrogate}]/u;
const suspects = new WeakSet<object>();

const parse = express.json({
  limit: '100kb',
  strict: false,
  // Only an escape can bring such a text in, so that nearly every body passes with one look at its bytes.
  verify: (request, _response, bytes) => {
    if (/\\u(?:0000|d[89a-f])/i.test(bytes.toString('latin1'))) suspects.add(request);
  },
});

/** Reads a JSON body of at most 100 kB. A body of another type is refused rather than left unread. */
export const jsonBody: RequestHandler = (request, response, next) => {
  const { 'content-length': length, 'transfer-encoding': encoding } = request.headers;
  const hasBody = encoding !== undefined || (length !== undefined && length !== '0');
  if (!hasBody) {
    next();
    return;
  }
  if (!request.is('application/json')) {
    throw new HttpProblem('unsupported-type', 'The request must be JSON: content-type application/json.');
  }
  parse(request, response, checked(request, next));
};

const checked =
  (request: Request, next: NextFunction): NextFunction =>
  (error?: unknown) => {
    const field = error === undefined && suspects.has(request) ? findUnstorable(request.body, '') : null;
    if (field === null) next(error);
    else next(badInput({ field, message: 'This text has a character that cannot be kept.' }));
  };

function findUnstorable(value: unknown, path: string): string | null {
  if (typeof value === 'string') return unstorable.test(value) ? path : null;
  if (typeof value !== 'object' || value === null) return null;
  for (const [key, child] of Object.entries(value) as [string, unknown][]) {
    if (unstorable.test(key)) return path;
    const step = Array.isArray(value) ? `[${key}]` : `${path === '' ? '' : '.'}${key}`;
    const found = findUnstorable(child, path + step);
    if (found !== null) return found;
  }
  return null;
}
