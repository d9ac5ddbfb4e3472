import type { RoundReadings, RoundReadingsRequest } from '../contracts/measuring.js';
import { printNumber } from '../quantities/print.js';
import { circle, line, text, type Drawing, type Shape } from './shapes.js';
import { round } from './geometry.js';
import { crossSection } from './round-cross-section.js';
import { roundLayout, type RoundLayout } from './round-layout.js';
import { lengthSection, sectionPlace } from './round-section.js';
import { shortened, type DrawingOptions, wording } from './words.js';
import { decimalsOfUnit } from './unit-decimals.js';

const width = 340;
const keyTop = 206;
const keyStep = 20;

/**
 * Readings of a bore, a journal or a bearing: a section along it with the shape on two axes, and a section
 * across where it is worst. Differences are drawn outwards from the smallest reading, to the exaggeration that
 * the drawing states; between the readings the shape is only joined up.
 */
export function drawRoundReadings(
  request: RoundReadingsRequest,
  answer: RoundReadings,
  options?: DrawingOptions,
): Drawing {
  const layout = roundLayout(request, answer);
  const { figure } = wording(options);
  const print = (value: number): string => figure(value, decimalsOfUnit(layout.unit));
  const scale = scaleWords(layout);
  const name = { bore: 'Bore', journal: 'Journal', shell: 'Bearing' }[request.of];
  const worst = layout.valueAt(layout.worst.height, layout.worst.axis) ?? layout.base;
  return {
    title: `${name}, readings along it and across`,
    description:
      `${print(answer.least.value)} to ${print(answer.most.value)} ${layout.unit}. ` +
      `${print(worst)} ${layout.unit} at ${layout.worst.height}, ${layout.worst.axis}. ${scale}.`,
    width,
    height: keyTop + keyStep * layout.axes.length - 8,
    shapes: [
      text(12, 16, scale, { ink: 'ink-2' }),
      ...lengthSection(layout, request.of === 'journal'),
      ...crossSection(layout, request.of === 'journal'),
      ...worstMark(layout),
      ...layout.axes.flatMap((axis, i) => keyLine(axis, i, layout, print)),
    ],
    table: {
      columns: ['Height', ...layout.axes.map(({ letter, name: axis }) => `${letter}, ${axis}`)],
      rows: layout.heights.map((height) => [
        height,
        ...layout.axes.map(({ name: axis }) => {
          const value = layout.valueAt(height, axis);
          return value === undefined ? '–' : `${print(value)} ${layout.unit}`;
        }),
      ]),
    },
  };
}

function scaleWords({ times }: RoundLayout): string {
  if (times === null) return 'No differences to draw';
  return times < 1 ? 'Differences not to scale' : `Differences ×${printNumber(times, 0)}`;
}

/** A dot on the wall where the worst reading was taken. */
function worstMark(layout: RoundLayout): readonly Shape[] {
  const { height, axis, isWrong } = layout.worst;
  const value = layout.valueAt(height, axis);
  if (value === undefined || !layout.axes.slice(0, 2).some(({ name }) => name === axis)) return [];
  const { middle, yOf, half } = sectionPlace(layout);
  const x = round(middle + half + layout.bulge(value));
  return [circle(x, yOf(height), 3.6, { fill: isWrong ? 'oxide' : 'ink', part: 'worst' })];
}

/** Which letter is which axis, and what was read on it at the height that is drawn across. */
function keyLine(
  { letter, name }: RoundLayout['axes'][number],
  index: number,
  { valueAt, worst, unit }: RoundLayout,
  print: (value: number) => string,
): readonly Shape[] {
  const y = keyTop + keyStep * index;
  const value = valueAt(worst.height, name);
  const wall = (['outline', 'hidden'] as const)[index];
  const figure = value === undefined ? 'not read' : `${print(value)} ${unit}`;
  return [
    text(12, y, letter, { weight: 600, face: 'figures' }),
    ...(wall === undefined ? [] : [line(26, y - 4.5, 48, y - 4.5, wall)]),
    text(54, y, shortened(name, 12)),
    text(206, y, shortened(worst.height, 9), { anchor: 'end', ink: 'ink-2' }),
    text(328, y, figure, { anchor: 'end', face: 'figures' }),
  ];
}
