import type { FastenerPosition } from '../contracts/calculations.js';
import type { Layout } from './layout.js';

/** Two distances count as one where they differ by less than this share of the whole. */
const alike = 1e-6;

/**
 * The order in which fasteners are tightened where the maker gives none: circles opposite and crossing, all
 * else from the centre outwards, those that stand equally far out again opposite and crossing. General
 * practice.
 * Sources: head bolts from the centre outwards, reference HEADC; circles of 4, 8, 12 and 16 after the star
 * pattern of ASME PCC-1 (from memory), the others by the same rule.
 * Example: a line of five is 3 2 4 1 5.
 */
export function generalSequence({ pattern, positions }: Layout): readonly string[] {
  if (pattern === 'circle') return crossing(positions).map(({ fastener }) => fastener);
  return rings(positions).flatMap((ring) => crossing(ring).map(({ fastener }) => fastener));
}

/**
 * Places round a circle, from 0, opposite and crossing. An even number goes half round after every place of
 * the half circle; an odd number, which has no opposite, always to the place that is nearest to it.
 */
export function crossingOrder(count: number): readonly number[] {
  if (count % 2 === 1) {
    const step = Math.max(1, (count - 1) / 2);
    return Array.from({ length: count }, (_, i) => (i * step) % count);
  }
  return count === 0 ? [] : crossingOrder(count / 2).flatMap((place) => [place, place + count / 2]);
}

/** Everything is measured from the mean of all places. */
function centreOf(positions: readonly FastenerPosition[]): { readonly x: number; readonly y: number } {
  const mean = (of: (position: FastenerPosition) => number): number =>
    positions.reduce((sum, position) => sum + of(position), 0) / positions.length;
  return { x: mean(({ x }) => x), y: mean(({ y }) => y) };
}

/** Fasteners that stand equally far from the centre, the nearest first; each ring clockwise from its first. */
export function rings(positions: readonly FastenerPosition[]): readonly (readonly FastenerPosition[])[] {
  const centre = centreOf(positions);
  const placed = positions.map((position, listed) => ({
    position,
    listed,
    out: Math.hypot(position.x - centre.x, position.y - centre.y),
    angle: Math.atan2(position.y - centre.y, position.x - centre.x),
  }));
  const whole = Math.max(...placed.map(({ out }) => out));
  placed.sort((a, b) => a.out - b.out);

  const found: (typeof placed)[] = [];
  for (const one of placed) {
    const ring = found.at(-1);
    const inmost = ring?.[0];
    if (ring && inmost && one.out - inmost.out <= alike * whole) ring.push(one);
    else found.push([one]);
  }
  return found.map((ring) => {
    const clockwise = [...ring].sort((a, b) => a.angle - b.angle);
    const first = clockwise.reduce(
      (least, one, i) => (one.listed < (clockwise[least]?.listed ?? 0) ? i : least),
      0,
    );
    return [...clockwise.slice(first), ...clockwise.slice(0, first)].map(({ position }) => position);
  });
}

function crossing(ring: readonly FastenerPosition[]): readonly FastenerPosition[] {
  return crossingOrder(ring.length).flatMap((place) => ring[place] ?? []);
}
