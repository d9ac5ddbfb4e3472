import type { Fit, FitRequest } from '../contracts/fits.js';
import { fromSi } from '../quantities/convert.js';
import { requireRecord } from '../quantities/require.js';
import { settled } from './fit-noise.js';
import { requireFitPart } from './fit-part.js';

/**
 * Least and most clearance of a hole and a shaft, each given by limits or by size and ISO 286 class; negative is
 * interference. Lengths of any unit; the answer is in the unit that the hole is given in.
 *
 * least = hole low − shaft high, most = hole high − shaft low. `clearance` where the least is 0 or more,
 * `interference` where the most is 0 or less, `transition` between.
 *
 * @throws InputError on `hole`, `shaft` and below: a low limit above the high one, a class or size that the
 * tables do not hold
 * Source: ISO 286-1:2010, 3.3 (from memory). Example: 40 mm H7/p6: interference, −42 to −1 µm.
 */
export function fit(request: FitRequest): Fit {
  const given = requireRecord(request, 'request');
  const hole = requireFitPart(given['hole'], 'hole', 'hole');
  const shaft = requireFitPart(given['shaft'], 'shaft', 'shaft');
  const apart = hole.from - shaft.from;
  const least = settled(apart + (hole.low - shaft.high));
  const most = settled(apart + (hole.high - shaft.low));
  return {
    kind: kindOf(least, most),
    least: fromSi(least, hole.unit),
    most: fromSi(most, hole.unit),
  };
}

function kindOf(least: number, most: number): Fit['kind'] {
  if (least >= 0) return 'clearance';
  return most <= 0 ? 'interference' : 'transition';
}
