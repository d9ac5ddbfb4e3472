import type { ThreadStack } from '../contracts/fastening.js';

/** What becomes of a stack, lengths in metres. */
export interface StackFigures {
  readonly verdict: ThreadStack['verdict'];
  readonly reason: string;
  readonly engagement: number;
  readonly protrusion?: number;
  readonly spare?: number;
  readonly nutHeight?: number;
  readonly lengthNeeded: number;
  readonly assumed: readonly string[];
}
