import type { Unit } from '../contracts/quantity.js';
import { fromSi } from '../quantities/convert.js';
import { printQuantity } from '../quantities/print.js';

/** Metres in a unit, to three significant digits: what a feeler gauge or a rule reads. */
export function printLength(metres: number, unit: Unit): string {
  return printQuantity({ value: Number(fromSi(metres, unit).value.toPrecision(3)), unit });
}
