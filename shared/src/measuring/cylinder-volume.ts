import type { Quantity, Unit } from '../contracts/quantity.js';
import { toSi } from '../quantities/convert.js';

/** Volume of a round column, π/4·d²·h, in m³. A negative height gives a negative volume. */
export function columnVolume(diameter: Quantity, height: Quantity): number {
  return (Math.PI / 4) * toSi(diameter) ** 2 * toSi(height);
}

const inchUnits: ReadonlySet<Unit> = new Set<Unit>(['in', 'thou', 'ft']);

/** The unit of volume that goes with a bore's: cubic inches for inches, else cm³. */
export function volumeUnitFor(bore: Quantity): Unit {
  return inchUnits.has(bore.unit) ? 'in3' : 'cm3';
}
