import type { KeyFit, KeyFitRequest } from '../contracts/fits.js';
import type { Quantity, Unit } from '../contracts/quantity.js';
import { convert } from '../quantities/convert.js';
import { dimension } from './dimension.js';
import { corners, hatching, round, track } from './geometry.js';
import { keywayLayout, surfacePoints, type KeywayLayout } from './keyway-layout.js';
import { centredText, line, path, polygon, rect, text, textWidth } from './shapes.js';
import type { Drawing, Point, Shape } from './shapes.js';
import { decimalsOfUnit } from './unit-decimals.js';
import { decimalsOf, shortened, wording, type DrawingOptions, type Wording } from './words.js';

export interface KeywayInput {
  readonly request: KeyFitRequest;
  readonly answer: KeyFit;
}

const width = 340;
/** Between shaft and bore, so that two lines are seen. */
const joint = 3;

/**
 * A key in the slots of shaft and hub, section across the shaft. Key and depths are to one scale; the plays, all
 * on the right and over the key, are drawn to the exaggeration that the drawing states. What is too tight is
 * drawn as metal in metal, in red oxide.
 */
export function drawKeyway({ request, answer }: KeywayInput, options?: DrawingOptions): Drawing {
  const { shaft: inShaft, hub: inHub, top } = answer.play;
  const play = { shaft: shown(inShaft), hub: shown(inHub), top: shown(top) };
  const input: KeywayInput = { request, answer: { ...answer, play } };
  const words = wording(options);
  const layout = keywayLayout(input.request, input.answer);
  const foot = round(layout.ends.foot + 34);
  const scale = scaleWords(layout);
  return {
    title: 'Key in its keyway, section across the shaft',
    description: describe(input, scale, words),
    width,
    height: foot + 34,
    shapes: [
      ...hub(layout),
      ...shaft(layout),
      ...key(layout, input.request, words),
      ...tooTight(layout, input.answer),
      line(middleOf(layout), 34, middleOf(layout), round(layout.ends.foot + 12), 'centre'),
      ...plays(layout, input.answer, foot, words),
      text(12, foot + 24, scale, { ink: 'ink-2' }),
    ],
    table: { columns: ['What', 'Figure'], rows: [...rowsOf(input, words), ['Drawn', scale]] },
  };
}

const middleOf = ({ left, right }: KeywayLayout): number => round((left + right) / 2);

function scaleWords({ sides, over, isToScale }: KeywayLayout): string {
  const one = (what: string, factor: number | undefined): string =>
    factor === undefined ? `${what} cut short` : `${what} ×${factor}`;
  const plays = sides === over ? one('Plays', sides) : `${one('Sides', sides)}, ${one('top', over)}`;
  return isToScale ? plays : `${plays}, rest not to scale`;
}

/** A freehand line from one point to another, bulging `bulge` to its left and right in turn. */
function freehand(from: Point, to: Point, bulge: number): readonly Point[] {
  const count = 24;
  const length = Math.max(1, Math.hypot(to.x - from.x, to.y - from.y));
  const [nx, ny] = [(from.y - to.y) / length, (to.x - from.x) / length];
  return Array.from({ length: count + 1 }, (_, i) => {
    const t = i / count;
    const away = bulge * Math.sin(t * Math.PI * 3) * Math.sin(t * Math.PI);
    return { x: from.x + (to.x - from.x) * t + nx * away, y: from.y + (to.y - from.y) * t + ny * away };
  });
}

/** A broken-out piece: hatched inside, its machined edge outlined, its break thin. */
function piece(machined: readonly Point[], broken: readonly Point[], angle: 45 | 135): readonly Shape[] {
  const outline = [...machined, ...broken];
  return [
    polygon(
      outline.map(({ x, y }) => [round(x), round(y)] as const),
      { fill: 'paper' },
    ),
    hatching(outline, angle, 6.5),
    path(track(machined), { pen: 'outline' }),
    path(track(broken), { pen: 'thin' }),
  ];
}

function hub(layout: KeywayLayout): readonly Shape[] {
  const { left, hubWall, roof, ends } = layout;
  const bore = [
    ...surfacePoints(layout, ends.left, left, joint),
    { x: left, y: roof },
    { x: hubWall, y: roof },
    ...surfacePoints(layout, hubWall, ends.right, joint),
  ];
  const top = Math.min(roof, layout.top) - 30;
  const [first, last] = [bore[0], bore.at(-1)];
  if (first === undefined || last === undefined) return [];
  const broken = [
    ...freehand(last, { x: ends.right, y: top }, 5),
    ...freehand({ x: ends.right, y: top }, { x: ends.left, y: top }, 4),
    ...freehand({ x: ends.left, y: top }, first, 5),
  ];
  return [
    ...piece(bore, broken, 135),
    text(ends.right - 12, top + 26, 'hub', { anchor: 'end', weight: 600, halo: true }),
  ];
}

function shaft(layout: KeywayLayout): readonly Shape[] {
  const { left, shaftWall, bottom, ends } = layout;
  const surface = [
    ...surfacePoints(layout, ends.left, left, 0),
    { x: left, y: bottom },
    { x: shaftWall, y: bottom },
    ...surfacePoints(layout, shaftWall, ends.right, 0),
  ];
  const { foot } = ends;
  const [first, last] = [surface[0], surface.at(-1)];
  if (first === undefined || last === undefined) return [];
  const broken = [
    ...freehand(last, { x: ends.right, y: foot }, 5),
    ...freehand({ x: ends.right, y: foot }, { x: ends.left, y: foot }, 4),
    ...freehand({ x: ends.left, y: foot }, first, 5),
  ];
  return [
    ...piece(surface, broken, 45),
    text(ends.left + 14, round(Math.max(bottom + 22, layout.surface(ends.left) + 18)), 'shaft', {
      weight: 600,
      halo: true,
    }),
  ];
}

function key(
  layout: KeywayLayout,
  { key: { width: size } }: KeyFitRequest,
  words: Wording,
): readonly Shape[] {
  const { left, right, top, bottom } = layout;
  const [w, h] = [right - left, bottom - top];
  const x = middleOf(layout);
  return [
    rect(left, top, w, h, { fill: 'paper' }),
    hatching(corners(left, top, w, h), 45, 3),
    rect(left, top, w, h, { pen: 'outline', part: 'key' }),
    ...(w >= 56 && h >= 62
      ? [
          ...dimension('across', top + 38, left, right),
          text(x, top + 32, figureOf(shown(size), words), {
            face: 'figures',
            weight: 600,
            anchor: 'middle',
            halo: true,
          }),
        ]
      : []),
    ...(w >= 36 && h >= 24 ? [centredText(x, bottom - 14, 'key', { weight: 600, halo: true })] : []),
  ];
}

/** Where slot and key would be in one place. */
function tooTight(layout: KeywayLayout, { play }: KeyFit): readonly Shape[] {
  const { left, right, top, bottom, shaftWall, hubWall, roof } = layout;
  const crown = Math.min(bottom, Math.max(top, layout.surface(right)));
  const zone = (x: number, y: number, w: number, h: number, part: string): readonly Shape[] =>
    w <= 0 || h <= 0
      ? []
      : [rect(round(x), round(y), round(w), round(h), { fill: 'oxide-wash', pen: 'oxide', part })];
  return [
    ...(play.shaft.value < 0 ? zone(shaftWall, crown, right - shaftWall, bottom - crown, 'tight:shaft') : []),
    ...(play.hub.value < 0 ? zone(hubWall, top, right - hubWall, crown - top, 'tight:hub') : []),
    ...(play.top.value < 0 ? zone(left, top, right - left, Math.max(0, roof - top), 'tight:top') : []),
  ];
}

function plays(layout: KeywayLayout, { play }: KeyFit, foot: number, words: Wording): readonly Shape[] {
  const { left, right, top, bottom, shaftWall, hubWall, roof } = layout;
  const at = (x: number): number => round(x);
  const beside = left - 22;
  return [
    line(right, top - 2, right, 18, 'dimension'),
    line(at(hubWall), Math.min(roof, top) - 2, at(hubWall), 18, 'dimension'),
    ...dimension('across', 22, right, hubWall),
    ...playLabel('hub', play.hub, Math.min(right, hubWall) - 18, 26, words),
    line(right, bottom + 2, right, foot + 4, 'dimension'),
    line(at(shaftWall), bottom + 2, at(shaftWall), foot + 4, 'dimension'),
    ...dimension('across', foot, right, shaftWall),
    ...playLabel('shaft', play.shaft, Math.min(right, shaftWall) - 18, foot + 4, words),
    line(left - 2, at(roof), beside - 4, at(roof), 'dimension'),
    line(left - 2, top, beside - 4, top, 'dimension'),
    ...dimension('down', beside, roof, top),
    text(beside - 8, round((roof + top) / 2) + 5, figureOf(play.top, words), {
      face: 'figures',
      weight: 600,
      anchor: 'end',
      halo: true,
      ink: play.top.value < 0 ? 'oxide' : 'ink',
      part: 'play:top',
    }),
  ];
}

/** Words, figure and unit, ending at x. */
function playLabel(
  where: 'hub' | 'shaft',
  play: Quantity,
  x: number,
  y: number,
  words: Wording,
): readonly Shape[] {
  const ink = play.value < 0 ? 'oxide' : 'ink';
  const unit = text(x, y, play.unit, { anchor: 'end', ink: 'ink-2', halo: true });
  const figure = text(
    round(x - Math.max(24, 8 * unit.content.length) - 4),
    y,
    figureOf({ ...play, value: Math.abs(play.value) }, words),
    {
      face: 'figures',
      weight: 600,
      anchor: 'end',
      ink,
      halo: true,
      part: `play:${where}`,
    },
  );
  const word = `${play.value < 0 ? 'tight' : 'play'} in ${where}`;
  return [
    text(round(figure.at.x - textWidth(figure) - 4), y, word, { anchor: 'end', ink, halo: true }),
    figure,
    unit,
  ];
}

/** In a unit that a key is measured in: a play in metres is nothing to read. */
function shown(quantity: Quantity): Quantity {
  const units: Partial<Record<Unit, Unit>> = { m: 'mm', cm: 'mm', ft: 'in' };
  return convert(quantity, units[quantity.unit] ?? quantity.unit);
}

/** At most six characters and a sign, so that a label keeps its place. */
function figureOf({ value, unit }: Quantity, { figure }: Wording): string {
  const whole = Math.abs(value).toFixed(0).length;
  const most = Math.max(0, Math.min(decimalsOfUnit(unit), (whole > 2 ? 4 : 5) - whole));
  return shortened(figure(value, decimalsOf(value, most)).replace('-', '−'), 7);
}

function rowsOf({ request, answer: { play } }: KeywayInput, words: Wording): readonly (readonly string[])[] {
  const { unit } = play.shaft;
  const row = (name: string, quantity: Quantity): readonly string[] => [
    name,
    `${figureOf(convert(quantity, unit), words)} ${unit}`,
  ];
  return [
    row('Key, width', request.key.width),
    row('Key, height', request.key.height),
    row('Slot in the shaft, width', request.shaftKeyway.width),
    row('Slot in the hub, width', request.hubKeyway.width),
    row('Play in the shaft', play.shaft),
    row('Play in the hub', play.hub),
    row('Free over the key', play.top),
  ];
}

function describe(input: KeywayInput, scale: string, words: Wording): string {
  return `${rowsOf(input, words)
    .map(([name = '', figure = '']) => `${name} ${figure}.`)
    .join(' ')} ${scale}.`;
}
