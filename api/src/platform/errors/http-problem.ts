import { STATUS_CODES } from 'node:http';
import type { FieldError } from '@second-spanner/shared/contracts/input-error';
import type { Problem } from '@second-spanner/shared/contracts/problem';

/** Which status answers which trouble. The one place where statuses are chosen. */
export const statusOf = {
  'bad-input': 400,
  'not-signed-in': 401,
  forbidden: 403,
  'not-found': 404,
  conflict: 409,
  'too-large': 413,
  'unsupported-type': 415,
  'refused-by-rules': 422,
  'too-many-requests': 429,
  unexpected: 500,
  unavailable: 503,
} as const;
export type Trouble = keyof typeof statusOf;

/** An answer other than success, with a sentence that can be shown to a person. */
export class HttpProblem extends Error {
  override readonly name = 'HttpProblem';

  constructor(
    readonly trouble: Trouble,
    readonly detail: string,
    readonly errors?: readonly FieldError[],
  ) {
    super(detail);
  }

  get status(): number {
    return statusOf[this.trouble];
  }

  /** As Problem Details, RFC 9457. */
  toProblem(): Problem {
    return {
      type: 'about:blank',
      title: STATUS_CODES[this.status] ?? 'Error',
      status: this.status,
      detail: this.detail,
      ...(this.errors && { errors: this.errors }),
    };
  }
}

/** The input cannot be used: which fields, and what would be right. */
export const badInput = (...errors: readonly FieldError[]): HttpProblem =>
  new HttpProblem('bad-input', errors[0]?.message ?? 'The input cannot be used.', errors);

/** There is no such thing, or it is not this person's to see: the answer is the same. */
export const notFound = (what: string): HttpProblem =>
  new HttpProblem('not-found', `There is no such ${what}.`);

export const notSignedIn = (): HttpProblem => new HttpProblem('not-signed-in', 'Nobody is signed in.');

export const forbidden = (detail: string): HttpProblem => new HttpProblem('forbidden', detail);

/** Something happened meanwhile; `detail` says what. */
export const conflict = (detail: string): HttpProblem => new HttpProblem('conflict', detail);

/** An idempotency key came with one request and stands under another. */
export const keyTaken = (): HttpProblem => conflict('This key was used for another request.');

/** The rules of the sheet refuse it; `detail` says which hold or step. */
export const refusedByRules = (detail: string): HttpProblem => new HttpProblem('refused-by-rules', detail);
