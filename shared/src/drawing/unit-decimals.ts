import type { Unit } from '../contracts/quantity.js';

/** The decimals that show a micrometre, or a tenth of a thou, in a unit of length; three for anything else. */
const places: Partial<Record<Unit, number>> = { m: 6, cm: 4, mm: 3, µm: 1, in: 4, thou: 1, ft: 5 };

export function decimalsOfUnit(unit: Unit): number {
  return places[unit] ?? 3;
}
