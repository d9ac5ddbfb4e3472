import { InputError } from '../contracts/input-error.js';
import type { SizeLimits } from '../contracts/fits.js';
import { toSi } from '../quantities/convert.js';
import { printQuantity } from '../quantities/print.js';
import { requireQuantity, requireRecord, type QuantityOptions } from '../quantities/require.js';
import { fitNoise } from './fit-noise.js';

/**
 * An unknown input as a pair of lengths, the low one not above the high one.
 *
 * @throws InputError on `field` and below; on `field.low` where it is above the high limit
 */
export function requireLimits(input: unknown, field: string, options: QuantityOptions = {}): SizeLimits {
  const given = requireRecord(input, field);
  const low = requireQuantity(given['low'], 'length', `${field}.low`, options);
  const high = requireQuantity(given['high'], 'length', `${field}.high`, options);
  if (toSi(low) - toSi(high) > fitNoise) {
    throw new InputError(
      `${field}.low`,
      `The low limit ${printQuantity(low)} is above the high limit ${printQuantity(high)}.`,
    );
  }
  return { low, high };
}
