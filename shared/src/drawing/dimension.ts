import { arrowHead, round } from './geometry.js';
import { line, type Shape } from './shapes.js';

/** An arrow head's length: a gap that does not hold two of them is dimensioned from outside. */
const head = 9;
const tail = 14;

/**
 * A dimension between two places on one line, its arrows inside where there is room and from outside where not.
 * `across` runs left to right at height y, `down` from top to bottom at x.
 */
export function dimension(way: 'across' | 'down', at: number, a: number, b: number): readonly Shape[] {
  const [from, to] = [round(Math.min(a, b)), round(Math.max(a, b))];
  const isInside = to - from >= 2 * head + 4;
  const reach = isInside ? 0 : tail;
  const [before, after] = way === 'across' ? [270, 90] : [0, 180];
  const stroke =
    way === 'across'
      ? line(from - reach, at, to + reach, at, 'dimension')
      : line(at, from - reach, at, to + reach, 'dimension');
  const tip = (place: number) => (way === 'across' ? { x: place, y: at } : { x: at, y: place });
  return [
    stroke,
    arrowHead(tip(from), isInside ? before : after, 'line'),
    arrowHead(tip(to), isInside ? after : before, 'line'),
  ];
}
