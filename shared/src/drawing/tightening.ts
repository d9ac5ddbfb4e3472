import type { FastenerPosition, TighteningPlan } from '../contracts/calculations.js';
import { fastener, inHandScale, legend, tighteningLegend, type FastenerState } from './fasteners.js';
import { arrowHead } from './geometry.js';
import { nextArrow } from './next-arrow.js';
import { edgeMargin, flangeOutline, headOutline, plateOutline } from './part-outlines.js';
import { line, text, type Drawing, type Point, type Shape } from './shapes.js';
import {
  layOutFasteners,
  tighteningWidth,
  type PartOutline,
  type TighteningLayout,
} from './tightening-layout.js';
import { inWords, wording, type DrawingOptions } from './words.js';

export { tighteningLegend, type FastenerState } from './fasteners.js';
export { fastenerPositions } from './fastener-positions.js';
export type { PartOutline } from './tightening-layout.js';

export interface TighteningDrawingInput {
  readonly plan: Pick<TighteningPlan, 'sequence' | 'basis'>;
  /** Plain units, y downwards; `fastenerPositions` gives those of a pattern. */
  readonly positions: readonly FastenerPosition[];
  readonly outline: PartOutline;
  /** How many bores lie under a head; by default one between each two columns of its fasteners. */
  readonly bores?: number;
  /** What is not named is to come; without any, the drawing shows the order alone. */
  readonly states?: Readonly<Record<string, FastenerState>>;
  /** Numbers are places in the order, or the fasteners' own names. */
  readonly numbers?: 'order' | 'name';
  /** Which way the front lies, to the left on a head by default, and what the two sides are called. */
  readonly labels?: { readonly front?: 'left' | 'right'; readonly top?: string; readonly bottom?: string };
  /** What is being tightened. */
  readonly title?: string;
}

/** The tightening order on the part's outline, which is generic and drawn from where the fasteners stand. */
export function drawTightening(input: TighteningDrawingInput, options?: DrawingOptions): Drawing {
  const { states } = input;
  const labels =
    input.outline === 'head' ? { front: 'left' as const, ...input.labels } : (input.labels ?? {});
  const { say } = wording(options);
  const top = labels.front === undefined && labels.top === undefined ? 8 : 38;
  const layout = layOutFasteners(input.positions, input.outline, top);
  const bottom = bodyBottom(layout, input.outline);
  const arrow = states === undefined ? [] : arrowToNext(input, layout);
  const low = Math.max(bottom, ...reachOf(arrow).map((y) => y + 4)) + (labels.bottom === undefined ? 0 : 20);
  const height = Math.ceil(low + (states === undefined ? 6 : 34));
  return {
    title: say(input.title ?? 'Tightening order'),
    description: describe(input),
    width: tighteningWidth,
    height,
    shapes: [
      ...outlineOf(input, layout),
      ...fasteners(input, layout),
      ...arrow,
      ...sideLabels(labels, low),
      ...(states === undefined ? [] : legend(tighteningWidth, height - 14)),
    ],
    table: {
      columns: ['Order', 'Fastener', ...(states === undefined ? [] : ['State'])],
      rows: input.plan.sequence.map((name, i) => [
        String(i + 1),
        name,
        ...(states === undefined ? [] : [stateWord(stateOf(input, name))]),
      ]),
    },
  };
}

function bodyBottom({ box }: TighteningLayout, outline: PartOutline): number {
  return box.bottom + edgeMargin + (outline === 'head' ? 8 : 4);
}

/** One bore between each two columns, where the fasteners stand in columns of two or more. */
function boresUnder(positions: readonly FastenerPosition[]): number {
  const columns = new Set(positions.map(({ x }) => x)).size;
  return columns * 2 <= positions.length ? columns - 1 : 0;
}

function outlineOf(
  { outline, positions, bores = boresUnder(positions), labels }: TighteningDrawingInput,
  { box, places }: TighteningLayout,
): readonly Shape[] {
  switch (outline) {
    case 'head':
      return headOutline(box, bores, [...places.values()], labels?.front ?? 'left');
    case 'circle':
      return flangeOutline(box);
    case 'plain':
      return plateOutline(box);
  }
}

function stateOf({ states }: TighteningDrawingInput, name: string): FastenerState {
  return states?.[name] ?? 'to-come';
}

/** The number that stands on a fastener; names too long to stand there give way to the order. */
function shownAs({ numbers, plan }: TighteningDrawingInput, name: string): string {
  const byName = numbers === 'name' && plan.sequence.every((one) => one.length <= 3);
  return byName ? name : String(plan.sequence.indexOf(name) + 1);
}

function stateWord(state: FastenerState): string {
  return tighteningLegend.find((entry) => entry.state === state)?.label ?? state;
}

function fasteners(input: TighteningDrawingInput, { places, radius }: TighteningLayout): readonly Shape[] {
  const inOrder = [...places].map(([name, at]) => ({ name, at, state: stateOf(input, name) }));
  // The one in hand is the largest and comes last, so that nothing lies over it.
  const drawn = [
    ...inOrder.filter(({ state }) => state !== 'in-hand'),
    ...inOrder.filter(({ state }) => state === 'in-hand'),
  ];
  return drawn.flatMap(({ name, at, state }) => {
    return fastener(at, radius, state, shownAs(input, name), `fastener:${name}`);
  });
}

function arrowToNext(
  input: TighteningDrawingInput,
  { box, places, radius }: TighteningLayout,
): readonly Shape[] {
  const find = (wanted: FastenerState): (Point & { readonly name: string }) | undefined =>
    [...places].map(([name, at]) => ({ name, ...at })).find(({ name }) => stateOf(input, name) === wanted);
  const from = find('in-hand');
  const to = find('next');
  if (from === undefined || to === undefined) {
    return [];
  }
  const others = [...places].filter(([name]) => name !== from.name && name !== to.name).map(([, at]) => at);
  return nextArrow(
    { ...from, radius: radius * inHandScale + 7 },
    { ...to, radius: radius + 5 },
    others,
    radius,
    { x: (box.left + box.right) / 2, y: (box.top + box.bottom) / 2 },
  );
}

function reachOf(shapes: readonly Shape[]): readonly number[] {
  return shapes.flatMap((shape) => {
    if (shape.kind === 'polygon') {
      return shape.points.map(({ y }) => y);
    }
    return shape.kind === 'path'
      ? [...shape.d.matchAll(/ (-?[\d.]+)/g)].map((match) => Number(match[1]))
      : [];
  });
}

function sideLabels(
  { front, top, bottom }: NonNullable<TighteningDrawingInput['labels']>,
  low: number,
): readonly Shape[] {
  const right = tighteningWidth - 18;
  const word = (content: string, y: number): Shape =>
    text(right, y, content, { anchor: 'end', ink: 'ink-2' });
  const shapes: Shape[] = [];
  if (front === 'left') {
    shapes.push(
      line(38, 18, 20, 18, 'dimension'),
      arrowHead({ x: 14, y: 18 }, 270, 'line'),
      text(42, 22, 'front'),
    );
  }
  if (front === 'right') {
    const end = { x: right, y: 18 };
    shapes.push(line(right - 24, 18, right - 6, 18, 'dimension'), arrowHead(end, 90, 'line'));
    shapes.push(text(right - 28, 22, 'front', { anchor: 'end' }));
  }
  if (top !== undefined) {
    shapes.push(front === 'right' ? text(18, 22, top, { ink: 'ink-2' }) : word(top, 22));
  }
  return bottom === undefined ? shapes : [...shapes, word(bottom, low - 4)];
}

function describe(input: TighteningDrawingInput): string {
  const { plan, positions, states } = input;
  const named = (wanted: FastenerState): readonly string[] =>
    plan.sequence.filter((name) => stateOf(input, name) === wanted).map((name) => shownAs(input, name));
  const basis = plan.basis === 'maker' ? 'The maker’s order' : 'General practice, not the maker’s order';
  const progress = tighteningLegend
    .map(({ state, label }) => ({ label, names: named(state) }))
    .filter(({ names }) => names.length > 0)
    .map(({ label, names }) => `${label} ${inWords(names)}`);
  return [
    `${positions.length} fasteners. ${basis}, by fastener: ${plan.sequence.join(', ')}.`,
    ...(states === undefined ? [] : [`Now, by the numbers shown: ${progress.join('; ')}.`]),
  ].join(' ');
}
