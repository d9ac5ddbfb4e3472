import { InputError } from '../contracts/input-error.js';
import type { Quantity } from '../contracts/quantity.js';
import { convert } from '../quantities/convert.js';
import { printQuantity } from '../quantities/print.js';
import { requireQuantity, requireRecord } from '../quantities/require.js';

/** How far a torque may be missed, below and above, and the limits that makes, all in the torque's unit. */
export interface TorqueLimits {
  readonly below: number;
  readonly above: number;
  readonly low: Quantity;
  readonly high: Quantity;
}

/**
 * The tolerance of a torque as limits round it.
 *
 * @throws InputError on `tolerance`, `tolerance.low`, `tolerance.high`
 */
export function requireTorqueLimits(input: unknown, torque: Quantity): TorqueLimits {
  const tolerance = requireRecord(input, 'tolerance');
  const side = (name: 'low' | 'high'): number =>
    convert(requireQuantity(tolerance[name], 'torque', `tolerance.${name}`), torque.unit).value;
  const [below, above] = [side('low'), side('high')];
  if (below >= torque.value) {
    throw new InputError('tolerance.low', `This must be less than the torque, ${printQuantity(torque)}.`);
  }
  return {
    below,
    above,
    low: { value: torque.value - below, unit: torque.unit },
    high: { value: torque.value + above, unit: torque.unit },
  };
}
