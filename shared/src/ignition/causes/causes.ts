import { wiringCauses, type WiringCause } from '../../contracts/calculations.js';
import type { Wiring } from '../wiring.js';
import type { Cause } from './cause.js';
import { mixed } from './mixed.js';
import { otherFiringOrder } from './other-firing-order.js';
import { outletsReadAsPosts } from './outlets-read-as-posts.js';
import { right } from './right.js';
import { twoLeadsSwapped } from './two-leads-swapped.js';
import { wholeSetMoved } from './whole-set-moved.js';
import { wiredAgainstTheRotor } from './wired-against-the-rotor.js';

export const causes: Readonly<Record<WiringCause, Cause>> = {
  right,
  'whole-set-moved': wholeSetMoved,
  'outlets-read-as-posts': outletsReadAsPosts,
  'wired-against-the-rotor': wiredAgainstTheRotor,
  'two-leads-swapped': twoLeadsSwapped,
  'other-firing-order': otherFiringOrder,
  mixed,
};

/** The cause that is named, which is the first in the contract's order of precedence, and the others that fit. */
export function causesOf(wiring: Wiring): { cause: WiringCause; alsoFits: readonly WiringCause[] } {
  const [cause = 'mixed', ...others] = wiringCauses.filter((one) => causes[one].fits(wiring));
  // Every wrong wiring is mixed: that is said only where nothing better is.
  return { cause, alsoFits: others.filter((one) => one !== 'mixed') };
}

/** The name of a cause for a heading, such as `Two leads swapped`. */
export function causeTitle(cause: WiringCause): string {
  return causes[cause].title;
}
