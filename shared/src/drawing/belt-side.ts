import type { BeltLength, BeltLengthRequest } from '../contracts/belt-drive.js';
import type { Quantity } from '../contracts/quantity.js';
import { convert, toSi } from '../quantities/convert.js';
import { dimension } from './dimension.js';
import { round } from './geometry.js';
import { circle, line, path, text, type Drawing, type Point, type Shape } from './shapes.js';
import { decimalsOfUnit } from './unit-decimals.js';
import { decimalsOf, wording, type DrawingOptions, type Wording } from './words.js';

export interface BeltSideInput {
  readonly request: BeltLengthRequest;
  readonly answer: BeltLength;
  /** How far the belt gives at the middle of its run; drawn to the scale of the rest. */
  readonly deflection?: Quantity;
}

interface Side {
  readonly driver: Point & { readonly radius: number };
  readonly driven: Point & { readonly radius: number };
  /** Of the belt's runs to the line of centres, radians. */
  readonly alpha: number;
  readonly scale: number;
}

const width = 340;
const across = 300;
const tallest = 150;
const top = 40;

/** An open belt round its two pulleys from the side, to scale, with centres, wrap and what the belt gives. */
export function drawBeltSide(input: BeltSideInput, options?: DrawingOptions): Drawing {
  const words = wording(options);
  const side = sideOf(input.request);
  const half = Math.max(side.driver.radius, side.driven.radius);
  const foot = round(side.driver.y + half + 30);
  const rows = rowsOf(input, words);
  return {
    title: 'Belt from the side',
    description: `${rows.map(([what = '', figure = '']) => `${what} ${figure}.`).join(' ')} To scale.`,
    width,
    height: foot + 66,
    shapes: [
      ...pulley(side.driver),
      ...pulley(side.driven),
      path(beltPath(side), { pen: 'blue', part: 'belt' }),
      ...given(input, side, words),
      line(round(side.driver.x), round(side.driver.y), round(side.driver.x), foot + 4, 'dimension'),
      line(round(side.driven.x), round(side.driven.y), round(side.driven.x), foot + 4, 'dimension'),
      ...dimension('across', foot, side.driver.x, side.driven.x),
      text(round((side.driver.x + side.driven.x) / 2), foot - 5, printed(input.request.centres, words), {
        anchor: 'middle',
        face: 'figures',
        weight: 600,
        halo: true,
      }),
      ...feet(input, foot),
    ],
    table: { columns: ['What', 'Figure'], rows },
  };
}

function sideOf({ driverDiameter, drivenDiameter, centres }: BeltLengthRequest): Side {
  const [d1, d2, c] = [driverDiameter, drivenDiameter, centres].map(toSi) as [number, number, number];
  const scale = Math.min(across / (d1 / 2 + c + d2 / 2), tallest / Math.max(d1, d2));
  const y = top + (Math.max(d1, d2) / 2) * scale;
  const left = (width - (d1 / 2 + c + d2 / 2) * scale) / 2;
  const x = left + (d1 / 2) * scale;
  return {
    driver: { x, y, radius: (d1 / 2) * scale },
    driven: { x: x + c * scale, y, radius: (d2 / 2) * scale },
    alpha: Math.asin((d1 - d2) / (2 * c)),
    scale,
  };
}

function pulley({ x, y, radius }: Side['driver']): readonly Shape[] {
  const [cx, cy, r] = [round(x), round(y), round(radius)];
  const arm = round(r + 6);
  return [
    circle(cx, cy, r, { pen: 'edge', fill: 'paper' }),
    circle(cx, cy, Math.min(5, r / 2), { pen: 'outline', fill: 'paper' }),
    line(cx - arm, cy, cx + arm, cy, 'centre'),
    line(cx, cy - arm, cx, cy + arm, 'centre'),
  ];
}

/** Where a run leaves a pulley: `up` is −1 for the upper run. */
function leaves({ x, y, radius }: Side['driver'], alpha: number, up: 1 | -1): Point {
  return { x: round(x + radius * Math.sin(alpha)), y: round(y + up * radius * Math.cos(alpha)) };
}

function beltPath({ driver, driven, alpha }: Side): string {
  const [a, b] = [leaves(driver, alpha, -1), leaves(driven, alpha, -1)];
  const [c, d] = [leaves(driven, alpha, 1), leaves(driver, alpha, 1)];
  const [r1, r2] = [round(driver.radius), round(driven.radius)];
  return (
    `M${a.x} ${a.y}L${b.x} ${b.y}A${r2} ${r2} 0 ${alpha < 0 ? 1 : 0} 1 ${c.x} ${c.y}` +
    `L${d.x} ${d.y}A${r1} ${r1} 0 ${alpha > 0 ? 1 : 0} 1 ${a.x} ${a.y}`
  );
}

/** The upper run pressed at its middle. */
function given(
  { deflection }: BeltSideInput,
  { driver, driven, alpha, scale }: Side,
  words: Wording,
): readonly Shape[] {
  if (deflection === undefined) return [];
  const [a, b] = [leaves(driver, alpha, -1), leaves(driven, alpha, -1)];
  const x = round((a.x + b.x) / 2);
  const y = round((a.y + b.y) / 2);
  const pressed = round(y + Math.min(toSi(deflection) * scale, tallest / 2));
  return [
    path(`M${a.x} ${a.y}L${x} ${pressed}L${b.x} ${b.y}`, { pen: 'blue-hidden', part: 'pressed' }),
    ...dimension('down', x, y, pressed),
    text(x, Math.min(y - 18, 24), `gives ${printed(deflection, words)}`, {
      anchor: 'middle',
      weight: 600,
      halo: true,
    }),
  ];
}

function feet({ answer }: BeltSideInput, foot: number): readonly Shape[] {
  const wrap = (degrees: number): string => `lies on ${degrees.toFixed(0)}°`;
  return [
    text(12, foot + 28, 'driver', { weight: 600 }),
    text(12, foot + 46, wrap(answer.wrap.driver), { ink: 'ink-2' }),
    text(width - 12, foot + 28, 'driven', { weight: 600, anchor: 'end' }),
    text(width - 12, foot + 46, wrap(answer.wrap.driven), { ink: 'ink-2', anchor: 'end' }),
  ];
}

function printed({ value, unit }: Quantity, { figure }: Wording): string {
  return `${figure(value, decimalsOf(value, Math.min(2, decimalsOfUnit(unit))))} ${unit}`;
}

function rowsOf(
  { request, answer, deflection }: BeltSideInput,
  words: Wording,
): readonly (readonly string[])[] {
  const unit = request.centres.unit;
  return [
    ['Driver', printed(convert(request.driverDiameter, unit), words)],
    ['Driven pulley', printed(convert(request.drivenDiameter, unit), words)],
    ['Between centres', printed(request.centres, words)],
    ['Belt', printed(answer.length, words)],
    ['Belt lies on the driver', `${words.figure(answer.wrap.driver, 0)}°`],
    ['Belt lies on the driven pulley', `${words.figure(answer.wrap.driven, 0)}°`],
    ...(deflection === undefined ? [] : [['Gives at its middle', printed(deflection, words)]]),
  ];
}
