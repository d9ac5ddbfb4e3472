import { InputError } from '../contracts/input-error.js';
import { requireList, requireNumber } from '../quantities/require.js';

/** How far the intervals may miss the cycle because they were rounded when written down, crank degrees. */
export const intervalSlack = 0.1;

export interface FiringIntervals {
  /** From each cylinder of the order to the next, crank degrees; the last leads back to the first. */
  readonly each: readonly number[];
  /** When each cylinder fires, crank degrees after the first of the order. */
  readonly firesAt: readonly number[];
  /** The one interval of an engine that fires evenly, crank degrees; else null. */
  readonly even: number | null;
}

/**
 * An unknown input as the firing intervals of `count` cylinders, which fill the cycle; undefined is even.
 * Throws `InputError` on `field` or an item of it.
 *
 * @param cycle crank degrees: 720 for a four-stroke, 360 for a two-stroke
 */
export function requireIntervals(
  input: unknown,
  count: number,
  cycle: number,
  field: string,
): FiringIntervals {
  const even = cycle / count;
  if (input === undefined) {
    const each = Array.from({ length: count }, () => even);
    return { each, firesAt: each.map((_, i) => (i * cycle) / count), even };
  }
  const items = requireList(input, field, { max: 1000 });
  if (items.length !== count) {
    throw new InputError(
      field,
      `There must be as many intervals as cylinders: ${count}, not ${items.length}.`,
    );
  }
  const each = items.map((item, i) => {
    const interval = requireNumber(item, `${field}[${i}]`, { min: 0, max: cycle });
    if (interval === 0) throw new InputError(`${field}[${i}]`, 'An interval must be more than 0°.');
    return interval;
  });
  return { each, firesAt: startsOf(each, cycle, field), even: evenOr(each, even) };
}

function startsOf(each: readonly number[], cycle: number, field: string): readonly number[] {
  let at = 0;
  const starts = each.map((interval) => {
    const start = at;
    at += interval;
    return start;
  });
  if (Math.abs(at - cycle) > intervalSlack) {
    const sum = Math.round(at * 1000) / 1000;
    throw new InputError(field, `The intervals must add up to ${cycle}° of crank; they add up to ${sum}°.`);
  }
  return starts;
}

function evenOr(each: readonly number[], even: number): number | null {
  return each.every((interval) => Math.abs(interval - even) <= intervalSlack / each.length) ? even : null;
}
