import type { BeltLine, BeltLineRequest, PulleyLine } from '../contracts/belt-drive.js';
import type { Quantity } from '../contracts/quantity.js';
import { beltLineLayout, placed, type BeltLineLayout, type PulleyLayout } from './belt-line-layout.js';
import { dimension } from './dimension.js';
import { arrowHead, round, track } from './geometry.js';
import {
  circle,
  line,
  path,
  polygon,
  rect,
  text,
  textWidth,
  type Drawing,
  type Point,
  type Shape,
} from './shapes.js';
import { decimalsOfUnit } from './unit-decimals.js';
import { decimalsOf, shortened, wording, type DrawingOptions, type Wording } from './words.js';

export interface BeltLineInput {
  readonly request: BeltLineRequest;
  readonly answer: BeltLine;
  /** Which driven pulley is drawn with the driver, from 0. */
  readonly driven: number;
}

const width = 340;
const beltHalf = 4;

/**
 * The driver and one driven pulley from above, with the straight edge, its four gaps and the belt in the grooves.
 * Along the belt to scale; across it drawn to the exaggeration that the drawing states. The drawn pulleys' widths
 * stand for any.
 */
export function drawBeltLine(input: BeltLineInput, options?: DrawingOptions): Drawing {
  const words = wording(options);
  const found = input.answer.pulleys[input.driven];
  if (found === undefined) throw new RangeError(`There is no driven pulley ${input.driven}.`);
  const layout = beltLineLayout(input.request, input.driven, found);
  const drawn = layout.times === undefined ? 'Not to scale across' : `Misalignment drawn ×${layout.times}`;
  const scale = layout.isEnlarged ? `${drawn}, pulleys enlarged` : drawn;
  const foot = round(layout.lowest + 22);
  return {
    title: `Belt line from above, ${found.name}`,
    description: `${rowsOf(input, found, words)
      .map(([what = '', figure = '']) => `${what} ${figure}.`)
      .join(' ')} ${scale}.`,
    width,
    height: foot + 54,
    shapes: [
      ...pulley(layout.driver),
      ...pulley(layout.driven),
      belt(layout),
      ...planes(layout),
      rect(12, round(layout.edge - 7), width - 24, 7, { pen: 'edge', fill: 'well' }),
      ...gapFigures(input, layout, words),
      ...offsetMark(layout, found),
      ...names(input, found, foot),
      ...judged(found, foot, words),
      text(12, 20, scale, { weight: 500 }),
      ...forward(),
    ],
    table: { columns: ['What', 'Figure'], rows: [...rowsOf(input, found, words), ['Drawn', scale]] },
  };
}

/** A grooved pulley from above: rims, groove and the ends of its shaft's centre line. */
function pulley(one: PulleyLayout): readonly Shape[] {
  const { radius, groove, back } = one;
  const deep = Math.min(13, radius * 0.45);
  const side = (sign: 1 | -1) =>
    [
      [sign * radius, 0],
      [sign * radius, groove - 11],
      [sign * (radius - deep), groove - 3],
      [sign * (radius - deep), groove + 3],
      [sign * radius, groove + 11],
      [sign * radius, back],
    ] as const;
  const outline = [...side(1), ...[...side(-1)].reverse()].map(([x, y]) => placed(one, x, y));
  const stroke = (y: number, half: number): Shape => {
    const [from, to] = [placed(one, -half, y), placed(one, half, y)];
    return line(round(from.x), round(from.y), round(to.x), round(to.y), 'thin');
  };
  const [front, rear] = [placed(one, 0, -12), placed(one, 0, back + 8)];
  return [
    polygon(
      outline.map(({ x, y }) => [round(x), round(y)] as const),
      { pen: 'outline', fill: 'paper' },
    ),
    stroke(groove - 11, radius),
    stroke(groove + 11, radius),
    stroke(groove - 3, radius - deep),
    stroke(groove + 3, radius - deep),
    line(round(front.x), round(front.y), round(rear.x), round(rear.y), 'centre'),
  ];
}

/** The belt, straight between the grooves' middles and with each pulley round it. */
function belt({ driver, driven }: BeltLineLayout): Shape {
  const way = [
    placed(driver, -driver.radius + 6, driver.groove),
    placed(driver, 0, driver.groove),
    placed(driven, 0, driven.groove),
    placed(driven, driven.radius - 6, driven.groove),
  ];
  const outline = [
    ...way.map(({ x, y }) => ({ x, y: y - beltHalf })),
    ...way
      .slice()
      .reverse()
      .map(({ x, y }) => ({ x, y: y + beltHalf })),
  ];
  return path(`${track(outline)}Z`, { pen: 'blue', fill: 'blue-wash', part: 'belt' });
}

/** The driver's plane carried over the span, and the driven pulley's own. */
function planes({ driver, driven, plane }: BeltLineLayout): readonly Shape[] {
  const start = placed(driver, 0, driver.groove);
  const rise = (plane - start.y) / (driven.x - start.x);
  const at = (x: number): Point => ({ x, y: start.y + (x - start.x) * rise });
  const own = [-driven.radius - 12, driven.radius + 10].map((x) => placed(driven, x, driven.groove));
  return [
    path(track([at(driver.x - driver.radius - 8), at(width - 8)]), { pen: 'centre' }),
    path(track(own), { pen: 'centre' }),
  ];
}

/** From the driver's plane to the driven groove's middle, at the driven pulley's middle. */
function offsetMark({ driven, plane }: BeltLineLayout, { verdict }: PulleyLine): readonly Shape[] {
  const middle = placed(driven, 0, driven.groove);
  const x = round(middle.x);
  if (Math.abs(middle.y - plane) < 1)
    return [circle(x, round(middle.y), 2.4, { fill: 'line', part: 'offset' })];
  const pen = verdict === 'pass' ? 'outline' : 'oxide';
  return [
    { ...line(x, round(plane), x, round(middle.y), pen), part: 'offset' },
    ...dimension('down', x, plane, middle.y),
  ];
}

/** The gaps over the straight edge, pushed apart where two rims are near each other. */
function gapFigures(
  { request, driven }: BeltLineInput,
  layout: BeltLineLayout,
  words: Wording,
): readonly Shape[] {
  const gaps = (request.driven[driven] ?? request.driven[0])?.gaps;
  if (gaps === undefined) return [];
  const rims = [
    { at: placed(layout.driver, -layout.driver.radius, 0), gap: gaps.driverFar },
    { at: placed(layout.driver, layout.driver.radius, 0), gap: gaps.driverNear },
    { at: placed(layout.driven, -layout.driven.radius, 0), gap: gaps.drivenNear },
    { at: placed(layout.driven, layout.driven.radius, 0), gap: gaps.drivenFar },
  ];
  const labels = rims.map(({ gap }) =>
    text(0, 80, figureOf(gap, words), { face: 'figures', anchor: 'middle', halo: true }),
  );
  const places = spread(
    rims.map(({ at }) => at.x),
    labels.map((label) => textWidth(label)),
  );
  return [
    text(12, 58, 'straight edge, and the gaps to it', { ink: 'ink-2' }),
    ...rims.flatMap(({ at }, i): readonly Shape[] => {
      const x = round(places[i] ?? at.x);
      const rim = { x: round(at.x), y: round(at.y) };
      return [
        line(x, 84, rim.x, Math.min(round(layout.edge - 7), rim.y), 'dimension'),
        line(rim.x, round(layout.edge), rim.x, rim.y, 'oxide-thin', 'gap'),
        { ...text(x, 80, '', {}), ...labels[i], at: { x, y: 80 } } as Shape,
      ];
    }),
  ];
}

/** Middles of labels beside each other, each as near its place as the ones before leave room. */
function spread(wanted: readonly number[], widths: readonly number[]): readonly number[] {
  const places: number[] = [];
  wanted.forEach((x, i) => {
    const half = (widths[i] ?? 0) / 2;
    const before = i === 0 ? 4 : (places[i - 1] ?? 0) + (widths[i - 1] ?? 0) / 2 + 12;
    places.push(Math.max(x, before + half));
  });
  let most = width - 4;
  for (let i = places.length - 1; i >= 0; i -= 1) {
    const half = (widths[i] ?? 0) / 2;
    places[i] = Math.min(places[i] ?? 0, most - half);
    most = (places[i] ?? 0) - half - 12;
  }
  return places;
}

function names({ request }: BeltLineInput, { name }: PulleyLine, foot: number): readonly Shape[] {
  return [
    text(12, foot, shortened(request.driver.name, 20), { weight: 600, halo: true }),
    text(width - 12, foot, shortened(name, 20), { weight: 600, anchor: 'end', halo: true }),
  ];
}

function judged(found: PulleyLine, foot: number, words: Wording): readonly Shape[] {
  const ink = found.verdict === 'pass' ? 'ink' : 'oxide';
  return [
    text(width - 12, foot + 20, offsetWords(found, words), { anchor: 'end', ink, halo: true }),
    text(width - 12, foot + 40, turnWords(found, words), {
      anchor: 'end',
      ink,
      halo: true,
    }),
  ];
}

function turnWords({ angle }: PulleyLine, { figure }: Wording): string {
  return Math.abs(angle) < 0.005 ? 'not turned' : `${figure(Math.abs(angle), 2)}° turned`;
}

function offsetWords({ offset }: PulleyLine, words: Wording): string {
  const figure = `${figureOf({ ...offset, value: Math.abs(offset.value) }, words)} ${offset.unit}`;
  return offset.value === 0 ? 'in one plane' : `${figure} ${offset.value > 0 ? 'back' : 'forward'}`;
}

function forward(): readonly Shape[] {
  return [
    line(width - 16, 30, width - 16, 14, 'dimension'),
    arrowHead({ x: width - 16, y: 8 }, 0, 'line'),
    text(width - 24, 22, 'forward', { anchor: 'end', ink: 'ink-2' }),
  ];
}

function figureOf({ value, unit }: Quantity, { figure }: Wording): string {
  return figure(value, decimalsOf(value, Math.max(1, decimalsOfUnit(unit) - 1))).replace('-', '−');
}

function rowsOf(
  { request, driven }: BeltLineInput,
  found: PulleyLine,
  words: Wording,
): readonly (readonly string[])[] {
  const gaps = (request.driven[driven] ?? request.driven[0])?.gaps;
  const row = (what: string, quantity: Quantity | undefined): readonly string[] => [
    what,
    quantity === undefined ? '' : `${figureOf(quantity, words)} ${quantity.unit}`,
  ];
  const { name } = request.driver;
  return [
    row(`Gap, ${name}, far rim`, gaps?.driverFar),
    row(`Gap, ${name}, near rim`, gaps?.driverNear),
    row(`Gap, ${found.name}, near rim`, gaps?.drivenNear),
    row(`Gap, ${found.name}, far rim`, gaps?.drivenFar),
    ['Grooves', offsetWords(found, words)],
    ['Turned', `${words.figure(found.angle, 2).replace('-', '−')}°`],
  ];
}
