import type { Quantity } from '../contracts/quantity.js';
import { convert, toSi } from '../quantities/convert.js';
import { printQuantity } from '../quantities/print.js';
import { decimalsOf } from '../quantities/round.js';

export interface PrintedFigures {
  readonly agree: boolean;
  readonly reason: string;
}

/** Half the last place that a figure is printed to, N·m. */
function rounding({ value, unit }: Quantity): number {
  return toSi({ value: 0.5 * 10 ** -decimalsOf(value), unit });
}

/** Whether two figures of one torque, as a page prints them, are the same within the rounding of both. */
export function comparePrinted(torque: Quantity, other: Quantity): PrintedFigures {
  const apart = Math.abs(toSi(torque) - toSi(other));
  const agree = apart <= (rounding(torque) + rounding(other)) * (1 + 1e-9);
  const digits = decimalsOf(other.value) + 1;
  const converted = printQuantity(convert(torque, other.unit), { digits: Math.min(digits, 6) });
  const both = `${printQuantity(torque)} is ${converted}, and the page also prints ${printQuantity(other)}`;
  return {
    agree,
    reason: agree
      ? `${both}: the two agree within their rounding.`
      : `${both}: that is further apart than rounding explains, so one of the two is a slip. Find out which.`,
  };
}
