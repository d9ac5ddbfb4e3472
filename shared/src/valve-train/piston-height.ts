import type { Quantity } from '../contracts/quantity.js';
import { InputError } from '../contracts/input-error.js';
import { convert } from '../quantities/convert.js';
import { requireQuantity } from '../quantities/require.js';

/** The two lengths that a piston's travel follows from, both in the stroke's own unit. */
export interface CrankThrow {
  readonly radius: number;
  readonly rod: number;
  readonly unit: Quantity['unit'];
}

const more = { zero: false };

/**
 * Stroke and rod length (centre to centre) read from a request.
 *
 * @param within path of the two inside a larger request, such as `timing`
 * @throws InputError on `stroke` or `rodLength`, each more than zero and the rod longer than half the stroke
 */
export function requireCrankThrow(stroke: unknown, rodLength: unknown, within?: string): CrankThrow {
  const at = (field: string): string => (within === undefined ? field : `${within}.${field}`);
  const { value, unit } = requireQuantity(stroke, 'length', at('stroke'), more);
  const centres = requireQuantity(rodLength, 'length', at('rodLength'), more);
  const radius = value / 2;
  const rod = convert(centres, unit).value;
  if (rod <= radius) {
    throw new InputError(at('rodLength'), 'The rod must be longer than half the stroke.');
  }
  return { radius, rod, unit };
}

/** As `requireCrankThrow`; undefined unless both are known. One that is known alone is still checked. */
export function knownCrankThrow(stroke: unknown, rodLength: unknown): CrankThrow | undefined {
  if (stroke !== undefined && rodLength !== undefined) return requireCrankThrow(stroke, rodLength);
  if (stroke !== undefined) requireQuantity(stroke, 'length', 'stroke', more);
  if (rodLength !== undefined) requireQuantity(rodLength, 'length', 'rodLength', more);
  return undefined;
}

/**
 * How far a piston has come down from its top, slider-crank without offset:
 * r(1 − cos θ) + l − √(l² − r² sin² θ). In the stroke's unit; θ in degrees of crank from TDC.
 * Source: the piston motion equations of any text on engine kinematics.
 * Example: stroke 100 mm, rod 150 mm, 90°: 58.58 mm.
 */
export function pistonFromTop(crank: CrankThrow, degreesFromTop: number): Quantity {
  const { radius, rod, unit } = crank;
  const angle = (degreesFromTop * Math.PI) / 180;
  const across = radius * Math.sin(angle);
  // l − √(l² − a²) written as a²/(l + √(l² − a²)), which loses no figures near the dead centres.
  const lean = across ** 2 / (rod + Math.sqrt((rod - across) * (rod + across)));
  return { value: radius * (1 - Math.cos(angle)) + lean, unit };
}
