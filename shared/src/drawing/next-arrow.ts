import { arrowHead, bearing, distance, polar, round } from './geometry.js';
import { path, type Point, type Shape } from './shapes.js';

/** How far the arrow's middle may be pulled aside, tried in turn until it clears what lies between. */
const bends = [0, 14, 26, 38, 50, -14, -26, -38, -50];

/**
 * A dashed arrow from the fastener in hand to the next, bent so that it touches no other, outwards from the
 * part's middle if it can. `from` and `to` carry the radii at which it begins and ends.
 */
export function nextArrow(
  from: Point & { readonly radius: number },
  to: Point & { readonly radius: number },
  others: readonly Point[],
  radius: number,
  middle: Point,
): readonly Shape[] {
  const outwards = distance(halfWay(from, to, 1), middle) >= distance(halfWay(from, to, -1), middle) ? 1 : -1;
  const curves = bends.map((bend) => curveBetween(from, to, bend * outwards));
  const curve = curves.find((points) => clears(points, others, radius + 4)) ?? curves[0];
  if (curve === undefined) {
    return [];
  }
  const shown = curve.filter((p) => distance(p, from) >= from.radius && distance(p, to) >= to.radius);
  const tip = shown.at(-1);
  const before = shown.at(-4) ?? shown[0];
  if (tip === undefined || before === undefined) {
    return [];
  }
  const direction = bearing(before, tip);
  const shaft = shown.filter((p) => distance(p, tip) > 8);
  const d = [...shaft, polar(tip, 9, direction + 180)]
    .map((p, i) => `${i === 0 ? 'M' : 'L'}${round(p.x)} ${round(p.y)}`)
    .join('');
  return [
    path(d, { pen: 'blue-hidden', part: 'next-arrow' }),
    { ...arrowHead(tip, direction, 'blue', 10, 3.6), part: 'next-arrow-head' },
  ];
}

/** The point half way, moved aside to the right of the way there. */
function halfWay(from: Point, to: Point, aside: number): Point {
  const middle = { x: (from.x + to.x) / 2, y: (from.y + to.y) / 2 };
  return polar(middle, aside, bearing(from, to) + 90);
}

function curveBetween(from: Point, to: Point, bend: number): readonly Point[] {
  const control = halfWay(from, to, 2 * bend);
  return Array.from({ length: 61 }, (_, i) => {
    const t = i / 60;
    const at = (a: number, c: number, b: number): number =>
      (1 - t) ** 2 * a + 2 * t * (1 - t) * c + t ** 2 * b;
    return { x: at(from.x, control.x, to.x), y: at(from.y, control.y, to.y) };
  });
}

function clears(curve: readonly Point[], others: readonly Point[], room: number): boolean {
  return curve.every((p) => others.every((other) => distance(p, other) >= room));
}
