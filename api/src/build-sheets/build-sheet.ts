import type { Dialect } from '@second-spanner/shared/contracts/people';
import type { Tool } from '@second-spanner/shared/contracts/registers';
import type { Sheet, StepDetail } from '@second-spanner/shared/contracts/sheets';
import type { Paper } from '../paper/paper-size.js';

/** Everything that a build sheet prints, as its reader may see it. */
export interface BuildSheet {
  readonly sheet: Sheet;
  readonly steps: readonly StepDetail[];
  readonly tools: readonly Tool[];
  readonly shopName: string;
  readonly demo: boolean;
  /** The shop's trade words: a printed sheet keeps them. */
  readonly dialect: Dialect;
  /** Where a printed code is checked, without the code. */
  readonly verificationAddress: string;
  readonly paper: Paper;
}
