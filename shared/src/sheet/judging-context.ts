import type { Tool } from '../contracts/registers.js';

export interface JudgingContext {
  readonly tools: readonly Tool[];
  /** ISO date on which the entry is made: no calculation looks at a clock. */
  readonly on: string;
}
