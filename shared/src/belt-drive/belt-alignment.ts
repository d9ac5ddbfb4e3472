import type { BeltAlignment, BeltAlignmentRequest } from '../contracts/belt-drive.js';
import type { Quantity } from '../contracts/quantity.js';
import { fromSi, toSi } from '../quantities/convert.js';
import { requireQuantity, requireRecord } from '../quantities/require.js';
import { requireBeltLimit } from './belt-limit.js';
import { judgeLine } from './judge-line.js';
import { misalignment } from './misalignment.js';
import { rimPlanes } from './pulley-plane.js';

/**
 * How far two pulleys are out of line, from the gaps between a straight edge and their rims. Lengths of any unit;
 * gaps are signed, positive where the rim lies back from the edge. `offset` is in the unit of
 * `gaps.driverNear`, `angle` in degrees.
 *
 * Driver's slope (far − near) / diameter, driven's (near − far) / diameter; `angle` is the difference of their
 * arc tangents, `offset` how far the driven pulley's middle lies back of the driver's plane carried over the
 * span; with `faceToGroove` of the grooves, without it of the rim faces. `pass` within both limits, else `fail`.
 *
 * @throws InputError on the request's fields
 * Source: plane geometry; limits of 0.5° and 0.0087 of the span, a pulley-alignment maker's table (`BM1`).
 * Example: gaps 0, 0, 1.2 and 1.6 mm, 300 mm span, driven 92 mm: 1.4 mm, −0.25°.
 */
export function beltAlignment(request: BeltAlignmentRequest): BeltAlignment {
  const given = requireRecord(request, 'request');
  const span = lengthOf(given, 'span');
  const planes = rimPlanes(given['gaps'], 'gaps', {
    driver: lengthOf(given, 'driverDiameter'),
    driven: lengthOf(given, 'drivenDiameter'),
  });
  const found = misalignment(planes, span, groovesApart(given['faceToGroove']));
  const unit = unitOf(given['gaps']);
  return {
    ...judgeLine(
      found,
      span,
      requireBeltLimit(given['limit']),
      unit,
      given['faceToGroove'] === undefined ? 'rims' : 'grooves',
    ),
    offset: fromSi(found.offset, unit),
    angle: found.angle,
  };
}

function lengthOf(given: Readonly<Record<string, unknown>>, field: string): number {
  return toSi(requireQuantity(given[field], 'length', field, { zero: false }));
}

function groovesApart(input: unknown): number {
  if (input === undefined) return 0;
  const given = requireRecord(input, 'faceToGroove');
  const depth = (pulley: 'driver' | 'driven'): number =>
    toSi(requireQuantity(given[pulley], 'length', `faceToGroove.${pulley}`));
  return depth('driven') - depth('driver');
}

function unitOf(gaps: unknown): Quantity['unit'] {
  const first = requireRecord(gaps, 'gaps')['driverNear'];
  return requireQuantity(first, 'length', 'gaps.driverNear', { negative: true }).unit;
}
