import type { Quantity } from './quantity.js';
import type { Judgement } from './verdict.js';

/** One line of a compound's data sheet. */
export interface CurePoint {
  readonly temperature: Quantity;
  readonly gap?: Quantity;
  readonly substrate?: string;
  readonly activator?: boolean;
  /** Relative humidity of a moisture-cured sealant's line, percent. */
  readonly humidity?: number;
  readonly toHandle?: Quantity;
  readonly toLoad: Quantity;
  readonly full: Quantity;
}

export interface CureRequest {
  readonly sheet: readonly CurePoint[];
  readonly temperature: Quantity;
  readonly gap?: Quantity;
  readonly substrate?: string;
  readonly activator?: boolean;
  readonly humidity?: number;
  /** A date, counted to its end, UTC; compared with `applied`. */
  readonly lotExpires?: string;
  /** ISO times. */
  readonly applied: string;
  readonly closed?: string;
  /** The longest that may pass between applying and closing. */
  readonly openTime?: Quantity;
  readonly now: string;
  /** Temperatures on the way, each from its time on; before the first, `temperature`. */
  readonly log?: readonly { readonly at: string; readonly temperature: Quantity }[];
  /** The data sheet allows a re-torque after it has set. */
  readonly retorqueAllowed?: boolean;
}

export interface Cure extends Judgement {
  readonly handleAt?: string;
  readonly loadAt?: string;
  readonly fullAt?: string;
  /** Share of the way to loading that is behind, 0 to 1. */
  readonly progress?: number;
  readonly cautions?: readonly string[];
}
