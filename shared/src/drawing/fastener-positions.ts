import type { FastenerLayout, FastenerPosition } from '../contracts/calculations.js';
import { requireLayout } from '../fastening/layout.js';

/**
 * Where a layout's fasteners stand, as the tightening plan numbers them; plain units, y downwards.
 *
 * @throws InputError as the plan does
 */
export function fastenerPositions(layout: FastenerLayout): readonly FastenerPosition[] {
  return requireLayout(layout).positions;
}
