import type { Quantity, Unit } from '../../contracts/quantity.js';
import { convert } from '../../quantities/convert.js';
import { printFigure } from '../../fastening/print-figure.js';
import { printNumber } from '../../quantities/print.js';

/** A figure in a second unit behind its own: `24 lbf·ft (32.54 N·m)`. */
export function printInBoth(quantity: Quantity, other: Unit): string {
  const first = printFigure(quantity);
  return quantity.unit === other ? first : `${first} (${printFigure(convert(quantity, other))})`;
}

export const newtonMetresBeside = (torque: Quantity): string =>
  printInBoth(torque, torque.unit === 'N·m' ? 'lbf·ft' : 'N·m');

export const percent = (share: number): string => `${printNumber(share * 100, share < 0.1 ? 1 : 0)} %`;

/** A quantity as it is typed into a field. */
export const typed = ({ value, unit }: Quantity): string => `${value} ${unit}`;
