import type {
  CapDiagnosis,
  CapDiagnosisRequest,
  CylinderSpark,
  ValveTiming,
} from '../contracts/calculations.js';
import { arrowHead, corners, fold, hatching, round, track } from './geometry.js';
import { centredText, circle, line, path, rect, text, type Drawing, type Shape } from './shapes.js';
import { decimalsOf, inWords, shortened, wording, type DrawingOptions, type Wording } from './words.js';

export interface SparkStripInput {
  readonly request: Pick<CapDiagnosisRequest, 'valveTiming' | 'advance'>;
  readonly diagnosis: Pick<CapDiagnosis, 'cylinders'>;
}

const width = 340;
const left = 8;
const right = 332;
/** The diagnosis' own default, crank degrees. */
const usualAdvance = 10;
const widestPitch = 27;
const perRow = 4;

/** Sparks that fall at one place of their cylinders' cycles, `x` on the strip, their badges about `middle`. */
interface SparkGroup {
  readonly sparks: readonly CylinderSpark[];
  readonly x: number;
  readonly middle: number;
}

/**
 * Where each spark falls in its own cylinder's cycle: one four-stroke cycle from left to right, compression
 * TDC in the middle, with the time for which each valve is open. Sparks out of place are red oxide.
 */
export function drawSparkStrip(input: SparkStripInput, options?: DrawingOptions): Drawing {
  const words = wording(options);
  const { advance = usualAdvance, valveTiming } = input.request;
  const together = sparksTogether(input.diagnosis.cylinders, advance);
  const columns = together.reduce((sum, { sparks }) => sum + columnsOf(sparks), 0);
  const pitch = Math.min(widestPitch, (width - 4) / Math.max(1, columns));
  const groups = spread(together, pitch);
  const rows = Math.max(1, ...groups.map(({ sparks }) => Math.ceil(sparks.length / perRow)));
  const bars = Math.round(4 + rows * pitch + 30);
  const axis = bars + 20;
  return {
    title: 'Where each spark falls',
    description: describe(input.diagnosis.cylinders, advance, valveTiming !== undefined, words),
    width,
    height: axis + 40,
    shapes: [
      ...(valveTiming === undefined ? [] : valveBars(valveTiming, bars, words)),
      line(left, axis, right, axis, 'outline'),
      ...cycleMarks(axis, words),
      ...groups.flatMap((group) => sparkShapes(group, { pitch, lowest: 4 + (rows - 0.5) * pitch, axis })),
    ],
    table: {
      columns: ['Cylinder', 'Spark', words.say('Stroke'), 'Valves then'],
      rows: input.diagnosis.cylinders.map((spark) => [
        String(spark.cylinder),
        lateInWords(spark, words),
        words.say(strokeWord(spark)),
        words.say(valvesInWords(spark)),
      ]),
    },
  };
}

function xOf(phase: number): number {
  return round(left + ((phase + 360) * (right - left)) / 720);
}

function columnsOf(sparks: readonly CylinderSpark[]): number {
  return Math.min(sparks.length, perRow);
}

/** Gathers the sparks by the place at which they fall, from left to right. */
function sparksTogether(
  cylinders: readonly CylinderSpark[],
  advance: number,
): readonly Omit<SparkGroup, 'middle'>[] {
  const places = new Map<number, CylinderSpark[]>();
  for (const spark of cylinders) {
    // Degrees from compression TDC, −360 up to 360.
    const x = xOf(fold(spark.late - advance + 360, 720) - 360);
    places.set(x, [...(places.get(x) ?? []), spark]);
  }
  return [...places].sort(([a], [b]) => a - b).map(([x, sparks]) => ({ x, sparks }));
}

/** Stands the groups side by side, each as near its place as its neighbours let it. */
function spread(groups: readonly Omit<SparkGroup, 'middle'>[], pitch: number): readonly SparkGroup[] {
  const halves = groups.map(({ sparks }) => (columnsOf(sparks) * pitch) / 2);
  const middles = groups.map(({ x }) => x);
  const edgeBefore = (i: number): number => (i === 0 ? 2 : (middles[i - 1] ?? 0) + (halves[i - 1] ?? 0));
  const edgeAfter = (i: number): number =>
    i === groups.length - 1 ? width - 2 : (middles[i + 1] ?? width) - (halves[i + 1] ?? 0);
  for (const [i, half] of halves.entries()) {
    middles[i] = Math.max(middles[i] ?? 0, edgeBefore(i) + half);
  }
  for (const [i, half] of [...halves.entries()].reverse()) {
    middles[i] = Math.min(middles[i] ?? 0, edgeAfter(i) - half);
  }
  return groups.map((group, i) => ({ ...group, middle: round(middles[i] ?? group.x) }));
}

interface Frame {
  readonly pitch: number;
  /** The middle of the lowest row of badges. */
  readonly lowest: number;
  readonly axis: number;
}

function sparkShapes({ x, sparks, middle }: SparkGroup, { pitch, lowest, axis }: Frame): readonly Shape[] {
  const wrong = sparks.some(({ late }) => late !== 0);
  const radius = round(pitch / 2 - 1);
  const foot = lowest + radius + 1;
  const leader = [
    { x: middle, y: foot },
    { x, y: foot + 12 },
    { x, y: axis - 4 },
  ];
  const badges = sparks.flatMap((spark, i): readonly Shape[] => {
    const row = Math.floor(i / perRow);
    const inRow = Math.min(perRow, sparks.length - row * perRow);
    const at = {
      x: round(middle + ((i % perRow) - (inRow - 1) / 2) * pitch),
      y: round(lowest - row * pitch),
    };
    const part = `cylinder:${spark.cylinder}`;
    const name = shortened(String(spark.cylinder), 3);
    return [
      circle(at.x, at.y, radius, wrong ? { fill: 'oxide', part } : { pen: 'edge', fill: 'paper', part }),
      centredText(at.x, at.y, name, { face: 'figures', weight: 600, ink: wrong ? 'on-oxide' : 'ink' }),
    ];
  });
  return [
    path(track(leader), { pen: wrong ? 'oxide' : 'blue', part: `spark:${sparks[0]?.cylinder ?? ''}` }),
    arrowHead({ x, y: axis - 1 }, 180, wrong ? 'oxide' : 'blue', 10, 3.4),
    ...badges,
  ];
}

function valveBars({ ivo, ivc, evo, evc }: ValveTiming, y: number, { say }: Wording): readonly Shape[] {
  const inlet = wrapped(-360 - ivo, -180 + ivc).map(([from, to]): Shape =>
    rect(from, y, round(to - from), 16, { pen: 'blue', fill: 'blue-wash', part: 'inlet-open' }),
  );
  const exhaust = wrapped(180 - evo, 360 + evc).flatMap(([from, to]): readonly Shape[] => [
    rect(from, y, round(to - from), 16, { fill: 'paper' }),
    hatching(corners(from, y, to - from, 16), 45, 4.5),
    rect(from, y, round(to - from), 16, { pen: 'edge', part: 'exhaust-open' }),
  ]);
  const word = { anchor: 'middle', halo: true } as const;
  return [
    ...inlet,
    ...exhaust,
    text(xOf(-280), y + 12.5, say('{inlet} open'), word),
    text(xOf(265), y + 12.5, 'exhaust open', word),
  ];
}

/** A stretch of the cycle as one or two pieces of the strip, in drawing units. */
function wrapped(from: number, to: number): readonly (readonly [number, number])[] {
  if (to <= from) {
    return [];
  }
  return [-720, 0, 720]
    .map((turn) => [Math.max(-360, from + turn), Math.min(360, to + turn)] as const)
    .filter(([a, b]) => b > a)
    .map(([a, b]) => [xOf(a), xOf(b)] as const);
}

function cycleMarks(axis: number, { say }: Wording): readonly Shape[] {
  const strokes = ['{inlet}', 'compression', 'power', 'exhaust'];
  const anchors = ['start', 'middle', 'middle', 'middle', 'end'] as const;
  return [
    ...anchors.map((_, i) => line(xOf(-360 + 180 * i), axis - 40, xOf(-360 + 180 * i), axis + 6, 'edge')),
    ...anchors.map((anchor, i) =>
      text(
        anchor === 'start' ? 2 : anchor === 'end' ? width - 2 : xOf(-360 + 180 * i),
        axis + 35,
        i % 2 === 0 ? 'TDC' : 'BDC',
        {
          anchor,
          face: 'plate',
          weight: i === 2 ? 600 : 400,
          ink: i === 2 ? 'ink' : 'ink-2',
        },
      ),
    ),
    ...strokes.map((stroke, i) =>
      text(xOf(-270 + 180 * i), axis + 19, say(stroke), { anchor: 'middle', ink: 'ink-2' }),
    ),
  ];
}

function lateInWords({ late }: CylinderSpark, { figure }: Wording): string {
  const angle = `${figure(Math.abs(late), decimalsOf(late, 1))}°`;
  return late === 0 ? 'in place' : `${angle} ${late > 0 ? 'late' : 'early'}`;
}

function strokeWord({ stroke }: CylinderSpark): string {
  return stroke === 'inlet' ? '{inlet}' : stroke;
}

function valvesInWords({ inletOpen, exhaustOpen }: CylinderSpark): string {
  if (inletOpen === null || exhaustOpen === null) {
    return 'not known';
  }
  if (inletOpen && exhaustOpen) {
    return 'both open';
  }
  return inletOpen ? '{inlet} open' : exhaustOpen ? 'exhaust open' : 'both shut';
}

function describe(
  cylinders: readonly CylinderSpark[],
  advance: number,
  withValves: boolean,
  words: Wording,
): string {
  const right = cylinders.filter(({ late }) => late === 0);
  const wrong = cylinders.filter(({ late }) => late !== 0);
  const names = right.map(({ cylinder }) => String(cylinder));
  const sentences = [
    'One cycle: {inlet}, compression, power, exhaust.',
    right.length === 0
      ? ''
      : `In place, ${words.figure(advance, decimalsOf(advance, 1))}° before compression TDC: ${inWords(names)}.`,
    ...wrong.map((spark) => {
      const valves = withValves ? `, ${valvesInWords(spark)}` : '';
      return `Cylinder ${spark.cylinder}: ${lateInWords(spark, words)}, on ${strokeWord(spark)}${valves}.`;
    }),
  ];
  return words.say(sentences.filter((sentence) => sentence !== '').join(' '));
}
