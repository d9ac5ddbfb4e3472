import type { Unit } from '../contracts/quantity.js';
import { convert, toSi } from '../quantities/convert.js';
import { requireQuantity, requireRecord, requireText } from '../quantities/require.js';
import { classLimits } from './class-limits.js';
import { requireLimits } from './require-limits.js';

/**
 * A part's limits, metres, as distances from a size that both parts may share: the difference of two parts of
 * one size is then not lost in rounding.
 */
export interface PartLimits {
  readonly from: number;
  readonly low: number;
  readonly high: number;
  readonly unit: Unit;
}

/**
 * Limits of a hole or shaft given by its limits or by size and ISO 286 class.
 *
 * @throws InputError on `field` and below: `.low` above `.high`, no such `.class`, a `.size` beyond the table
 */
export function requireFitPart(input: unknown, of: 'hole' | 'shaft', field: string): PartLimits {
  const given = requireRecord(input, field);
  if (given['class'] === undefined) {
    const { low, high } = requireLimits(given, field, { zero: false });
    return { from: 0, low: toSi(low), high: toSi(high), unit: low.unit };
  }
  const size = requireQuantity(given['size'], 'length', `${field}.size`, { zero: false });
  const code = requireText(given['class'], `${field}.class`);
  const { lower, upper } = classLimits(convert(size, 'mm').value, code, of, field);
  return { from: toSi(size), low: lower * 1e-6, high: upper * 1e-6, unit: size.unit };
}
