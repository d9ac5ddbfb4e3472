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
  /** The car that it was kept with, what it was called there, and by whom. */
  readonly kept: {
    readonly title: string;
    readonly keptBy: string;
    readonly keptAt: string;
    readonly carCode: string;
    readonly carName: string;
  } | null;
}
