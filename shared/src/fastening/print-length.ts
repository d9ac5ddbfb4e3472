import type { Quantity } from '../contracts/quantity.js';
import { printQuantity } from '../quantities/print.js';

const digits: Partial<Record<Quantity['unit'], number>> = {
  mm: 1,
  cm: 2,
  m: 4,
  in: 3,
  ft: 4,
  thou: 0,
  µm: 0,
};

/** A length of a fastener to a tenth of a millimetre or a thou. */
export function printLength(length: Quantity): string {
  return printQuantity(length, { digits: digits[length.unit] ?? 3 });
}
