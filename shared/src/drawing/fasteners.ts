import { polar } from './geometry.js';
import type { Pen } from './roles.js';
import { centredText, circle, line, polygon, text, type Point, type Shape } from './shapes.js';

export const fastenerStates = ['done', 'in-hand', 'next', 'to-come'] as const;
export type FastenerState = (typeof fastenerStates)[number];

/** The words beside the signs, in the order of the legend. */
export const tighteningLegend: readonly { readonly state: FastenerState; readonly label: string }[] = [
  { state: 'done', label: 'done' },
  { state: 'in-hand', label: 'in hand' },
  { state: 'next', label: 'next' },
  { state: 'to-come', label: 'to come' },
];

/** Below this a number cannot be read, and the table alone has it. */
const leastForNumber = 8.5;

/** How much larger the fastener in hand is drawn. */
export const inHandScale = 1.3;

/** A nut or bolt from above: solid when done, cross-hairs in hand, double ring next, plain to come. */
export function fastener(
  at: Point,
  radius: number,
  state: FastenerState,
  label: string,
  part: string,
): readonly Shape[] {
  const shapes = numbered(at, radius, state, label, part);
  return radius < leastForNumber ? shapes.filter(({ kind }) => kind !== 'text') : shapes;
}

function numbered(
  at: Point,
  radius: number,
  state: FastenerState,
  label: string,
  part: string,
): readonly Shape[] {
  const size = radius >= 13 ? 14 : 13;
  const number = { face: 'figures', size, weight: 600 } as const;
  switch (state) {
    case 'done':
      return [
        circle(at.x, at.y, radius, { fill: 'blue', part }),
        hexagon(at, radius * 0.87, 'on-blue'),
        centredText(at.x, at.y, label, { ...number, ink: 'on-blue' }),
      ];
    case 'in-hand':
      return [
        circle(at.x, at.y, radius * inHandScale, { pen: 'oxide', fill: 'oxide-wash', part }),
        ...crossHairs(at, radius * inHandScale, 3, 6, 'oxide'),
        hexagon(at, radius * 0.97, 'oxide-thin', 'paper'),
        centredText(at.x, at.y, label, { ...number, size: size + 2, ink: 'oxide' }),
      ];
    case 'next':
      return [
        circle(at.x, at.y, radius + 2, { pen: 'blue-hidden', fill: 'paper' }),
        circle(at.x, at.y, radius - 1.1, { pen: 'blue', fill: 'paper', part }),
        hexagon(at, radius * 0.8, 'blue-thin'),
        centredText(at.x, at.y, label, { ...number, ink: 'blue' }),
      ];
    case 'to-come':
      return [
        circle(at.x, at.y, radius, { pen: 'edge', fill: 'paper', part }),
        hexagon(at, radius * 0.87, 'thin'),
        centredText(at.x, at.y, label, { ...number, weight: 400 }),
      ];
  }
}

function hexagon(at: Point, radius: number, pen: Pen, fill?: 'paper'): Shape {
  const points = [30, 90, 150, 210, 270, 330].map((angle) => polar(at, radius, angle));
  return polygon(
    points.map(({ x, y }) => [x, y]),
    { pen, fill },
  );
}

function crossHairs(at: Point, radius: number, inside: number, outside: number, pen: Pen): readonly Shape[] {
  return [0, 90, 180, 270].map((angle) => {
    const from = polar(at, radius - inside, angle);
    const to = polar(at, radius + outside, angle);
    return line(from.x, from.y, to.x, to.y, pen);
  });
}

/** The four signs and their words on one line across the drawing. */
export function legend(width: number, y: number): readonly Shape[] {
  const starts: Record<FastenerState, number> = { done: 22, 'in-hand': 102, next: 194, 'to-come': 272 };
  return tighteningLegend.flatMap(({ state, label }) => {
    const x = (starts[state] * width) / 340;
    return [...legendSign(state, x, y), text(x + 13, y + 4.5, label)];
  });
}

function legendSign(state: FastenerState, x: number, y: number): readonly Shape[] {
  switch (state) {
    case 'done':
      return [circle(x, y, 6.5, { fill: 'blue' })];
    case 'in-hand':
      return [
        circle(x, y, 6.5, { pen: 'oxide', fill: 'oxide-wash' }),
        ...crossHairs({ x, y }, 6.5, 1.5, 3, 'oxide-thin'),
      ];
    case 'next':
      return [circle(x, y, 8, { pen: 'blue-hidden' }), circle(x, y, 5.4, { pen: 'blue' })];
    case 'to-come':
      return [circle(x, y, 6.5, { pen: 'edge' })];
  }
}
