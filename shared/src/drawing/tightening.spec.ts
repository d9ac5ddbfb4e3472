import { describe, expect, it } from 'vitest';
import { tighteningPlan } from '../fastening/tightening-plan.js';
import { allShapes, partsOf, unreadable, wordsOf } from './drawing-case.js';
import { bearing, distance } from './geometry.js';
import { drawTightening, fastenerPositions, type FastenerState, type PartOutline } from './tightening.js';
import type { CircleShape, Drawing, PathShape, Point, PolygonShape } from './shapes.js';
import type { FastenerLayout } from '../contracts/calculations.js';

const head: FastenerLayout = { pattern: 'grid', rows: 2, columns: 5 };
const final = { value: 73, unit: 'N·m' } as const;

function states(sequence: readonly string[], done: number): Record<string, FastenerState> {
  const state = (i: number): FastenerState =>
    i < done ? 'done' : i === done ? 'in-hand' : i === done + 1 ? 'next' : 'to-come';
  return Object.fromEntries(sequence.map((name, i) => [name, state(i)]));
}

/** From the centre outwards, so that it crosses over fasteners on its way; an invented maker's order. */
const crossing = ['3', '8', '7', '2', '4', '9', '6', '1', '5', '10'];

function draw(
  fasteners: FastenerLayout,
  outline: PartOutline,
  done?: number,
  given?: readonly string[],
): Drawing {
  const plan = tighteningPlan({ fasteners, final, passes: [{ fraction: 1 }], sequence: given });
  return drawTightening({
    plan,
    positions: fastenerPositions(fasteners),
    outline,
    bores: 4,
    ...(done === undefined ? {} : { states: states(plan.sequence, done) }),
    labels: { front: 'left', top: 'plug side' },
  });
}

function fastener(drawing: Drawing, name: string): CircleShape {
  return partsOf(drawing, `fastener:${name}`)[0] as CircleShape;
}

describe('a head in two rows of five', () => {
  const sequence = crossing;
  const drawing = draw(head, 'head', 5, sequence);

  it('stands the fasteners where the layout has them, row by row', () => {
    const [first, second, below] = ['1', '2', '6'].map((name) => fastener(drawing, name).centre);
    expect(second?.y).toBe(first?.y);
    expect(second?.x).toBeGreaterThan(first?.x ?? 0);
    expect(below?.x).toBe(first?.x);
    expect(below?.y).toBeGreaterThan(first?.y ?? 0);
  });

  it('shows each fastener’s place in the order, and its state by its sign', () => {
    const signs = sequence.map((name) => {
      const { fill, pen } = fastener(drawing, name);
      return [fill, pen];
    });
    const done = ['blue', undefined];
    const toCome = ['paper', 'edge'];
    expect(signs).toEqual([
      ...[done, done, done, done, done],
      ['oxide-wash', 'oxide'],
      ['paper', 'blue'],
      ...[toCome, toCome, toCome],
    ]);
    const numbers = sequence.map((name) => {
      const { centre } = fastener(drawing, name);
      return allShapes(drawing).find(
        (shape) => shape.kind === 'text' && shape.at.x === centre.x && Math.abs(shape.at.y - centre.y) < 8,
      );
    });
    expect(numbers.map((shape) => shape?.kind === 'text' && shape.content)).toEqual(
      sequence.map((_, i) => String(i + 1)),
    );
  });

  it.each(sequence.slice(1).map((_, i) => i))(
    'points from place %i in hand to the next, past all others',
    (i) => {
      const here = draw(head, 'head', i, sequence);
      const d = (partsOf(here, 'next-arrow')[0] as PathShape).d;
      const points: Point[] = [...d.matchAll(/[ML](\S+?) ([\d.-]+)/g)].map((m) => ({
        x: Number(m[1]),
        y: Number(m[2]),
      }));
      const [start] = points;
      const [tip] = (partsOf(here, 'next-arrow-head')[0] as PolygonShape).points;
      const from = (name: string | undefined, p: Point | undefined): number =>
        p === undefined ? NaN : distance(p, fastener(here, name ?? '').centre);
      expect(from(sequence[i], start)).toBeLessThan(35);
      expect(from(sequence[i + 1], tip)).toBeLessThan(25);
      for (const name of sequence.filter((_, at) => at !== i && at !== i + 1)) {
        expect(Math.min(...points.map((p) => from(name, p)))).toBeGreaterThan(fastener(here, name).radius);
      }
    },
  );

  it('counts its bores by the columns of fasteners when it is not told', () => {
    const plain = drawTightening({
      plan: { sequence: ['1', '2', '3', '4', '5', '6', '7', '8', '9', '10'], basis: 'maker' },
      positions: fastenerPositions({ pattern: 'grid', rows: 2, columns: 5 }),
      outline: 'head',
    });
    expect(partsOf(plain, 'bore')).toHaveLength(4);
    expect(wordsOf(plain)).toContain('front');
  });

  it('has its bores dashed between the fasteners', () => {
    const bores = partsOf(drawing, 'bore') as readonly CircleShape[];
    expect(bores.map(({ pen }) => pen)).toEqual(['hidden', 'hidden', 'hidden', 'hidden']);
  });

  it('says the same in its table', () => {
    expect(drawing.table.columns).toEqual(['Order', 'Fastener', 'State']);
    expect(drawing.table.rows.map(([, name]) => name)).toEqual(sequence);
    expect(drawing.table.rows.map(([, , state]) => state)).toEqual([
      ...['done', 'done', 'done', 'done', 'done', 'in hand', 'next', 'to come', 'to come', 'to come'],
    ]);
    expect(wordsOf(drawing)).toEqual(
      expect.arrayContaining(['front', 'plug side', 'done', 'in hand', 'next', 'to come']),
    );
  });

  it('is plain, without a legend, when only the order is shown', () => {
    const plan = draw(head, 'head', undefined, sequence);
    expect(wordsOf(plan)).not.toContain('to come');
    expect(plan.table.columns).toEqual(['Order', 'Fastener']);
  });
});

describe('a circle', () => {
  const drawing = draw({ pattern: 'circle', count: 8 }, 'circle', 0);

  it('begins at the top and goes round clockwise', () => {
    const outline = partsOf(drawing, 'outline')[0] as CircleShape;
    const angles = ['1', '2', '3', '4', '5', '6', '7', '8'].map(
      (name) => Math.round(bearing(outline.centre, fastener(drawing, name).centre)) % 360,
    );
    expect(angles).toEqual([0, 45, 90, 135, 180, 225, 270, 315]);
  });

  it.each([2, 3, 4, 5, 7, 16])('of %i stands in the middle of its flange', (count) => {
    const flange = draw({ pattern: 'circle', count }, 'circle');
    const { centre, radius } = partsOf(flange, 'outline')[0] as CircleShape;
    const out = Array.from({ length: count }, (_, i) =>
      distance(centre, fastener(flange, `${i + 1}`).centre),
    );
    for (const each of out) expect(each).toBeCloseTo(out[0] ?? NaN, 1);
    expect(out[0]).toBeLessThan(radius - 14);
    expect(centre.y + radius).toBeLessThanOrEqual(flange.height);
  });
});

it.each([
  ['a six’s head', { pattern: 'grid', rows: 2, columns: 7 }, 'head'],
  ['three rows', { pattern: 'grid', rows: 3, columns: 5 }, 'head'],
  ['a sump', { pattern: 'grid', rows: 2, columns: 12 }, 'plain'],
  ['a line', { pattern: 'line', count: 6 }, 'plain'],
  ['a lone bolt', { pattern: 'line', count: 1 }, 'plain'],
  ['a flange', { pattern: 'circle', count: 16 }, 'circle'],
  ['bearing caps', { pattern: 'grid', rows: 5, columns: 2 }, 'plain'],
  ['a very long row', { pattern: 'line', count: 60 }, 'plain'],
] as const)('can be read on %s, at every turn of the order', (_, layout, outline) => {
  const { sequence } = tighteningPlan({ fasteners: layout, final, passes: [{ fraction: 1 }] });
  for (const done of sequence.keys()) {
    const drawing = draw(layout, outline, done);
    expect(unreadable(drawing)).toEqual([]);
    expect(drawing.height).toBeLessThan(460);
    const shown = [...(partsOf(drawing, 'next-arrow-head') as readonly PolygonShape[])].flatMap(
      ({ points }) => points,
    );
    expect(shown.every(({ x, y }) => x >= 0 && x <= drawing.width && y >= 0 && y <= drawing.height)).toBe(
      true,
    );
  }
});

it('shows names instead of places where that is asked for and they fit', () => {
  const plan = { sequence: ['B', 'A'], basis: 'maker' } as const;
  const positions = [
    { fastener: 'A', x: 0, y: 0 },
    { fastener: 'B', x: 1, y: 0 },
  ];
  const drawing = drawTightening({ plan, positions, outline: 'plain', numbers: 'name' });
  expect(wordsOf(drawing)).toEqual(['A', 'B']);
  expect(drawing.description).toContain('The maker’s order, by fastener: B, A.');
});
