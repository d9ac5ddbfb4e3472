import type { BeltGaps } from '../contracts/belt-drive.js';
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
 * @throws InputError on `field` and below
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
    driver: { middle: (driverNear + driverFar) / 2, slope: (driverFar - driverNear) / diameters.driver },
    driven: { middle: (drivenNear + drivenFar) / 2, slope: (drivenNear - drivenFar) / diameters.driven },
  };
}
