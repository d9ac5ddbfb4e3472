import type { Dialect } from '@second-spanner/shared/contracts/people';
import type { WorkingAnswer } from '@second-spanner/shared/workings/working';
import type { TypedLine } from '@second-spanner/shared/workings/working-text';
import type { Paper } from '../../paper/paper-size.js';

/** Everything that the paper of a working shows, worked out already. */
export interface WorkingPaper extends Pick<WorkingAnswer, 'parts' | 'assumed' | 'cautions' | 'basis'> {
  readonly title: string;
  readonly asks: string;
  readonly typed: readonly TypedLine[];
  /** ISO time: when it was kept, or the day it was printed. */
  readonly date: string;
  /** Where the same case opens again. */
  readonly address: string;
  readonly shopName: string;
  readonly demo: boolean;
  readonly dialect: Dialect;
  readonly paper: Paper;
  /** Who worked it out, or kept it. */
  readonly workedOutBy: string;
  /** What the case was begun from; empty when it was begun from nothing. */
  readonly begunFrom: string;
  /** The car that it was kept with, and what it was called there. */
  readonly kept: {
    readonly title: string;
    readonly keptAt: string;
    readonly carCode: string;
    readonly carName: string;
  } | null;
}
