import { bandScale, bandWidth, type BandInput, type BandReading, type BandScale } from './band-scale.js';
import { arrowHead, corners, hatching, round } from './geometry.js';
import { circle, line, text, textWidth, type Drawing, type DrawingTable, type Shape } from './shapes.js';
import { wording, type DrawingOptions, type Wording } from './words.js';

export type { BandInput, BandReading } from './band-scale.js';

const top = 20;

/**
 * One or two readings on their tolerance band, all in the band's unit. Each reading carries its expanded
 * uncertainty as a bar; the hatched zones inside the limits, as wide as the largest uncertainty, are where a
 * reading does not pass for certain. Either limit may be missing.
 */
export function drawToleranceBand(input: BandInput, options?: DrawingOptions): Drawing {
  const words = wording(options);
  const scale = bandScale(input);
  const axis = input.readings.length > 1 ? 98 : 84;
  const shapes: readonly Shape[] = [
    ...guardZones(input, scale, axis),
    line(scale.left, axis, scale.right, axis, 'edge'),
    ...scale.ticks.map((value) =>
      line(round(scale.at(value)), axis, round(scale.at(value)), axis + 4, 'thin'),
    ),
    ...limits(input, scale, axis, words),
    ...unitWord(input, scale, axis),
    ...input.readings.flatMap((reading, i) => readingShapes(reading, i, scale, words)),
  ];
  return {
    title: 'Reading on its tolerance band',
    description: describe(input, scale, words),
    width: bandWidth,
    height: axis + 28,
    shapes,
    table: tableOf(input, scale, words),
  };
}

/** How far inside each limit a reading does not count as passed for certain. */
function guardOf({ readings }: BandInput): number {
  return Math.max(0, ...readings.map(({ uncertainty }) => uncertainty));
}

function guardZones(input: BandInput, { at, left, right }: BandScale, axis: number): readonly Shape[] {
  const guard = guardOf(input);
  if (guard === 0) {
    return [];
  }
  const { low, high } = input;
  const zone = (from: number, to: number, inner: number, part: string): readonly Shape[] =>
    to - from < 1
      ? []
      : [
          { ...hatching(corners(from, top, to - from, axis - 8 - top), 45, 4.6), part },
          line(round(inner), top, round(inner), axis - 8, 'thin'),
        ];
  if (low !== undefined && high !== undefined && high - low <= 2 * guard) {
    return zone(at(low), at(high), at(high), 'guard:all');
  }
  return [
    ...(low === undefined
      ? []
      : zone(at(low), Math.min(at(low + guard), right), at(low + guard), 'guard:low')),
    ...(high === undefined
      ? []
      : zone(Math.max(at(high - guard), left), at(high), at(high - guard), 'guard:high')),
  ];
}

function limits({ low, high }: BandInput, scale: BandScale, axis: number, words: Wording): readonly Shape[] {
  const one = (limit: number | undefined, word: string): readonly Shape[] => {
    if (limit === undefined) {
      return [];
    }
    const x = round(scale.at(limit));
    return [
      line(x, top - 4, x, axis + 7, 'outline', `limit:${word}`),
      text(x, axis + 21, words.figure(limit, scale.decimals), {
        face: 'figures',
        weight: 600,
        anchor: 'middle',
      }),
      text(x, 12, word, { anchor: 'middle', ink: 'ink-2' }),
    ];
  };
  return [...one(low, 'least'), ...one(high, 'most')];
}

/** The unit stands between the limits, or at the end of the axis where there is no room or only one limit. */
function unitWord({ low, high, unit }: BandInput, { at, right }: BandScale, axis: number): readonly Shape[] {
  const roomy = low !== undefined && high !== undefined && at(high) - at(low) >= 130;
  const x = roomy ? round((at(low) + at(high)) / 2) : right;
  return [text(x, axis + 21, unit, { anchor: roomy ? 'middle' : 'end', ink: 'ink-2', halo: true })];
}

function readingShapes(
  reading: BandReading,
  index: number,
  { at, decimals, left, right }: BandScale,
  words: Wording,
): readonly Shape[] {
  const { value, role, label, failed = false } = reading;
  const y = index === 0 ? 44 : 70;
  const x = round(Math.min(right - 12, Math.max(left + 12, at(value))));
  const off = at(value) < left || at(value) > right;
  const dot: Shape =
    role === 'first'
      ? circle(x, y, 5, { fill: failed ? 'oxide' : 'ink', part: 'reading:first' })
      : circle(x, y, 5, { pen: failed ? 'oxide' : 'outline', fill: 'paper', part: 'reading:second' });
  return [
    ...(off ? offTheScale(x, y, at(value) > right, failed) : uncertaintyBar(reading, y, at)),
    dot,
    ...readingLabel(label, words.figure(value, decimals), x, y + (index === 0 ? -10 : 19), failed),
  ];
}

function uncertaintyBar(
  { value, uncertainty, failed = false }: BandReading,
  y: number,
  at: BandScale['at'],
): readonly Shape[] {
  const pen = failed ? 'oxide-thin' : 'edge';
  const [from, to] = [round(at(value - uncertainty)), round(at(value + uncertainty))];
  return uncertainty > 0
    ? [line(from, y, to, y, pen), line(from, y - 4, from, y + 4, pen), line(to, y - 4, to, y + 4, pen)]
    : [];
}

/** An arrow out of the drawing, for a reading that lies beyond the axis. */
function offTheScale(x: number, y: number, above: boolean, failed: boolean): readonly Shape[] {
  const way = above ? 1 : -1;
  const tip = { x: x + way * 20, y };
  return [
    line(x, y, x + way * 12, y, failed ? 'oxide-thin' : 'edge'),
    { ...arrowHead(tip, above ? 90 : 270, failed ? 'oxide' : 'ink', 9, 3.4), part: 'off-the-scale' },
  ];
}

/** Word and figure side by side about the dot, kept inside the drawing. */
function readingLabel(word: string, figure: string, x: number, y: number, failed: boolean): readonly Shape[] {
  const ink = failed ? 'oxide' : 'ink';
  const label = text(0, y, word, { anchor: 'end', halo: true, ink });
  const number = text(0, y, figure, { face: 'figures', weight: 600, halo: true, ink });
  const [before, after] = [textWidth(label), textWidth(number)];
  const wanted = x + (before - after) / 2;
  const between = round(Math.min(Math.max(wanted, before + 4), bandWidth - after - 4));
  return [
    { ...label, at: { x: between - 2, y } },
    { ...number, at: { x: between + 2, y } },
  ];
}

function tableOf(
  { low, high, unit, readings }: BandInput,
  { decimals }: BandScale,
  { figure }: Wording,
): DrawingTable {
  const quantity = (value: number, places = decimals): string => `${figure(value, places)} ${unit}`;
  return {
    columns: ['', 'Value', 'Good to'],
    rows: [
      ...(low === undefined ? [] : [['least', quantity(low), '']]),
      ...(high === undefined ? [] : [['most', quantity(high), '']]),
      ...readings.map(({ label, value, uncertainty }) => [
        label,
        quantity(value),
        uncertainty > 0 ? `±${quantity(uncertainty, decimals + 1)}` : '',
      ]),
    ],
  };
}

function describe(input: BandInput, scale: BandScale, words: Wording): string {
  const { low, high, unit } = input;
  const figure = (value: number): string => words.figure(value, scale.decimals);
  const limit =
    low !== undefined && high !== undefined
      ? `Limits ${figure(low)} to ${figure(high)} ${unit}.`
      : low !== undefined
        ? `Least ${figure(low)} ${unit}.`
        : high !== undefined
          ? `Most ${figure(high)} ${unit}.`
          : 'No limits.';
  const readings = input.readings.map(({ label, value, uncertainty }) => {
    const share = uncertainty > 0 ? `, uncertainty ${words.figure(uncertainty, scale.decimals + 1)}` : '';
    return `${label.charAt(0).toUpperCase()}${label.slice(1)} ${figure(value)} ${unit}${share}.`;
  });
  return [limit, ...readings].join(' ');
}
