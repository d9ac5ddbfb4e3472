import { InputError } from '@second-spanner/shared/contracts/input-error';
import { badInput, HttpProblem, keyTaken, type Trouble } from './http-problem.js';

/** SQLSTATEs of our own triggers: their sentences are written to be shown. */
const ownStates = new Set(['SP001', 'SP002']);

/** What pg and PostgreSQL say when the database is away or going down. */
const away = new Set([
  'ECONNREFUSED',
  'ECONNRESET',
  'ETIMEDOUT',
  'EPIPE',
  'ENOTFOUND',
  '57P01',
  '57P02',
  '57P03',
  '53300',
]);
const awayWords =
  /connection terminated|timeout exceeded when trying to connect|client has encountered a connection error|not queryable/i;

/** How PostgreSQL's names of the constraints end that let an idempotency key count once. */
const onceOnly = '_shop_id_idempotency_key_key';

/** What the body parser says, by its `type`. */
const parserTroubles: Readonly<Record<string, readonly [Trouble, string]>> = {
  'entity.too.large': ['too-large', 'The request is larger than 100 kB.'],
  'entity.parse.failed': ['bad-input', 'The request is not valid JSON.'],
  'encoding.unsupported': ['unsupported-type', 'This content encoding is not understood.'],
  'charset.unsupported': ['unsupported-type', 'JSON is sent as UTF-8.'],
  'request.aborted': ['bad-input', 'The request ended early.'],
  'request.size.invalid': ['bad-input', 'The request is shorter or longer than it says.'],
};

/** What errors of the database and of the body parser say of themselves beside their message. */
interface Refused {
  readonly code?: unknown;
  readonly constraint?: unknown;
  readonly type?: unknown;
  readonly status?: unknown;
}

/** Any error as the problem that is told; an unknown one tells nothing about the inside. */
export function toProblem(error: unknown): HttpProblem {
  if (error instanceof HttpProblem) return error;
  if (error instanceof InputError) return badInput({ field: error.field, message: error.message });
  if (!(error instanceof Error)) return unexpected();
  const { code, constraint, type, status } = error as Refused;
  if (typeof code === 'string' && ownStates.has(code)) {
    return new HttpProblem('refused-by-rules', error.message);
  }
  if ((typeof code === 'string' && away.has(code)) || awayWords.test(error.message)) {
    return new HttpProblem('unavailable', 'The database is away just now. Try again in a few seconds.');
  }
  if (code === '23505' && typeof constraint === 'string' && constraint.endsWith(onceOnly)) {
    return keyTaken();
  }
  const parser = typeof type === 'string' ? parserTroubles[type] : undefined;
  if (parser) return new HttpProblem(...parser);
  // Express itself refuses an address that cannot be decoded.
  if (error instanceof URIError || status === 400) {
    return new HttpProblem('bad-input', 'The request cannot be read.');
  }
  return unexpected();
}

const unexpected = (): HttpProblem =>
  new HttpProblem('unexpected', 'Something went wrong on our side. It is in the log.');
