import type { BeltGaps } from '../contracts/belt-drive.js';
import { InputError } from '../contracts/input-error.js';
import { toSi } from '../quantities/convert.js';
import { requireQuantity, requireRecord } from '../quantities/require.js';

const rims = [
  'driverNear',
  'driverFar',
  'drivenNear',
  'drivenFar',
] as const satisfies readonly (keyof BeltGaps)[];

/** A pulley's rim as a line beside the straight edge, metres; slope is forward gain on the way driver to driven. */
export interface Plane {
  readonly middle: number;
  readonly slope: number;
}

/**
 * Both rims' planes from their gaps to the straight edge, metres: middle (N + F) / 2, slope of the driver
 * (far − near) / diameter and of the driven pulley (near − far) / diameter.
 *
 * @throws InputError on `field` and below; on a far rim whose gap differs from the near one's by over the diameter
 */
export function rimPlanes(
  input: unknown,
  field: string,
  diameters: { readonly driver: number; readonly driven: number },
): { readonly driver: Plane; readonly driven: Plane } {
  const given = requireRecord(input, field);
  const [driverNear = 0, driverFar = 0, drivenNear = 0, drivenFar = 0] = rims.map((rim) =>
    toSi(requireQuantity(given[rim], 'length', `${field}.${rim}`, { negative: true })),
  );
  return {
    driver: planeOf(driverFar, driverNear, diameters.driver, `${field}.driverFar`),
    driven: planeOf(drivenNear, drivenFar, diameters.driven, `${field}.drivenFar`),
  };
}

/** A rim from its gap at the beginning of the way and at its end. */
function planeOf(from: number, to: number, diameter: number, field: string): Plane {
  const slope = (from - to) / diameter;
  if (Math.abs(slope) > 1) {
    throw new InputError(field, 'The gaps at one pulley cannot differ by more than its diameter.');
  }
  return { middle: (from + to) / 2, slope };
}
