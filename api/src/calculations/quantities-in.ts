import type { Quantity, Unit } from '@second-spanner/shared/contracts/quantity';

const of =
  (unit: Unit) =>
  (value: number): Quantity => ({ value, unit });

/** Quantities as examples are written. */
export const mm = of('mm');
export const newtonMetres = of('N·m');
export const poundFeet = of('lbf·ft');
export const celsius = of('°C');
export const ohms = of('Ω');
export const hours = of('h');
export const bar = of('bar');
export const cubicCm = of('cm3');
