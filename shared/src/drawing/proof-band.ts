import { arrowHead, corners, hatching, round } from './geometry.js';
import { circle, line, rect, text, textWidth, type Drawing, type Point, type Shape } from './shapes.js';
import { wording, type DrawingOptions, type Wording } from './words.js';

/** A clamp load as shares of the proof load: 0.75 is 75 %. */
export interface ProofBandPoint {
  /** The torque that makes it: `27 lbf·ft`. */
  readonly label: string;
  readonly share: number;
  /** As the nut factor may be off. */
  readonly low: number;
  readonly high: number;
}

export interface ProofBandInput {
  /** The first is a solid dot, the second an outline. */
  readonly points: readonly [ProofBandPoint, ProofBandPoint?];
  /** `SAE 5 at 3/8-16 UNC`. */
  readonly of: string;
  /** Under and over these shares of the proof load a torque is doubted. */
  readonly least: number;
  readonly most: number;
}

const width = 340;
const left = 14;
const right = 326;
const top = 24;
/** The share at the right end of the axis. */
const end = 1.5;
const at = (share: number): number => round(left + (Math.min(share, end) / end) * (right - left));

/**
 * The clamp load of a torque on a band from nothing to half over the proof load. Hatched zones are where a torque
 * is doubted; a bar is what the nut factor may make of it. A load beyond the axis is an arrow out of it.
 */
export function drawProofBand(input: ProofBandInput, options?: DrawingOptions): Drawing {
  const words = wording(options);
  const points = input.points.filter((point) => point !== undefined);
  const axis = points.length > 1 ? 112 : 78;
  const percent = (share: number): string => `${words.figure(share * 100, share < 0.1 ? 1 : 0)} %`;
  return {
    title: 'Clamp load against the proof load',
    description:
      `Of the proof load of ${input.of}: ` +
      `${points.map((point) => inSentence(point, percent)).join('; ')}. ` +
      `Doubted under ${percent(input.least)} and over ${percent(input.most)}.`,
    width,
    height: axis + 44,
    shapes: [
      ...zones(input, axis),
      line(left, axis, right, axis, 'edge'),
      ...[0, 0.25, 0.5, 0.75, 1, 1.25, 1.5].map((share) =>
        line(at(share), axis, at(share), axis + 4, 'thin'),
      ),
      ...bounds(input, axis, words),
      ...points.flatMap((point, i) => pointShapes(point, i, percent, input.most)),
      text(width / 2, axis + 38, `% of the proof load of ${input.of}`, { ink: 'ink-2', anchor: 'middle' }),
    ],
    table: {
      columns: ['Torque', 'Of the proof load', 'From', 'To'],
      rows: points.map(({ label, share, low, high }) => [label, percent(share), percent(low), percent(high)]),
    },
  };
}

const inSentence = (
  { label, share, low, high }: ProofBandPoint,
  percent: (share: number) => string,
): string => `${label} ${percent(share)}, from ${percent(low)} to ${percent(high)}`;

function zones({ least, most }: ProofBandInput, axis: number): readonly Shape[] {
  const zone = (from: number, to: number, spacing: number, part: string): Shape => ({
    ...hatching(corners(at(from), top, at(to) - at(from), axis - top), 45, spacing),
    part,
  });
  return [
    rect(at(1), top, right - at(1), axis - top, { fill: 'oxide-wash', part: 'zone:over' }),
    zone(0, least, 6, 'zone:low'),
    zone(most, 1, 6, 'zone:high'),
    zone(1, end, 4, 'zone:over'),
  ];
}

function bounds({ least, most }: ProofBandInput, axis: number, words: Wording): readonly Shape[] {
  const figure = (share: number): string => words.figure(share * 100, 0);
  const number = (share: number, x: number, anchor: 'middle' | 'end' | 'start'): Shape =>
    text(x, axis + 19, figure(share), { face: 'figures', weight: 600, anchor });
  return [
    line(at(least), top - 4, at(least), axis + 7, 'edge', 'bound:low'),
    line(at(most), top - 4, at(most), axis + 7, 'edge', 'bound:high'),
    line(at(1), top - 6, at(1), axis + 7, 'oxide', 'bound:proof'),
    number(least, at(least), 'middle'),
    number(most, at(most) - 1, 'end'),
    number(1, at(1) + 1, 'start'),
    text(at(1) + 1, top - 9, 'proof load', { anchor: 'middle', ink: 'oxide' }),
  ];
}

function pointShapes(
  { label, share, low, high }: ProofBandPoint,
  index: number,
  percent: (share: number) => string,
  most: number,
): readonly Shape[] {
  const y = 60 + index * 34;
  const isOff = share > end;
  const isOver = share > 1;
  const x = isOff ? right - 16 : at(share);
  const ink = isOver ? 'oxide' : 'ink';
  const pen = isOver ? 'oxide-thin' : 'edge';
  const dot =
    index === 0
      ? circle(x, y, 5, { fill: ink, part: 'point:first' })
      : circle(x, y, 5, { pen: isOver ? 'oxide' : 'outline', fill: 'paper', part: 'point:second' });
  return [
    ...(isOff
      ? [{ ...arrowHead({ x: right, y }, 90, ink, 9, 3.4), part: 'off-the-scale' }]
      : bar(at(low), at(high), y, pen, high > end)),
    dot,
    ...labelShapes(label, percent(share), { x, y: y - 11 }, share < most ? at(most) : width, ink),
  ];
}

/** What the nut factor may make of it; open to the right where it leaves the axis. */
function bar(
  from: number,
  to: number,
  y: number,
  pen: 'edge' | 'oxide-thin',
  isOpen: boolean,
): readonly Shape[] {
  return [
    line(from, y, to, y, pen, 'range'),
    line(from, y - 4, from, y + 4, pen),
    ...(isOpen ? [] : [line(to, y - 4, to, y + 4, pen)]),
  ];
}

/** Torque and share side by side about the dot, kept inside the drawing and short of `end`, a bound's line. */
function labelShapes(
  word: string,
  figure: string,
  { x, y }: Point,
  end: number,
  ink: 'ink' | 'oxide',
): readonly Shape[] {
  const label = text(0, y, word, { anchor: 'end', halo: true, ink });
  const number = text(0, y, figure, { face: 'figures', weight: 600, halo: true, ink });
  const [before, after] = [textWidth(label), textWidth(number)];
  const between = round(Math.min(Math.max(x + (before - after) / 2, before + 8), end - after - 8));
  return [
    { ...label, at: { x: between - 3, y } },
    { ...number, at: { x: between + 3, y } },
  ];
}
