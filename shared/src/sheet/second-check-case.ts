import type { Tool } from '../contracts/registers.js';
import type { StepDefinition } from '../contracts/steps.js';
import type { RecordedEntry } from './current-entries.js';

export interface SecondCheckCase {
  readonly definition: StepDefinition;
  /** The current entries of the step. */
  readonly entries: readonly RecordedEntry[];
  readonly tools: readonly Tool[];
  /** ISO date of the second reading. */
  readonly on: string;
}
