import type { Wiring } from '../wiring.js';

/** One mistake that may explain a whole wiring. */
export interface Cause {
  /** Its name for a heading. */
  readonly title: string;
  /** Whether it explains the wiring, all of it; none but `right` fits one that is right. */
  fits(wiring: Wiring): boolean;
  /** What was done, as sentences for a builder; only for a wiring that it fits. */
  explain(wiring: Wiring): string;
}
