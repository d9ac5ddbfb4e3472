import { circle, line, path, text, type Point, type Shape } from './shapes.js';
import { hatching, polar, ringPiece, track } from './geometry.js';
import { drawnAcross, type RoundLayout } from './round-layout.js';
import { shortened } from './words.js';

const centre: Point = { x: 254, y: 102 };
const radius = drawnAcross / 2;
const outside = 66;

/** The section across at the worst height: axes spread evenly, the smallest size as a thin circle. */
export function crossSection(layout: RoundLayout, isJournal: boolean): readonly Shape[] {
  const { worst, axes, valueAt, bulge } = layout;
  const read = axes.flatMap(({ name, letter }, i) => {
    const value = valueAt(worst.height, name);
    const angle = (180 * i) / axes.length;
    return value === undefined ? [] : [{ name, letter, angle, at: radius + bulge(value) }];
  });
  const outline = outlineThrough(read);
  return [
    ...(isJournal
      ? []
      : [hatching(ring(outline), 45, 6.5), circle(centre.x, centre.y, outside, { pen: 'thin' })]),
    path(`${track(outline)}Z`, { pen: 'outline', fill: 'paper', part: 'across' }),
    circle(centre.x, centre.y, radius, { pen: 'thin', part: 'smallest' }),
    ...read.flatMap(({ angle, letter, name, at }) =>
      axisShapes(angle, letter, at, name === worst.axis, layout),
    ),
    text(centre.x, 190, `across at ${shortened(worst.height, 10)}`, { anchor: 'middle', ink: 'ink-2' }),
  ];
}

interface Read {
  readonly angle: number;
  readonly at: number;
}

/** A closed shape through what was read: each axis both ways, between two axes eased over. */
function outlineThrough(read: readonly Read[]): readonly Point[] {
  const around = [...read, ...read.map(({ angle, at }) => ({ angle: angle + 180, at }))];
  return Array.from({ length: 72 }, (_, i) => polar(centre, radiusAt(around, i * 5), i * 5));
}

function radiusAt(around: readonly Read[], angle: number): number {
  const next = around.findIndex((one) => one.angle > angle);
  const a = around[next === -1 ? around.length - 1 : Math.max(0, next - 1)];
  const first = around[0];
  if (a === undefined || first === undefined) return radius;
  const b = next === -1 ? { ...first, angle: first.angle + 360 } : (around[next] ?? first);
  const share = b.angle === a.angle ? 0 : (angle - a.angle) / (b.angle - a.angle);
  return a.at + (b.at - a.at) * (0.5 - 0.5 * Math.cos(Math.PI * Math.min(1, Math.max(0, share))));
}

/** The material round the outline, as one closed path that goes out, round, and back in. */
function ring(outline: readonly Point[]): readonly Point[] {
  const start = outline[0] ?? centre;
  const outer = ringPiece(centre, outside, outside, 0, 360).slice(0, 121);
  return [...outline, start, ...[...outer].reverse()];
}

function axisShapes(
  angle: number,
  letter: string,
  at: number,
  isWorst: boolean,
  { worst }: RoundLayout,
): readonly Shape[] {
  const [from, to] = [polar(centre, outside + 4, angle), polar(centre, outside + 4, angle + 180)];
  const name = polar(centre, 24, angle);
  const dots = [angle, angle + 180].map((way) => {
    const point = polar(centre, at, way);
    const fill = isWorst && worst.isWrong ? 'oxide' : 'ink';
    return circle(point.x, point.y, isWorst ? 3.6 : 2.2, { fill, part: `read:${letter}` });
  });
  return [
    line(from.x, from.y, to.x, to.y, 'centre'),
    ...dots,
    text(name.x, name.y + 4.5, letter, { anchor: 'middle', face: 'figures', weight: 600, halo: true }),
  ];
}
