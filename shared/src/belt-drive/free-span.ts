import type { OpenBelt } from './open-belt.js';

/** The straight run between the pulleys, metres: √(C² − ((D − d)/2)²). */
export function freeSpan({ driver, driven, centres }: OpenBelt): number {
  const half = (driver - driven) / 2;
  return Math.sqrt((centres - half) * (centres + half));
}
