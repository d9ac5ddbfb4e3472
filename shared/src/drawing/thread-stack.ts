import type { Quantity } from '../contracts/quantity.js';
import { convert } from '../quantities/convert.js';
import { arrowHead, round } from './geometry.js';
import { line, text, type Drawing, type Shape } from './shapes.js';
import { layOutStack, seat, type StackDrawingInput, type StackLayout } from './thread-stack-layout.js';
import {
  axis,
  boltShapes,
  breakShapes,
  halfJoint,
  holeShapes,
  jointShapes,
  nutShapes,
} from './thread-stack-parts.js';
import { wording, type DrawingOptions, type Wording } from './words.js';

export type { StackDrawingInput } from './thread-stack-layout.js';

const width = 340;
const dimensionAt = 228;
const labelAt = 240;
const lineHeight = 17;

/** A length of the stack: from where to where it is dimensioned, and what it is called. */
interface Span {
  readonly from: number;
  readonly to: number;
  readonly word: string;
  readonly length: Quantity;
  readonly isWrong?: boolean;
}

/**
 * A bolt through what it clamps, into a nut or a tapped hole, cut along its axis. Lengths and diameter go by one
 * scale; a long joint is broken, and what still does not fit is said to be out of scale.
 */
export function drawThreadStack(input: StackDrawingInput, options?: DrawingOptions): Drawing {
  const words = wording(options);
  const layout = layOutStack(input);
  const spans = [...spansOf(input, layout)].sort((a, b) => a.from + a.to - b.from - b.to);
  const note = scaleNote(layout);
  const bottom = Math.max(layout.bottom + (layout.holeEnd === undefined ? 6 : 32), layout.boltEnd + 6);
  const labels = spreadLabels(spans);
  const height = Math.ceil(Math.max(bottom + 12, ...labels.map((y) => y + lineHeight + 6)));
  return {
    title: input.answer.nutHeight === undefined ? 'Bolt in its tapped hole' : 'Bolt through to its nut',
    description: describe(spans, note, words),
    width,
    height,
    shapes: [
      ...bodies(input, layout),
      line(axis, 24, axis, round(bottom + 4), 'centre'),
      ...boltDimension(input.request.boltLength, layout, words),
      ...spans.flatMap((span, i) => dimension(span, labels[i] ?? 0, words)),
      text(10, 18, input.request.thread, { face: 'figures', weight: 600 }),
      text(width - 10, 18, note, { ink: 'ink-2', anchor: 'end' }),
    ],
    table: {
      columns: ['What', 'Figure'],
      rows: [
        ['bolt, under its head', print(input.request.boltLength, words)],
        ...spans.map((span) => [span.word, print(span.length, words)]),
        ['bolt needed at least', print(input.answer.lengthNeeded, words)],
        ['Drawn', note],
      ],
    },
  };
}

function bodies({ answer }: StackDrawingInput, layout: StackLayout): readonly Shape[] {
  const { nutBottom, threadEnd, boltEnd } = layout;
  const jams = threadEnd !== undefined && layout.holeEnd !== undefined && boltEnd > threadEnd;
  const bolt = boltShapes(layout, answer.verdict === 'fail' && (jams || boltEnd <= layout.face));
  const joint = jointShapes(layout);
  const across = layout.isShortened ? breakShapes(layout) : [];
  return nutBottom === undefined
    ? [...joint, ...holeShapes(layout, threadEnd ?? layout.face), ...bolt, ...across]
    : [...joint, ...bolt, ...nutShapes(layout, nutBottom), ...across];
}

function spansOf({ request, answer }: StackDrawingInput, layout: StackLayout): readonly Span[] {
  const { gripTop, face, boltEnd, nutBottom, threadEnd } = layout;
  const washers: readonly Span[] =
    request.washers === undefined || gripTop === seat
      ? []
      : [{ from: seat, to: gripTop, word: 'washers', length: request.washers }];
  const grip: Span = { from: gripTop, to: face, word: 'grip', length: request.grip };
  if (nutBottom !== undefined && answer.nutHeight !== undefined && answer.protrusion !== undefined) {
    const nut: Span = { from: face, to: nutBottom, word: 'nut', length: answer.nutHeight };
    const shown = boltEndSpan(answer.nutHeight, answer.protrusion.length, layout, nutBottom);
    return [...washers, grip, nut, { ...shown, isWrong: answer.verdict === 'fail' }];
  }
  const end = Math.max(face, Math.min(boltEnd, threadEnd ?? boltEnd));
  const engaged: Span = { from: face, to: end, word: 'engaged', length: answer.engagement };
  if (answer.spare === undefined || threadEnd === undefined) return [...washers, grip, engaged];
  const tooLong = answer.spare.value < 0;
  const spare: Span = {
    from: tooLong ? threadEnd : Math.max(face, boltEnd),
    to: tooLong ? boltEnd : threadEnd,
    word: tooLong ? 'too long' : 'to spare',
    length: { ...answer.spare, value: Math.abs(answer.spare.value) },
    isWrong: tooLong,
  };
  return [...washers, grip, engaged, spare];
}

/** From the end of the bolt to the nut's far face, or to its near one where the bolt does not reach it. */
function boltEndSpan(nut: Quantity, past: Quantity, { face, boltEnd }: StackLayout, nutBottom: number): Span {
  const reach = { ...past, value: past.value + nut.value };
  if (past.value >= 0) return { from: nutBottom, to: boltEnd, word: 'past the nut', length: past };
  return reach.value > 0
    ? { from: boltEnd, to: nutBottom, word: 'inside the nut', length: { ...past, value: -past.value } }
    : { from: boltEnd, to: face, word: 'short of it', length: { ...reach, value: -reach.value } };
}

/** Baselines of the labels' first lines, beside their spans as far as two lines each let them. */
function spreadLabels(spans: readonly Span[]): readonly number[] {
  const found: number[] = [];
  for (const { from, to } of spans) {
    const wanted = (from + to) / 2 - 2;
    found.push(round(Math.max(wanted, (found.at(-1) ?? 0) + 2 * lineHeight, 40)));
  }
  return found;
}

function dimension({ from, to, word, length, isWrong = false }: Span, y: number, words: Wording): Shape[] {
  const [pen, ink] = isWrong ? (['oxide-thin', 'oxide'] as const) : (['dimension', 'ink'] as const);
  const fill = isWrong ? 'oxide' : 'line';
  const isSmall = to - from < 22;
  const x = dimensionAt;
  const middle = (from + to) / 2;
  const [number, unit] = figureOf(length, words);
  return [
    line(axis + halfJoint + 4, from, x + 4, from, 'dimension'),
    line(axis + halfJoint + 4, to, x + 4, to, 'dimension'),
    line(x, isSmall ? from - 12 : from, x, isSmall ? to + 12 : to, pen),
    arrowHead({ x, y: from }, isSmall ? 180 : 0, fill),
    arrowHead({ x, y: to }, isSmall ? 0 : 180, fill),
    line(x, round(middle), labelAt - 3, y - 4, 'dimension'),
    text(labelAt, y, number, { face: 'figures', weight: 600, ink, halo: true }),
    text(labelAt + number.length * 7.8 + 4, y, unit, { ink: isWrong ? 'oxide' : 'ink-2', halo: true }),
    text(labelAt, y + 14, word, { ink: isWrong ? 'oxide' : 'ink-2', halo: true }),
  ];
}

function boltDimension(length: Quantity, { boltEnd }: StackLayout, words: Wording): readonly Shape[] {
  const x = axis - halfJoint - 18;
  const [number, unit] = figureOf(length, words);
  const y = round((seat + boltEnd) / 2);
  return [
    line(axis - 41, seat, x - 4, seat, 'dimension'),
    line(axis - 24, boltEnd, x - 4, boltEnd, 'dimension'),
    line(x, seat, x, boltEnd, 'dimension'),
    arrowHead({ x, y: seat }, 0, 'line'),
    arrowHead({ x, y: boltEnd }, 180, 'line'),
    text(x - 6, y, number, { face: 'figures', weight: 600, anchor: 'end', halo: true }),
    text(x - 6, y + 14, unit, { ink: 'ink-2', anchor: 'end', halo: true }),
  ];
}

/** In mm or inches, with no more digits than there is room for. */
function figureOf(length: Quantity, { figure }: Wording): readonly [string, string] {
  const isInch = ['in', 'thou', 'ft'].includes(length.unit);
  const { value, unit } = convert(length, isInch ? 'in' : 'mm');
  const whole = Math.trunc(Math.abs(value)).toString().length;
  return [figure(value, Math.max(0, Math.min(isInch ? 3 : 1, 4 - whole))), unit];
}

const print = (length: Quantity, words: Wording): string => figureOf(length, words).join(' ');

function scaleNote({ isShortened, isToScale }: StackLayout): string {
  if (!isToScale) return 'Not to scale';
  return isShortened ? 'To scale, grip shortened' : 'To scale';
}

function describe(spans: readonly Span[], note: string, words: Wording): string {
  const list = spans.map(({ word, length }) => `${word} ${print(length, words)}`).join(', ');
  return `Cut along the bolt, from its head down: ${list}. ${note}.`;
}
