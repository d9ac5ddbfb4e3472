import { InputError } from '../contracts/input-error.js';
import type { Quantity } from '../contracts/quantity.js';
import { floatNoise } from '../measuring/reading-input.js';
import { toSi } from '../quantities/convert.js';
import { requireQuantity, requireRecord } from '../quantities/require.js';

/** What opening and closing were judged by. */
export interface Quoted {
  readonly by: 'lift' | 'lash';
  readonly at: Quantity;
}

/** An unknown input as one of a lift, more than zero, and a lash. Throws `InputError` on `field` or below. */
export function requireQuotedAt(input: unknown, field: string): Quoted {
  const { lift, lash } = requireRecord(input, field);
  if ((lift === undefined) === (lash === undefined)) {
    throw new InputError(
      field,
      'Say one of the two: the lift at the valve, or the clearance, that the timing is quoted at.',
    );
  }
  return lift === undefined
    ? { by: 'lash', at: requireQuantity(lash, 'length', `${field}.lash`) }
    : { by: 'lift', at: requireQuantity(lift, 'length', `${field}.lift`, { zero: false }) };
}

/** Whether two timings can be compared: quoted at the same lift, or with the same lash. */
export function isQuotedAlike(one: Quoted, other: Quoted): boolean {
  const [a, b] = [toSi(one.at), toSi(other.at)];
  return one.by === other.by && Math.abs(a - b) <= floatNoise(a, b);
}
