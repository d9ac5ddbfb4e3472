import type { ValveState } from '../contracts/calculations.js';
import { hatching, polar, track } from './geometry.js';
import { centredText, circle, line, path, polygon, text, type Point, type Shape } from './shapes.js';
import type { Wording } from './words.js';

/** Set at this stop, at an earlier one, or at a later one. */
export type LashState = 'now' | 'before' | 'later';

/** A valve's number: cross-hairs where it is set now, solid where it has been, plain where it is still to come. */
export function lashBadge(
  at: Point,
  radius: number,
  state: LashState,
  name: string,
  part: string,
): readonly Shape[] {
  const figure = { face: 'figures', weight: 600 } as const;
  switch (state) {
    case 'now':
      return [
        circle(at.x, at.y, radius, { pen: 'oxide', fill: 'oxide-wash', part }),
        ...crossHairs(at, radius),
        centredText(at.x, at.y, name, { ...figure, ink: 'oxide' }),
      ];
    case 'before':
      return [
        circle(at.x, at.y, radius, { fill: 'blue', part }),
        centredText(at.x, at.y, name, { ...figure, ink: 'on-blue' }),
      ];
    case 'later':
      return [
        circle(at.x, at.y, radius, { pen: 'edge', fill: 'paper', part }),
        centredText(at.x, at.y, name, { ...figure, weight: 400 }),
      ];
  }
}

function crossHairs(at: Point, radius: number): readonly Shape[] {
  return [0, 180].map((angle) => {
    const [from, to] = [polar(at, radius - 2, angle), polar(at, radius + 3.5, angle)];
    return line(from.x, from.y, to.x, to.y, 'oxide');
  });
}

/** How far a valve hangs below its seat on the drawing; the lift itself is not known. */
const drops: Readonly<Record<ValveState, number>> = { shut: 0, opening: 7, closing: 7, full: 14 };

/** A valve under its number, its head on the seat or below it, with the letter of its kind. */
export function sideView(at: Point, pitch: number, inlet: boolean, opening: ValveState): readonly Shape[] {
  const half = Math.min(9, pitch / 2 - 3);
  const seat = at.y + 28;
  const y = seat + drops[opening];
  const head = [
    { x: at.x - half + 4, y: y - 4 },
    { x: at.x + half - 4, y: y - 4 },
    { x: at.x + half, y },
    { x: at.x - half, y },
  ];
  const outline = `${track(head)}Z`;
  return [
    line(at.x - pitch / 2, seat, at.x - half - 1, seat, 'edge'),
    line(at.x + half + 1, seat, at.x + pitch / 2, seat, 'edge'),
    line(at.x, at.y + 16, at.x, y - 4, 'edge'),
    ...(inlet
      ? [path(outline, { pen: 'blue-thin', fill: 'blue-wash', part: `valve:${opening}` })]
      : [
          polygon(
            head.map((p) => [p.x, p.y]),
            { fill: 'paper' },
          ),
          hatching(head, 45, 2.4),
          path(outline, { pen: 'edge', part: `valve:${opening}` }),
        ]),
    centredText(at.x, seat + 25, inlet ? 'I' : 'E', { face: 'figures', ink: 'ink-2' }),
  ];
}

/** The three signs and their words, and below them what the side views mean. */
export function lashLegend(
  width: number,
  y: number,
  withSideView: boolean,
  { say }: Wording,
): readonly Shape[] {
  const signs: readonly (readonly [LashState, number, string])[] = [
    ['now', 18, 'set now'],
    ['before', 118, 'set before'],
    ['later', 236, 'to come'],
  ];
  return [
    ...signs.flatMap(([state, x, label]) => [
      ...lashBadge({ x, y }, 6.5, state, '', `legend:${state}`).filter(({ kind }) => kind !== 'text'),
      text(x + 14, y + 4.5, label),
    ]),
    ...(withSideView
      ? [
          text(10, y + 26, say('I {inlet}, E exhaust; lowest: fully open'), { ink: 'ink-2' }),
          text(width - 10, y + 26, 'lift not to scale', { anchor: 'end', ink: 'ink-2' }),
        ]
      : []),
  ];
}
