import { wrapped } from './windows.js';

/** A closed piece of the cycle, crank degrees: where it begins, in [0, 720), and how far it runs on, less than 720. */
export interface Arc {
  readonly from: number;
  readonly length: number;
}

/** Rounding noise of sums of firing angles. */
const noise = 1e-9;

/**
 * The fewest points of the cycle that touch every arc, and of all such choices one with the least way from the first
 * point to the last; counted on from the first point, which lies in [0, 720), so that the last may lie beyond. Of
 * equal choices the one that begins earliest.
 *
 * In an optimal choice the first point is the end of some arc: moving it on towards the nearest end loses no arc and
 * only shortens the way. With the first point fixed, what it leaves is intervals on a line, and taking again and
 * again the latest beginning among them from the far end gives both the fewest points and the earliest last one.
 * So n arcs take n² log n steps. One point alone stands in the middle of what all arcs have in common.
 */
export function fewestStops(arcs: readonly Arc[]): readonly number[] {
  let best: readonly number[] = [];
  for (const { from, length } of arcs) {
    const found = stopsFrom(wrapped(from + length), arcs);
    if (best.length === 0 || isBetter(found, best)) best = found;
  }
  const [only, ...others] = best;
  return only === undefined || others.length > 0 ? best : [middleOfAll(only, arcs)];
}

/** The middle of what arcs have in common that all touch a point, which is the end of one of them. */
function middleOfAll(end: number, arcs: readonly Arc[]): number {
  const back = Math.min(...arcs.map(({ from }) => wrapped(end - from)));
  return wrapped(end - back / 2);
}

function stopsFrom(first: number, arcs: readonly Arc[]): readonly number[] {
  const left = arcs
    .filter(({ from, length }) => wrapped(first - from) > length + noise)
    .map(({ from, length }) => {
      const begins = first + wrapped(from - first);
      return { begins, ends: begins + length };
    })
    .sort((a, b) => b.begins - a.begins);
  const stops: number[] = [];
  for (const { begins, ends } of left) {
    const last = stops[0];
    if (last === undefined || ends < last - noise) stops.unshift(begins);
  }
  return [first, ...stops];
}

function isBetter(one: readonly number[], other: readonly number[]): boolean {
  if (one.length !== other.length) return one.length < other.length;
  const [way, otherWay] = [wayOf(one), wayOf(other)];
  if (Math.abs(way - otherWay) > noise) return way < otherWay;
  return (one[0] ?? 0) < (other[0] ?? 0) - noise;
}

const wayOf = (stops: readonly number[]): number => (stops.at(-1) ?? 0) - (stops[0] ?? 0);
