import { describe, expect, it } from 'vitest';
import type { CapDiagnosisRequest, Cylinder } from '../contracts/calculations.js';
import { capDiagnosis } from '../ignition/cap-diagnosis.js';
import { allShapes, partsOf, unreadable, wordsOf } from './drawing-case.js';
import { drawSparkStrip } from './spark-strip.js';
import type { CircleShape, Drawing, PathShape, RectShape } from './shapes.js';

const valveTiming = { ivo: 16, ivc: 56, evo: 51, evc: 21 };

function strip(
  firingOrder: readonly Cylinder[],
  fitted: Record<string, Cylinder>,
  more: Partial<CapDiagnosisRequest> = {},
): Drawing {
  const request = { cap: { firingOrder, rotation: 'clockwise' as const }, fitted, valveTiming, ...more };
  return drawSparkStrip({ request, diagnosis: capDiagnosis(request) });
}

/** Crank degrees from compression TDC at which a cylinder's arrow meets the strip. */
function phaseOf(drawing: Drawing, cylinder: Cylinder): number {
  const [tdc, end] = [170, 332];
  const d = (partsOf(drawing, `spark:${cylinder}`)[0] as PathShape).d;
  const x = Number([...d.matchAll(/[ML]([\d.-]+)/g)].at(-1)?.[1]);
  return Math.round(((x - tdc) * 360) / (end - tdc));
}

/** 1-3-4-2 with the leads of 1 and 3 in each other's place: their sparks are half a turn out. */
const swapped = { 1: 3, 2: 1, 3: 4, 4: 2 };

describe('a four with 1 and 3 swapped', () => {
  const drawing = strip([1, 3, 4, 2], swapped);

  it('has right sparks at the advance before compression TDC, wrong ones where they fall', () => {
    // One firing interval of a four is 180° of crank: late is after, early is before. 10° is the advance.
    expect(phaseOf(drawing, 4)).toBe(-10);
    expect(phaseOf(drawing, 1)).toBe(170);
    expect(phaseOf(drawing, 3)).toBe(-190);
  });

  it('marks the wrong ones and no others', () => {
    const fill = (cylinder: number): string | undefined =>
      (partsOf(drawing, `cylinder:${cylinder}`)[0] as CircleShape).fill;
    expect([1, 2, 3, 4].map(fill)).toEqual(['oxide', 'paper', 'oxide', 'paper']);
  });

  it('shows how long each valve is open', () => {
    const perDegree = 324 / 720;
    const width = (part: string): number =>
      (partsOf(drawing, part) as readonly RectShape[]).reduce((sum, rect) => sum + rect.width, 0);
    // ivo + 180 + ivc and evo + 180 + evc, by definition of the four figures.
    expect(width('inlet-open')).toBeCloseTo(252 * perDegree, 0);
    expect(width('exhaust-open')).toBeCloseTo(252 * perDegree, 0);
  });

  it('says the same in its table', () => {
    expect(drawing.table.rows).toEqual(
      expect.arrayContaining([
        ['1', '180° late', 'power', 'exhaust open'],
        ['3', '180° early', 'inlet', 'inlet open'],
        ['4', 'in place', 'compression', 'both shut'],
      ]),
    );
    expect(drawing.description).toContain('Cylinder 1: 180° late, on power, exhaust open.');
    expect(unreadable(drawing)).toEqual([]);
  });
});

it('stands on the advance that is given', () => {
  expect(phaseOf(strip([1, 3, 4, 2], swapped, { advance: 0 }), 4)).toBe(0);
});

it('leaves the valves out when their timing is not known', () => {
  const drawing = strip([1, 3, 4, 2], swapped, { valveTiming: undefined });
  expect(wordsOf(drawing)).not.toContain('inlet open');
  expect(drawing.table.rows[0]?.[3]).toBe('not known');
});

const vee = [1, 8, 4, 3, 6, 5, 7, 2];
const twelve = [1, 12, 5, 8, 3, 10, 6, 7, 2, 11, 4, 9];
const moved = (order: readonly number[], by: (i: number) => number): Record<string, number> =>
  Object.fromEntries(order.map((_, i) => [String(i + 1), order[by(i) % order.length] ?? 0]));

it.each<{ what: string; order: readonly number[]; by: (i: number) => number; advance?: number }>([
  { what: 'a right eight', order: vee, by: (i) => i },
  { what: 'an eight moved one post', order: vee, by: (i) => i + 1 },
  { what: 'an eight wired against the rotor', order: vee, by: (i) => 8 - i },
  { what: 'a mixed eight', order: vee, by: (i) => i * 3 },
  { what: 'a twelve wired against the rotor', order: twelve, by: (i) => 12 - i },
  { what: 'a twelve moved five posts, sparking early', order: twelve, by: (i) => i + 5, advance: 50 },
])('shows every cylinder once, none over another: $what', ({ order, by, advance }) => {
  const drawing = strip(order, moved(order, by), { advance });
  const badges = allShapes(drawing).filter(
    (shape): shape is CircleShape => shape.kind === 'circle' && shape.part?.startsWith('cylinder:') === true,
  );
  expect(badges).toHaveLength(order.length);
  for (const [i, a] of badges.entries()) {
    expect(a.centre.x - a.radius).toBeGreaterThanOrEqual(0);
    expect(a.centre.x + a.radius).toBeLessThanOrEqual(drawing.width);
    for (const b of badges.slice(i + 1)) {
      const gap = Math.hypot(a.centre.x - b.centre.x, a.centre.y - b.centre.y);
      expect(gap).toBeGreaterThanOrEqual(a.radius + b.radius);
    }
  }
  expect(unreadable(drawing)).toEqual([]);
});
