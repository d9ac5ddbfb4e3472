import { describe, expect, it } from 'vitest';
import type { Cylinder } from '../contracts/calculations.js';
import { valveClock } from '../valve-train/valve-clock.js';
import { partsOf, unreadable, wordsOf } from './drawing-case.js';
import { bearing, distance } from './geometry.js';
import { drawValveClock } from './valve-clock.js';
import type { CircleShape, Drawing, LineShape, PathShape, Point } from './shapes.js';

const valveTiming = { ivo: 16, ivc: 56, evo: 51, evc: 21 };
const middle = { x: 170, y: 163 };

function clock(firingOrder: readonly Cylinder[], crank: number, timing = valveTiming): Drawing {
  const request = { firingOrder, valveTiming: timing, crank };
  return drawValveClock({ request, clock: valveClock(request) });
}

/** Crank degrees at which something stands: once round is two turns of the crank. */
function crankAt(point: Point): number {
  return Math.round(2 * bearing(middle, point)) % 720;
}

function firstAndLast(shape: PathShape): readonly [Point, Point] {
  const points = [...shape.d.matchAll(/[ML](\S+?) ([\d.-]+)/g)].map((m) => ({
    x: Number(m[1]),
    y: Number(m[2]),
  }));
  const outer = points.slice(0, points.length / 2);
  return [outer[0] ?? middle, outer.at(-1) ?? middle];
}

describe.each([
  // Firing angles: the cycle shared evenly, from the first cylinder of the order.
  ['four', [1, 3, 4, 2], [0, 180, 360, 540]],
  ['six', [1, 5, 3, 6, 2, 4], [0, 120, 240, 360, 480, 600]],
  ['eight', [1, 8, 4, 3, 6, 5, 7, 2], [0, 90, 180, 270, 360, 450, 540, 630]],
])('the clock of a %s', (_, order, firings) => {
  const drawing = clock(order, 344);
  const numbers = order.map(
    (cylinder) => (partsOf(drawing, `cylinder:${cylinder}`)[0] as CircleShape).centre,
  );

  it('has each number at its compression TDC, the first of the order outermost', () => {
    expect(numbers.map(crankAt)).toEqual(firings);
    const radii = numbers.map((at) => distance(middle, at));
    expect(radii).toEqual([...radii].sort((a, b) => b - a));
  });

  it('has the hand at the crank’s angle', () => {
    expect(crankAt((partsOf(drawing, 'hand')[0] as LineShape).to)).toBe(344);
  });

  it('opens every valve where the timing says', () => {
    // Cylinder phase: exhaust from 180 − evo to 360 + evc, inlet from 360 − ivo to 540 + ivc.
    const fold = (angle: number): number => angle % 720;
    const events = (part: string): readonly (readonly number[])[] =>
      (partsOf(drawing, part) as readonly PathShape[]).map((shape) => firstAndLast(shape).map(crankAt));
    expect(events('exhaust-open')).toEqual(firings.map((at) => [fold(at + 129), fold(at + 381)]));
    expect(events('inlet-open')).toEqual(firings.map((at) => [fold(at + 344), fold(at + 596)]));
  });

  it('can be read, and its table has every cylinder', () => {
    expect(unreadable(drawing)).toEqual([]);
    expect(drawing.table.rows.map(([name]) => name)).toEqual(order.map(String));
    expect(drawing.table.rows.map((row) => row[1])).toEqual(firings.map((at) => `${at}°`));
  });
});

it('says what the valves do at the hand', () => {
  const drawing = clock([1, 3, 4, 2], 344);
  expect(drawing.table.rows[0]).toEqual(['1', '0°', 'exhaust', 'opening', 'closing']);
  expect(drawing.description).toContain('Cylinder 1: inlet opening, exhaust closing.');
  expect(wordsOf(drawing)).toContain('344°');
});

it('draws negative timing and a crank counted over many turns', () => {
  const drawing = clock([1, 3, 4, 2], 7200 + 30, { ivo: -10, ivc: 40, evo: 40, evc: -10 });
  expect(crankAt((partsOf(drawing, 'hand')[0] as LineShape).to)).toBe(30);
  expect(unreadable(drawing)).toEqual([]);
});
