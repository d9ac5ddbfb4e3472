import type { Fit, FitRequest } from '../contracts/fits.js';
import type { Quantity, Unit } from '../contracts/quantity.js';
import { convert, fromSi } from '../quantities/convert.js';
import { requireFitPart, type PartLimits } from '../fits/fit-part.js';
import { dimension } from './dimension.js';
import { corners, hatching, round } from './geometry.js';
import { circle, line, rect, text, type Drawing, type Shape } from './shapes.js';
import { decimalsOfUnit } from './unit-decimals.js';
import { decimalsOf, shortened, wording, type DrawingOptions, type Wording } from './words.js';

export interface FitZonesInput {
  readonly request: FitRequest;
  readonly answer: Fit;
}

const width = 340;
const top = 62;
const tall = 120;
const foot = top + tall;
const zoneWidth = 44;
const holeAt = 76;
const shaftAt = 220;
const leastAt = 148;
const mostAt = 192;

/** Metres, from a size near the parts' own, so that no digits are lost. */
interface Zones {
  readonly hole: { readonly low: number; readonly high: number };
  readonly shaft: { readonly low: number; readonly high: number };
  readonly from: number;
  readonly unit: Unit;
}

/**
 * The zones in which a hole and a shaft may lie, side by side on one scale of sizes, with the tightest and the
 * loosest that they can be. The drawing states its scale by a bar.
 */
export function drawFitZones(input: FitZonesInput, options?: DrawingOptions): Drawing {
  const words = wording(options);
  const zones = zonesOf(input.request);
  const { at, bar } = scaleOf(zones);
  return {
    title: 'Zones of hole and shaft',
    description: describe(input, zones, words),
    width,
    height: foot + 72,
    shapes: [
      line(holeAt, round(at(zones.hole.low)), mostAt + 12, round(at(zones.hole.low)), 'thin'),
      line(holeAt, round(at(zones.hole.high)), mostAt + 12, round(at(zones.hole.high)), 'thin'),
      line(leastAt - 12, round(at(zones.shaft.low)), shaftAt, round(at(zones.shaft.low)), 'thin'),
      line(leastAt - 12, round(at(zones.shaft.high)), shaftAt, round(at(zones.shaft.high)), 'thin'),
      ...zone(holeAt, zones.hole, at, 135, 'hole'),
      ...zone(shaftAt, zones.shaft, at, 45, 'shaft'),
      ...limitFigures(zones, at, words),
      ...between(leastAt, at(zones.shaft.high), at(zones.hole.low), 'least'),
      ...between(mostAt, at(zones.shaft.low), at(zones.hole.high), 'most'),
      ...headings(),
      ...scaleBar(bar, words),
      ...answerLines(input.answer, words),
    ],
    table: { columns: ['', 'Least', 'Most'], rows: rowsOf(input, zones, words) },
  };
}

function zonesOf({ hole, shaft }: FitRequest): Zones {
  const [one, other] = [requireFitPart(hole, 'hole', 'hole'), requireFitPart(shaft, 'shaft', 'shaft')];
  const from = one.from + one.low;
  const moved = (part: PartLimits): Zones['hole'] => ({
    low: part.from - one.from + (part.low - one.low),
    high: part.from - one.from + (part.high - one.low),
  });
  return { hole: moved(one), shaft: moved(other), from, unit: one.unit };
}

/** Where a size is drawn, and the bar that states the scale. */
function scaleOf({ hole, shaft, unit }: Zones): {
  at: (size: number) => number;
  bar: { value: number; unit: Unit; units: number };
} {
  const [low, high] = [Math.min(hole.low, shaft.low), Math.max(hole.high, shaft.high)];
  const span = high - low > 1e-12 ? high - low : 1e-6;
  const perMetre = tall / span;
  const barUnit: Unit = unit === 'in' || unit === 'ft' || unit === 'thou' ? 'thou' : 'µm';
  const metre = convert({ value: 1, unit: 'm' }, barUnit).value;
  const rough = (50 / perMetre) * metre;
  const power = 10 ** Math.floor(Math.log10(rough));
  const value = ([5, 2, 1].find((step) => step * power <= rough) ?? 1) * power;
  return {
    at: (size) => foot - (size - low) * perMetre,
    bar: { value, unit: barUnit, units: (value / metre) * perMetre },
  };
}

function zone(
  x: number,
  { low, high }: Zones['hole'],
  at: (size: number) => number,
  angle: 45 | 135,
  part: string,
): readonly Shape[] {
  const [y, h] = [round(at(high)), round(at(low) - at(high))];
  return [
    rect(x, y, zoneWidth, h, { fill: 'paper' }),
    hatching(corners(x, y, zoneWidth, h), angle, 5),
    rect(x, y, zoneWidth, h, { pen: 'outline', part }),
  ];
}

function limitFigures(zones: Zones, at: (size: number) => number, words: Wording): readonly Shape[] {
  const one = (size: number, x: number, anchor: 'start' | 'end', isHigh: boolean): Shape =>
    text(x, round(at(size)) + (isHigh ? -3 : 12), sizeOf(zones, size, words), {
      face: 'figures',
      anchor,
      halo: true,
    });
  const right = shaftAt + zoneWidth + 6;
  return [
    one(zones.hole.high, holeAt - 6, 'end', true),
    one(zones.hole.low, holeAt - 6, 'end', false),
    one(zones.shaft.high, right, 'start', true),
    one(zones.shaft.low, right, 'start', false),
  ];
}

/** From the shaft's limit to the hole's; nothing where they are one. */
function between(x: number, shaft: number, hole: number, part: string): readonly Shape[] {
  const [a, b] = [round(shaft), round(hole)];
  return Math.abs(a - b) < 0.5
    ? [circle(x, a, 2.4, { fill: 'line', part })]
    : [...dimension('down', x, a, b), { ...line(x, a, x, b, 'dimension'), part }];
}

function headings(): readonly Shape[] {
  const one = (x: number, word: string, weight: 400 | 600): Shape =>
    text(x, 22, word, { anchor: 'middle', weight, ink: weight === 600 ? 'ink' : 'ink-2' });
  return [
    one(holeAt + zoneWidth / 2 - 10, 'hole', 600),
    one(leastAt - 2, 'tightest', 400),
    one(mostAt + 8, 'loosest', 400),
    one(shaftAt + zoneWidth / 2 + 10, 'shaft', 600),
  ];
}

function scaleBar(
  { value, unit, units }: { value: number; unit: Unit; units: number },
  words: Wording,
): readonly Shape[] {
  const x = 322;
  const y = foot + 34;
  return [
    line(round(x - units), y, x, y, 'edge', 'bar'),
    line(round(x - units), y - 4, round(x - units), y + 4, 'edge'),
    line(x, y - 4, x, y + 4, 'edge'),
    text(x, y + 18, `${words.figure(value, decimalsOf(value, 3))} ${unit}`, {
      anchor: 'end',
      face: 'figures',
      ink: 'ink-2',
    }),
  ];
}

function answerLines({ least, most }: Fit, words: Wording): readonly Shape[] {
  const one = (y: number, word: string, quantity: Quantity): readonly Shape[] => [
    text(12, y, word, { ink: 'ink-2' }),
    text(70, y, clearance(quantity, words), { weight: 600 }),
  ];
  return [...one(foot + 38, 'tightest', least), ...one(foot + 58, 'loosest', most)];
}

function clearance({ value, unit }: Quantity, { figure }: Wording): string {
  const size = Math.abs(value);
  const printed = `${figure(size, decimalsOf(size, decimalsOfUnit(unit) + 1))} ${unit}`;
  return `${printed} ${value < 0 ? 'interference' : 'clearance'}`;
}

/** A size with the decimals that all four limits need. */
function sizeOf({ hole, shaft, from, unit }: Zones, size: number, { figure }: Wording): string {
  const value = (metres: number): number => fromSi(from + metres, unit).value;
  const largest = Math.max(hole.high, shaft.high, hole.low, shaft.low);
  const whole = value(largest).toFixed(0).length;
  // A figure has room for eight characters beside its zone.
  const most = Math.max(0, Math.min(decimalsOfUnit(unit) + 1, 7 - whole));
  const decimals = [hole.low, hole.high, shaft.low, shaft.high].map((one) => decimalsOf(value(one), most));
  return shortened(figure(value(size), Math.max(...decimals)), 8);
}

function rowsOf({ answer }: FitZonesInput, zones: Zones, words: Wording): readonly (readonly string[])[] {
  const size = (metres: number): string => `${sizeOf(zones, metres, words)} ${zones.unit}`;
  return [
    ['Hole', size(zones.hole.low), size(zones.hole.high)],
    ['Shaft', size(zones.shaft.low), size(zones.shaft.high)],
    [
      'Between them',
      clearance(answer.least, words),
      clearance(convert(answer.most, answer.least.unit), words),
    ],
  ];
}

function describe(input: FitZonesInput, zones: Zones, words: Wording): string {
  return rowsOf(input, zones, words)
    .map(([what = '', least = '', most = '']) => `${what}: ${least} to ${most}.`)
    .join(' ');
}
