import { hatching, round, track } from './geometry.js';
import { line, path, rect, text, type Point, type Shape } from './shapes.js';
import { drawnAcross, mostBulge, type RoundLayout } from './round-layout.js';
import { shortened } from './words.js';

const top = 30;
const bottom = 178;
const middle = 92;
const half = drawnAcross / 2;
const wall = 18;
const outside = half + mostBulge + wall;

export interface SectionPlace {
  readonly middle: number;
  readonly half: number;
  readonly yOf: (height: string) => number;
}

/** Where heights stand: spread evenly, in the order in which they were read. */
export function sectionPlace({ heights }: RoundLayout): SectionPlace {
  const step = (bottom - top) / heights.length;
  return { middle, half, yOf: (height) => round(top + step * (heights.indexOf(height) + 0.5)) };
}

/** The section along: the first axis in outline, the second hidden; material hatched, but a journal is whole. */
export function lengthSection(layout: RoundLayout, isJournal: boolean): readonly Shape[] {
  const [first, second] = layout.axes.map(({ name }) => profile(layout, name));
  if (first === undefined) return [];
  const outer = second === undefined || isJournal ? first : furthest(first, second);
  return [
    ...(isJournal ? journalBody(first) : [...material(outer, 1), ...material(outer, -1)]),
    line(middle, top - 8, middle, bottom + 8, 'centre'),
    ...sides(first, 'outline', 'wall:A'),
    ...(second === undefined ? [] : sides(second, 'hidden', 'wall:B')),
    ...heightWords(layout),
  ];
}

/** Distances from the centre line by y, from the top to the bottom. */
function profile(layout: RoundLayout, axis: string): readonly Point[] {
  const { yOf } = sectionPlace(layout);
  const points = layout.heights.flatMap((height) => {
    const value = layout.valueAt(height, axis);
    return value === undefined ? [] : [{ x: half + layout.bulge(value), y: yOf(height) }];
  });
  const [first, last] = [points[0], points.at(-1)];
  if (first === undefined || last === undefined) return [];
  return [{ ...first, y: top }, ...points, { ...last, y: bottom }];
}

function furthest(a: readonly Point[], b: readonly Point[]): readonly Point[] {
  const xAt = (points: readonly Point[], y: number): number => points.find((p) => p.y === y)?.x ?? 0;
  const ys = [...new Set([...a, ...b].map(({ y }) => y))].sort((p, q) => p - q);
  return ys.map((y) => ({ x: Math.max(xAt(a, y), xAt(b, y)), y }));
}

function material(outer: readonly Point[], side: 1 | -1): readonly Shape[] {
  const inner = outer.map(({ x, y }) => ({ x: middle + side * x, y }));
  const outline = [
    ...inner,
    { x: middle + side * outside, y: bottom },
    { x: middle + side * outside, y: top },
  ];
  return [
    hatching(outline, 45, 6.5),
    line(middle + side * outside, top, middle + side * outside, bottom, 'thin'),
    ...[top, bottom].map((y) =>
      line(
        middle + side * (y === top ? (outer[0]?.x ?? half) : (outer.at(-1)?.x ?? half)),
        y,
        middle + side * outside,
        y,
        'outline',
      ),
    ),
  ];
}

function journalBody(first: readonly Point[]): readonly Shape[] {
  const right = first.map(({ x, y }) => ({ x: middle + x, y }));
  const left = first.map(({ x, y }) => ({ x: middle - x, y })).reverse();
  return [
    rect(middle - outside, top - 4, 2 * outside, 4, { pen: 'edge', fill: 'paper' }),
    rect(middle - outside, bottom, 2 * outside, 4, { pen: 'edge', fill: 'paper' }),
    path(`${track([...right, ...left])}Z`, { fill: 'paper' }),
  ];
}

const sides = (points: readonly Point[], pen: 'outline' | 'hidden', part: string): readonly Shape[] =>
  ([1, -1] as const).map((side) =>
    path(track(points.map(({ x, y }) => ({ x: middle + side * x, y }))), { pen, part }),
  );

/** Heights by name; of more than seven only the first, the last and the worst. */
function heightWords(layout: RoundLayout): readonly Shape[] {
  const { heights, worst } = layout;
  const { yOf } = sectionPlace(layout);
  const named = heights.length <= 7 ? heights : [...new Set([heights[0], worst.height, heights.at(-1)])];
  return named.flatMap((height) =>
    height === undefined
      ? []
      : [
          text(middle, yOf(height) + 4.5, shortened(height, 10), {
            anchor: 'middle',
            halo: true,
            ink: 'ink-2',
          }),
        ],
  );
}
