import type { Cylinder } from '../contracts/calculations.js';
import { intervalSlack } from './firing-intervals.js';
import type { ResolvedCap } from './resolve-cap.js';

/**
 * Pairs of cylinders whose firing is 360° of crank apart, so that their pistons move together; found by the
 * angle and never by the place in the order. In firing order; numbered cylinders the lower first in a pair.
 * A two-stroke has none.
 */
export function companionsOf(cap: ResolvedCap): readonly (readonly [Cylinder, Cylinder])[] {
  if (cap.strokesPerCycle === 2) return [];
  return cap.rows.flatMap((row) => {
    const mate = cap.rows.find((other) => Math.abs(other.firesAt - row.firesAt - 360) <= intervalSlack);
    return mate === undefined ? [] : [inOrder(row.cylinder, mate.cylinder)];
  });
}

function inOrder(one: Cylinder, other: Cylinder): readonly [Cylinder, Cylinder] {
  const swap = typeof one === 'number' && typeof other === 'number' && one > other;
  return swap ? [other, one] : [one, other];
}
