import type { BeltLength, BeltLengthRequest } from '../contracts/belt-drive.js';
import { fromSi } from '../quantities/convert.js';
import { requireQuantity, requireRecord } from '../quantities/require.js';
import { freeSpan } from './free-span.js';
import { requireOpenBelt } from './open-belt.js';

/**
 * Length of an open belt round two pulleys, exactly: 2·√(C² − ((D − d)/2)²) + π/2·(D + d) + α·(D − d), with
 * sin α = (D − d)/2C. Lengths of any unit, along the belt's pitch line; the length is in the centres' unit.
 * `ratio` is driven speed over driver speed, `wrap` the degrees of each pulley that the belt lies on.
 * Pulleys of one size are no special case here, as they are where the length is written with a tangent.
 *
 * @throws InputError on the request's fields; on `centres` where the pulleys would overlap
 * Source: exact open-belt length (`BL2` of the reference values). Example: 150 and 150 mm, 400 mm apart: 1271.24 mm.
 */
export function beltLength(request: BeltLengthRequest): BeltLength {
  const given = requireRecord(request, 'request');
  const belt = requireOpenBelt(given);
  const { driver, driven, centres } = belt;
  const alpha = Math.asin((driver - driven) / (2 * centres));
  const length = 2 * freeSpan(belt) + (Math.PI / 2) * (driver + driven) + alpha * (driver - driven);
  const turn = (2 * alpha * 180) / Math.PI;
  return {
    length: fromSi(length, requireQuantity(given['centres'], 'length', 'centres').unit),
    ratio: driver / driven,
    wrap: { driver: 180 + turn, driven: 180 - turn },
  };
}
