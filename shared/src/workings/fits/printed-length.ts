import type { Quantity } from '../../contracts/quantity.js';
import { decimalsOfUnit } from '../../drawing/unit-decimals.js';
import { printQuantity } from '../../quantities/print.js';
import { roundTo } from '../../quantities/round.js';

/** A length for a builder: to a micrometre, or a tenth of a thou, and without idle zeros. */
export function printedLength({ value, unit }: Quantity): string {
  return printQuantity({ value: roundTo(value, decimalsOfUnit(unit)), unit });
}
