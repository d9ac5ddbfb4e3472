import type { Quantity } from '../contracts/quantity.js';
import { convert } from '../quantities/convert.js';
import { requireQuantity } from '../quantities/require.js';
import { americanKeys } from './tables/american-keys.js';
import { britishKeys } from './tables/british-keys.js';
import { metricKeys } from './tables/metric-keys.js';

/** The parallel key that a standard gives a shaft. */
export interface StandardKey {
  readonly standard: 'DIN 6885-1' | 'BS 46:Part 1' | 'ANSI B17.1';
  readonly width: Quantity;
  readonly height: Quantity;
  /** In the shaft, at the centre line; null where the standard gives it at the slot's edge. */
  readonly shaftDepth: Quantity | null;
  readonly hubDepth: Quantity | null;
}

/**
 * The parallel keys that the standards give a shaft of this diameter: metric from over 6 to 110 mm, British
 * square from over 1/4 to 3 in, American square from over 5/16 to 3 1/4 in; none outside. British sizes are the
 * nominal key and the middle of the depths' limits. The standards differ: a 1 in shaft has a 1/4 in key in both
 * inch ones, a 3/4 in shaft 3/16 in, a 15/16 in shaft a 1/4 in one, a 13/16 in shaft 1/4 in by the British and
 * 3/16 in by the American.
 *
 * @throws InputError on `shaftDiameter` and below
 * Source: DIN 6885-1, BS 46:Part 1:1958, ANSI B17.1-1967, at the tables' heads.
 * Example: 20 mm: 6 × 6 mm, 3.5 mm deep in the shaft and 2.8 mm in the hub, by DIN 6885-1.
 */
export function standardKeys(shaftDiameter: Quantity): readonly StandardKey[] {
  const diameter = requireQuantity(shaftDiameter, 'length', 'shaftDiameter', { zero: false });
  const millimetres = convert(diameter, 'mm').value;
  const inches = convert(diameter, 'in').value;
  return [
    ...metricKeys.filter(takes(millimetres)).map((row): StandardKey => ({
      standard: 'DIN 6885-1',
      width: mm(row.width),
      height: mm(row.height),
      shaftDepth: mm(row.shaftDepth),
      hubDepth: mm(row.hubDepth),
    })),
    ...britishKeys.filter(takes(inches)).map((row): StandardKey => ({
      standard: 'BS 46:Part 1',
      width: inch(row.key[0]),
      height: inch(row.key[0]),
      shaftDepth: inch((row.shaftDepth[0] + row.shaftDepth[1]) / 2),
      hubDepth: inch((row.hubDepth[0] + row.hubDepth[1]) / 2),
    })),
    ...americanKeys.filter(takes(inches)).map((row): StandardKey => ({
      standard: 'ANSI B17.1',
      width: inch(row.side),
      height: inch(row.side),
      shaftDepth: null,
      hubDepth: null,
    })),
  ];
}

const takes =
  (diameter: number) =>
  ({ over, upTo }: { readonly over: number; readonly upTo: number }): boolean =>
    diameter > over && diameter <= upTo;

const mm = (value: number): Quantity => ({ value, unit: 'mm' });
const inch = (value: number): Quantity => ({ value, unit: 'in' });
