import { arrowHead, corners, hatching, polar, round } from './geometry.js';
import { circle, line, path, rect, text, type Drawing, type Shape } from './shapes.js';
import { decimalsOf, wording, type DrawingOptions, type Wording } from './words.js';

export interface EndFloatInput {
  readonly low?: number;
  readonly high?: number;
  readonly unit: 'mm' | 'µm' | 'in' | 'thou';
  /** Drawn instead of the middle of the limits, where the reading may be seen. */
  readonly reading?: number;
}

/** Exact: 1 in = 25.4 mm, 1 thou = 0.001 in. */
const millimetres = { mm: 1, µm: 0.001, in: 25.4, thou: 0.0254 } as const;
/** Drawing units to a millimetre for everything but the gap. */
const unitsPerMillimetre = 5;
/** What stands for the gap where nothing is known of it, mm. */
const usualGap = 0.2;
const exaggerations = [1, 2, 4, 8, 16, 32, 64];
const width = 340;
/** The face of the front thrust washer; the gap lies to its right. */
const face = 216;
const axis = 176;

/**
 * Crankshaft end float at the centre main bearing, half section, the crank levered forward. The gap is drawn
 * to the exaggeration that the drawing states.
 */
export function drawEndFloat(input: EndFloatInput, options?: DrawingOptions): Drawing {
  const words = wording(options);
  const gap = gapOf(input);
  const figure = figureOf(input, words);
  const scale = gap.times === undefined ? 'Not to scale' : `Gap ×${gap.times}`;
  const limits = figure === '' ? '' : ` ${figure} ${input.unit}.`;
  return {
    title: words.say('Crankshaft {end float} at the centre main bearing'),
    description: words.say(
      'Half section. The crank is levered forward, with a dial gauge on its nose: the gap at the front ' +
        `thrust washer is the {end float}.${limits} ${scale}.`,
    ),
    width,
    height: 200,
    shapes: [
      ...crank(face + gap.units),
      ...bearing(),
      ...gapShapes(face + gap.units),
      ...dimension(face + gap.units, figure, input.unit, words),
      ...gauge(gap.units),
      text(12, 18, scale, { ink: 'ink-2' }),
    ],
    table: {
      columns: ['What', 'Figure'],
      rows: [
        ...(figure === '' ? [] : [[words.say('{End float}'), `${figure} ${input.unit}`]]),
        ['Drawn', scale],
      ],
    },
  };
}

interface Gap {
  readonly units: number;
  /** How many times too wide it is drawn; undefined where it does not fit at any. */
  readonly times: number | undefined;
}

const widestGap = 30;

/** The gap in drawing units, with the least exaggeration that lets it be seen. */
function gapOf({ low, high, unit, reading }: EndFloatInput): Gap {
  const known = [low, high].filter((limit) => limit !== undefined);
  const sum = known.reduce((total, limit) => total + limit, 0);
  const middle = known.length === 0 ? usualGap / millimetres[unit] : sum / known.length;
  const plain = Math.max(0, (reading ?? middle) * millimetres[unit]) * unitsPerMillimetre;
  const times = exaggerations.find((factor) => plain * factor >= 9) ?? 64;
  const units = round(plain * times);
  return units <= widestGap ? { units, times } : { units: widestGap, times: undefined };
}

function figureOf({ low, high, reading }: EndFloatInput, { figure }: Wording): string {
  const known = [low, high, reading].filter((value) => value !== undefined);
  const decimals = Math.max(0, ...known.map((value) => decimalsOf(value, 4)));
  if (reading !== undefined) {
    return figure(reading, decimals);
  }
  if (low !== undefined && high !== undefined) {
    return `${figure(low, decimals)} to ${figure(high, decimals)}`;
  }
  if (high !== undefined) {
    return `at most ${figure(high, decimals)}`;
  }
  return low === undefined ? '' : `at least ${figure(low, decimals)}`;
}

/** The crank's web, journal and nose; `cheek` is the cheek that faces the front washer. */
function crank(cheek: number): readonly Shape[] {
  const outline =
    `M58 ${axis}L58 34Q58 26 66 26L106 26Q114 26 114 34L114 98L${cheek} 98L${cheek} 34` +
    `Q${cheek} 26 ${cheek + 8} 26L${cheek + 32} 26Q${cheek + 40} 26 ${cheek + 40} 34L${cheek + 40} 122` +
    `L${cheek + 60} 122L${cheek + 64} 126L${cheek + 64} ${axis}`;
  return [
    path(outline, { pen: 'outline', fill: 'paper' }),
    path(
      `M114 98Q107 98 107 106L107 ${axis}M${cheek} 98Q${cheek + 7} 98 ${cheek + 7} 106L${cheek + 7} ${axis}`,
      {
        pen: 'thin',
      },
    ),
    line(cheek + 60, 122, cheek + 60, axis, 'thin'),
    line(40, axis, 336, axis, 'centre'),
    text(165, 132, 'centre main journal', { anchor: 'middle', ink: 'ink-2' }),
    text(58, 193, 'flywheel end', { ink: 'ink-2' }),
  ];
}

/** The bearing's housing with its shell, and the two thrust washers. */
function bearing(): readonly Shape[] {
  const broken = [
    { x: 126, y: 36 },
    { x: 138, y: 33 },
    { x: 152, y: 38 },
    { x: 166, y: 36 },
    { x: 180, y: 33 },
    { x: 192, y: 34 },
    { x: 204, y: 36 },
  ];
  const edge = 'M126 36C138 30 152 42 166 36C180 30 192 30 204 36';
  const washer = (x: number): readonly Shape[] => [
    rect(x, 46, 12, 44, { fill: 'paper' }),
    hatching(corners(x, 46, 12, 44), 135, 3.2),
    rect(x, 46, 12, 44, { pen: 'outline' }),
  ];
  return [
    path(`${edge}L204 90L126 90Z`, { fill: 'paper' }),
    hatching([...broken, { x: 204, y: 90 }, { x: 126, y: 90 }], 45, 6.5),
    path('M126 36L126 90L204 90L204 36', { pen: 'outline' }),
    path(edge, { pen: 'thin' }),
    rect(126, 90, 78, 6, { pen: 'edge', fill: 'line' }),
    ...washer(114),
    ...washer(204),
    line(122, 74, 84, 66, 'dimension'),
    circle(122, 74, 1.6, { fill: 'line' }),
    text(80, 70, 'thrust', { anchor: 'end', halo: true }),
    text(80, 84, 'washer', { anchor: 'end', halo: true }),
  ];
}

function gapShapes(cheek: number): readonly Shape[] {
  return [
    rect(face, 46, round(cheek - face), 44, { fill: 'oxide-wash', part: 'gap' }),
    line(face, 46, face, 90, 'oxide'),
    line(cheek, 46, cheek, 90, 'oxide'),
  ];
}

function dimension(cheek: number, figure: string, unit: string, { say }: Wording): readonly Shape[] {
  const label =
    figure === ''
      ? [text(194, 18, say('{end float}'), { anchor: 'end', halo: true })]
      : [
          text(170, 18, figure, { anchor: 'end', face: 'figures', weight: 600, halo: true }),
          text(174, 18, unit, { ink: 'ink-2', halo: true }),
        ];
  return [
    line(face, 44, face, 10, 'dimension'),
    line(cheek, 26, cheek, 10, 'dimension'),
    line(face - 14, 14, cheek + 14, 14, 'dimension'),
    arrowHead({ x: face, y: 14 }, 90, 'line'),
    arrowHead({ x: cheek, y: 14 }, 270, 'line'),
    ...label,
  ];
}

/** The dial gauge on the nose, and the way the crank was levered. */
function gauge(gap: number): readonly Shape[] {
  const nose = face + gap + 64;
  const dial = { x: nose + 26, y: 155 };
  const ticks = Array.from({ length: 12 }, (_, i) => {
    const [from, to] = [polar(dial, 12, i * 30), polar(dial, 14, i * 30)];
    return line(from.x, from.y, to.x, to.y, 'thin');
  });
  const needle = polar(dial, 11, 38);
  return [
    rect(nose, 153.5, 10, 3, { pen: 'edge', fill: 'paper' }),
    rect(nose + 6, 151, 8, 8, { pen: 'edge', fill: 'paper' }),
    circle(dial.x, dial.y, 15, { pen: 'outline', fill: 'paper' }),
    ...ticks,
    line(dial.x, dial.y, needle.x, needle.y, 'oxide'),
    circle(dial.x, dial.y, 1.6, { fill: 'line' }),
    line(nose - 42, 160, nose - 16, 160, 'blue'),
    arrowHead({ x: nose - 8, y: 160 }, 90, 'blue', 10, 3),
    text(nose - 46, 164, 'levered', { anchor: 'end', ink: 'blue', halo: true }),
    text(336, 193, 'dial gauge', { anchor: 'end' }),
  ];
}
