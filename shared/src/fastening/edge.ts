import type { FastenerPosition } from '../contracts/calculations.js';
import type { Layout } from './layout.js';
import { rings } from './sequence.js';

/**
 * Whether a fastener stands at an edge of its group: outermost along the group's length while others stand
 * further in, or outermost across it with another between it and the middle. The two rows of a head are no
 * edges, nor is any place of a ring: nothing stands further in.
 */
export function standsAtEdge({ pattern, positions }: Layout, fastener: string): boolean {
  const place = positions.find((position) => position.fastener === fastener);
  if (!place || pattern === 'circle' || rings(positions).length === 1) return false;
  return (
    (isOutermost(positions, place, 'x') && isFurtherIn(positions, place, 'x')) ||
    (isOutermost(positions, place, 'y') && isFurtherIn(positions, place, 'y'))
  );
}

type Axis = 'x' | 'y';

const near = 1e-6;

/** Half the length of the group along an axis, and how far from the middle of that length a place is. */
function offset(positions: readonly FastenerPosition[], place: FastenerPosition, axis: Axis): number {
  const all = positions.map((position) => position[axis]);
  const [least, most] = [Math.min(...all), Math.max(...all)];
  return Math.abs(place[axis] - (least + most) / 2);
}

function halfLength(positions: readonly FastenerPosition[], axis: Axis): number {
  const all = positions.map((position) => position[axis]);
  return (Math.max(...all) - Math.min(...all)) / 2;
}

function isOutermost(positions: readonly FastenerPosition[], place: FastenerPosition, axis: Axis): boolean {
  const half = halfLength(positions, axis);
  return half > 0 && offset(positions, place, axis) >= half * (1 - near);
}

/** Along the longer axis anything further in counts; across it only what stands no further out sideways. */
function isFurtherIn(positions: readonly FastenerPosition[], place: FastenerPosition, axis: Axis): boolean {
  const across = axis === 'x' ? 'y' : 'x';
  const isLong = halfLength(positions, axis) >= halfLength(positions, across) * (1 - near);
  const reach = offset(positions, place, across) + near * halfLength(positions, across);
  return positions.some(
    (other) =>
      offset(positions, other, axis) < offset(positions, place, axis) - near * halfLength(positions, axis) &&
      (isLong || offset(positions, other, across) <= reach),
  );
}
