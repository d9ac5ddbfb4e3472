import express, { type NextFunction, type Request, type RequestHandler } from 'express';
import { badInput, HttpProblem } from '../errors/http-problem.js';

/** Half a character, or none: the database takes no such text. */
const unstorable = /[\0\p{Surrogate}]/u;
const suspects = new WeakSet<object>();
const tooDeep = new WeakSet<object>();
/** More than anything that is asked here; what walks through a body could otherwise run out of stack. */
const deepest = 50;

const parse = express.json({
  limit: '100kb',
  strict: false,
  // Only an escape can bring such a text in, so that nearly every body passes with one look at its bytes.
  verify: (request, _response, bytes) => {
    if (isDeeperThan(deepest, bytes)) tooDeep.add(request);
    else if (/\\u(?:0000|d[89a-f])/i.test(bytes.toString('latin1'))) suspects.add(request);
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
  // Bytes are looked at before they are text: in another charset they say something else.
  if (/charset\s*=\s*"?(?!utf-8\b)/i.test(request.headers['content-type'] ?? '')) {
    throw new HttpProblem('unsupported-type', 'JSON is sent as UTF-8.');
  }
  parse(request, response, checked(request, next));
};

const checked =
  (request: Request, next: NextFunction): NextFunction =>
  (error?: unknown) => {
    if (error === undefined && tooDeep.has(request)) {
      const message = `Objects and lists stand inside each other more than ${deepest} deep.`;
      next(badInput({ field: '', message }));
      return;
    }
    const field = error === undefined && suspects.has(request) ? findUnstorable(request.body, '') : null;
    if (field === null) next(error);
    else next(badInput({ field, message: 'This text has a character that cannot be kept.' }));
  };

const [quote, backslash] = [0x22, 0x5c];
const [openList, openObject, closeList, closeObject] = [0x5b, 0x7b, 0x5d, 0x7d];

/** Whether lists and objects stand inside each other deeper than that: brackets outside of texts are counted. */
function isDeeperThan(most: number, bytes: Uint8Array): boolean {
  let depth = 0;
  let inText = false;
  for (let i = 0; i < bytes.length; i += 1) {
    const byte = bytes[i];
    if (inText) {
      if (byte === backslash) i += 1;
      else if (byte === quote) inText = false;
    } else if (byte === quote) inText = true;
    else if (byte === openList || byte === openObject) {
      depth += 1;
      if (depth > most) return true;
    } else if (byte === closeList || byte === closeObject) depth -= 1;
  }
  return false;
}

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
