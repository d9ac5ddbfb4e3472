import type { FieldError } from './input-error.js';

/** Problem Details, RFC 9457, with the fields that are wrong. */
export interface Problem {
  readonly type: string;
  readonly title: string;
  readonly status: number;
  readonly detail?: string;
  readonly errors?: readonly FieldError[];
}
