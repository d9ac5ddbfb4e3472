import type { Quantity } from '../contracts/quantity.js';
import { printQuantity } from '../quantities/print.js';

/** A figure that was worked out, to four digits: more than any wrench is good for. */
export function printFigure({ value, unit }: Quantity): string {
  return printQuantity({ value: Number(value.toPrecision(4)), unit });
}
