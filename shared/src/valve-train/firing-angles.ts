import type { Cylinder } from '../contracts/calculations.js';
import { InputError } from '../contracts/input-error.js';
import { requireIntervals } from '../ignition/firing-intervals.js';
import { requireFiringOrder } from '../ignition/firing-order.js';
import { listed } from '../ignition/words.js';
import { cycle, wrapped } from './windows.js';

/** How far a companion's firing may be from one whole turn, where the intervals were rounded. */
const companionSlack = 0.1;

export interface Firing {
  readonly cylinder: Cylinder;
  /** Crank degrees after the first cylinder of the order fires, in [0, 720). */
  readonly firesAt: number;
}

/**
 * The crank angle at which each cylinder of a four-stroke fires, in the firing order, the first at 0°.
 * `intervals[i]` runs from `firingOrder[i]` to the next one, the last back to the first; left out, all are
 * alike.
 *
 * @throws InputError on `firingOrder`, `firingOrder[i]`, `intervals` or `intervals[i]`
 */
export function firingAngles(firingOrder: unknown, intervals?: unknown): readonly Firing[] {
  const order = requireFiringOrder(firingOrder, 'firingOrder');
  const { firesAt } = requireIntervals(intervals, order.length, cycle, 'intervals');
  return order.map((cylinder, i) => ({ cylinder, firesAt: firesAt[i] ?? 0 }));
}

/** The firing of one cylinder. Throws `InputError` on `field` for one that the order does not have. */
export function firingOf(firings: readonly Firing[], cylinder: unknown, field: string): Firing {
  const found = firings.find((firing) => firing.cylinder === cylinder);
  if (!found) {
    const order = listed(firings.map((firing) => firing.cylinder));
    throw new InputError(field, `This must be a cylinder of the firing order: ${order}.`);
  }
  return found;
}

/**
 * The cylinder that fires one whole crank turn (360°) apart and so stands at the other TDC at the same time;
 * none in most odd-fire engines and in those with an odd number of cylinders.
 */
export function companionOf(firings: readonly Firing[], firing: Firing): Cylinder | undefined {
  const apart = (other: Firing): number => wrapped(other.firesAt - firing.firesAt);
  return firings.find((other) => Math.abs(apart(other) - cycle / 2) <= companionSlack)?.cylinder;
}
