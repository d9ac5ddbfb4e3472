import type { Kind, Quantity } from '../contracts/quantity.js';
import { kindOf } from '../quantities/convert.js';
import { requireAnyQuantity, requireQuantity } from '../quantities/require.js';

/** Gaps are signed, vacuum reads below the air's pressure; a torque or a mass below zero is a slip. */
const signedKinds: ReadonlySet<Kind> = new Set(['length', 'temperature', 'pressure']);

/** An untrusted reading of any kind. Throws `InputError` on `field` and below. */
export function requireReading(input: unknown, field: string): Quantity {
  const reading = requireAnyQuantity(input, field, { negative: true });
  return requireQuantity(reading, kindOf(reading.unit), field, { negative: isSigned(reading) });
}

/** An untrusted figure of the same kind as a reading, such as its limit. Throws `InputError`. */
export function requireLike(input: unknown, reading: Quantity, field: string): Quantity {
  return requireQuantity(input, kindOf(reading.unit), field, { negative: isSigned(reading) });
}

/** An untrusted expanded uncertainty (half width) of a reading: never negative. Throws `InputError`. */
export function requireUncertainty(input: unknown, reading: Quantity, field: string): Quantity {
  return requireQuantity(input, kindOf(reading.unit), field, { interval: true });
}

function isSigned(reading: Quantity): boolean {
  return signedKinds.has(kindOf(reading.unit));
}

/** Two figures closer than this are equal: what converting and subtracting doubles leaves behind. */
export function floatNoise(...figures: readonly number[]): number {
  return 1e-12 * Math.max(...figures.map(Math.abs));
}
