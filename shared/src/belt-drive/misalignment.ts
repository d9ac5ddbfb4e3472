import type { Plane } from './pulley-plane.js';

/** Metres, and degrees. */
export interface Misalignment {
  readonly offset: number;
  readonly angle: number;
}

/**
 * How the driven pulley lies to the driver's plane: `offset`, how far its middle lies back of that plane carried
 * over `span`, and `angle` = atan(driven slope) − atan(driver slope), degrees. `grooves` is how much further back
 * of its rim the driven groove lies than the driver's, so that grooves are compared and not rims. Lengths in m.
 *
 * Source: plane geometry. Example: both square, driven rims 2 mm back: 2 mm, 0°.
 */
export function misalignment(
  { driver, driven }: { readonly driver: Plane; readonly driven: Plane },
  span: number,
  grooves: number,
): Misalignment {
  return {
    offset: driven.middle - driver.middle + driver.slope * span + grooves,
    angle: ((Math.atan(driven.slope) - Math.atan(driver.slope)) * 180) / Math.PI,
  };
}
