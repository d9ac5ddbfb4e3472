import type { SweptVolume, SweptVolumeRequest } from '../contracts/measuring.js';
import { fromSi, toSi } from '../quantities/convert.js';
import { requireNumber, requireQuantity, requireRecord } from '../quantities/require.js';
import { columnVolume, volumeUnitFor } from './cylinder-volume.js';
import { quantityIfGiven } from './limits-input.js';

/** As many as any engine has. */
export const mostCylinders = 64;

/**
 * What the pistons sweep: π/4·bore²·stroke, of one cylinder and of all (1 to 64); with the volume left above a
 * piston at TDC also the compression ratio, (swept + clearance)/clearance. Lengths and volume more than zero.
 * In the unit of the clearance volume; without one in in³ for a bore in inches, else in cm³.
 *
 * @throws InputError on the request's fields
 * Source: definition. Example: 100 × 83 mm, one cylinder: 651.88 cm³.
 */
export function sweptVolume(request: SweptVolumeRequest): SweptVolume {
  const given = requireRecord(request, 'request');
  const bore = requireQuantity(given['bore'], 'length', 'bore', { zero: false });
  const stroke = requireQuantity(given['stroke'], 'length', 'stroke', { zero: false });
  const cylinders = requireNumber(given['cylinders'], 'cylinders', {
    min: 1,
    max: mostCylinders,
    integer: true,
  });
  const clearance = quantityIfGiven(given['clearanceVolume'], 'volume', 'clearanceVolume', { zero: false });
  const each = columnVolume(bore, stroke);
  const unit = clearance?.unit ?? volumeUnitFor(bore);
  return {
    each: fromSi(each, unit),
    total: fromSi(each * cylinders, unit),
    ...(clearance === undefined ? {} : { compressionRatio: (each + toSi(clearance)) / toSi(clearance) }),
  };
}
