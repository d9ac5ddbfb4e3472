import { InputError } from '../contracts/input-error.js';
import type { Quantity } from '../contracts/quantity.js';
import { convert } from '../quantities/convert.js';
import { printQuantity } from '../quantities/print.js';
import { requireQuantity } from '../quantities/require.js';
import type { CrankThrow } from './piston-height.js';

/**
 * How far the crank stands from TDC, 0 to 180° either side, when the piston has come down by `fromTop` of its
 * stroke: the triangle of throw, rod and pin height, by the tangent of the half angle, which loses no figures
 * near the dead centres.
 *
 * @throws InputError on `field` for a distance that is longer than the stroke
 * Source: the half-angle formula of a triangle with three sides known; the piston motion equations.
 * Example: stroke 100 mm, rod 150 mm, half the stroke down: 80.41°.
 */
export function crankFromTop(crank: CrankThrow, fromTop: unknown, field: string): number {
  const { radius, rod, unit } = crank;
  const given: Quantity = requireQuantity(fromTop, 'length', field);
  const half = convert(given, unit).value / 2;
  if (half > radius * (1 + 1e-12)) {
    const stroke = printQuantity({ value: 2 * radius, unit });
    throw new InputError(field, `The piston comes down no further than its stroke, ${stroke}.`);
  }
  const below = (rod - half) * half;
  const above = (radius + rod - half) * Math.max(0, radius - half);
  return (2 * Math.atan2(Math.sqrt(below), Math.sqrt(above)) * 180) / Math.PI;
}
