import type { Fill } from './roles.js';
import { path, polygon, type PathShape, type Point, type PolygonShape } from './shapes.js';

/** Two decimals: finer than any pen, and short enough to travel. */
export function round(value: number): number {
  return Math.round(value * 100) / 100 + 0;
}

/** A point at a radius and an angle in degrees clockwise from straight up. */
export function polar(centre: Point, radius: number, degrees: number): Point {
  const angle = (degrees * Math.PI) / 180;
  return { x: round(centre.x + radius * Math.sin(angle)), y: round(centre.y - radius * Math.cos(angle)) };
}

/** The direction from one point to another, degrees clockwise from straight up, 0 to 360. */
export function bearing(from: Point, to: Point): number {
  const degrees = (Math.atan2(to.x - from.x, from.y - to.y) * 180) / Math.PI;
  return degrees < 0 ? degrees + 360 : degrees;
}

export function distance(a: Point, b: Point): number {
  return Math.hypot(a.x - b.x, a.y - b.y);
}

/** An angle folded into 0 up to, but not including, `full`. */
export function fold(degrees: number, full = 360): number {
  return ((degrees % full) + full) % full;
}

/** How far apart two directions are, 0 to 180 degrees. */
export function apart(a: number, b: number): number {
  const turn = fold(a - b);
  return Math.min(turn, 360 - turn);
}

/** Path data through the points. */
export function track(points: readonly Point[]): string {
  return points.map((p, i) => `${i === 0 ? 'M' : 'L'}${round(p.x)} ${round(p.y)}`).join('');
}

/** Path data of a circle's arc from one angle to another, degrees; a smaller `to` runs anticlockwise. */
export function arc(centre: Point, radius: number, from: number, to: number): string {
  const a = polar(centre, radius, from);
  const b = polar(centre, radius, to);
  const large = Math.abs(to - from) > 180 ? 1 : 0;
  return `M${a.x} ${a.y}A${radius} ${radius} 0 ${large} ${to > from ? 1 : 0} ${b.x} ${b.y}`;
}

/** A slender filled arrow head; `direction` is where it points, degrees clockwise from straight up. */
export function arrowHead(tip: Point, direction: number, fill: Fill, length = 9, half = 1.7): PolygonShape {
  const base = polar(tip, length, direction + 180);
  const left = polar(base, half, direction - 90);
  const right = polar(base, half, direction + 90);
  return polygon(
    [
      [tip.x, tip.y],
      [left.x, left.y],
      [right.x, right.y],
    ],
    { fill },
  );
}

/** The outline of a piece of a ring, angles in degrees clockwise from straight up, `to` beyond `from`. */
export function ringPiece(
  centre: Point,
  inner: number,
  outer: number,
  from: number,
  to: number,
): readonly Point[] {
  const count = Math.max(2, Math.ceil((to - from) / 3));
  const angles = Array.from({ length: count + 1 }, (_, i) => from + ((to - from) * i) / count);
  return [
    ...angles.map((angle) => polar(centre, outer, angle)),
    ...angles
      .slice()
      .reverse()
      .map((angle) => polar(centre, inner, angle)),
  ];
}

/**
 * Hatching over a closed outline, as one path of separate strokes cut to it, so that whoever draws needs
 * neither patterns nor clipping. Strokes rise to the right at 45, to the left at 135.
 */
export function hatching(outline: readonly Point[], angle: 45 | 135, spacing: number): PathShape {
  const sign = angle === 45 ? 1 : -1;
  // A stroke is where x·sign + y is constant; along it, x grows.
  const offsets = outline.map((p) => p.x * sign + p.y);
  const step = spacing * Math.SQRT2;
  const first = Math.ceil(Math.min(...offsets) / step) * step;
  const strokes: string[] = [];
  for (let offset = first; offset < Math.max(...offsets); offset += step) {
    const crossings = crossingsOf(outline, sign, offset);
    for (let i = 0; i + 1 < crossings.length; i += 2) {
      const from = crossings[i] ?? 0;
      const to = crossings[i + 1] ?? 0;
      strokes.push(
        `M${round(from)} ${round(offset - from * sign)}L${round(to)} ${round(offset - to * sign)}`,
      );
    }
  }
  return path(strokes.join(''), { pen: 'hatch' });
}

function crossingsOf(outline: readonly Point[], sign: number, offset: number): readonly number[] {
  const found: number[] = [];
  outline.forEach((a, i) => {
    const b = outline[(i + 1) % outline.length] ?? a;
    const da = a.x * sign + a.y - offset;
    const db = b.x * sign + b.y - offset;
    if (da < 0 !== db < 0) {
      found.push(a.x + ((b.x - a.x) * da) / (da - db));
    }
  });
  return found.sort((x, y) => x - y);
}

/** The corners of an upright rectangle. */
export function corners(x: number, y: number, width: number, height: number): readonly Point[] {
  return [
    { x, y },
    { x: x + width, y },
    { x: x + width, y: y + height },
    { x, y: y + height },
  ];
}
