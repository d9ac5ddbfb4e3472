import type { TimingMarks, TimingMarksRequest } from '../contracts/ignition-checks.js';
import { InputError } from '../contracts/input-error.js';
import { convert } from '../quantities/convert.js';
import { printQuantity } from '../quantities/print.js';
import { requireNumber, requireQuantity, requireRecord } from '../quantities/require.js';

/**
 * Where a timing mark goes on a pulley or damper, measured along its rim: arc = π · D · angle / 360; or what angle
 * an arc is. Angles in crank degrees; the arc is in its own unit where it was given, else in the diameter's.
 *
 * @throws InputError on `diameter` (more than zero), on `angle` (0° to 360°) or `arc` (no longer than the rim),
 * and on `angle` where neither or both of the two are given
 * Source: definition of the arc. Example: 6° on 6.6875 in is 0.3502 in.
 */
export function timingMarks(request: TimingMarksRequest): TimingMarks {
  const given = requireRecord(request, 'request');
  const diameter = requireQuantity(given['diameter'], 'length', 'diameter', { zero: false });
  const { angle, arc } = given;
  if ((angle === undefined) === (arc === undefined)) {
    throw new InputError('angle', 'Give one of the two: the angle, or the arc along the rim.');
  }
  const rim = { value: Math.PI * diameter.value, unit: diameter.unit };
  if (arc === undefined) {
    const turned = requireNumber(angle, 'angle', { min: 0, max: 360 });
    const along = (rim.value * turned) / 360;
    return {
      angle: turned,
      arc: { value: along, unit: rim.unit },
      arcPerDegree: { value: rim.value / 360, unit: rim.unit },
    };
  }
  const measured = requireQuantity(arc, 'length', 'arc');
  const whole = convert(rim, measured.unit).value;
  if (measured.value > whole * (1 + 1e-12)) {
    throw new InputError(
      'arc',
      `The whole rim is ${printQuantity(rim)} round; an arc is no longer than that.`,
    );
  }
  return {
    angle: (measured.value / whole) * 360,
    arc: measured,
    arcPerDegree: { value: whole / 360, unit: measured.unit },
  };
}
