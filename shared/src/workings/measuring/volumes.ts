import type { Quantity } from '../../contracts/quantity.js';
import { convert } from '../../quantities/convert.js';
import { printQuantity } from '../../quantities/print.js';

const print = (quantity: Quantity): string =>
  printQuantity(quantity, { digits: quantity.unit === 'mm3' ? 0 : quantity.unit === 'l' ? 4 : 2 });

/** A volume, with the other workshop unit behind it: `599.78 cm3 (36.60 in3)`. */
export function printVolume(volume: Quantity): string {
  const other = volume.unit === 'in3' ? 'cm3' : 'in3';
  return `${print(volume)} (${print(convert(volume, other))})`;
}
