import { describe, expect, it } from 'vitest';
import type { CureRequest } from '../contracts/curing.js';
import type { Quantity, Unit } from '../contracts/quantity.js';
import { cure } from '../curing/cure.js';
import { drawCureCurve } from './cure-curve.js';
import { partsOf, unreadable, wordsOf } from './drawing-case.js';
import type { CircleShape, Drawing, LineShape, PathShape } from './shapes.js';

const of = (value: number, unit: Unit): Quantity => ({ value, unit });
const request: CureRequest = {
  sheet: [
    {
      ...{ temperature: of(20, '°C'), toHandle: of(2, 'h'), toLoad: of(6, 'h'), full: of(24, 'h') },
    },
  ],
  temperature: of(20, '°C'),
  applied: '2026-12-01T08:00Z',
  closed: '2026-12-01T08:10Z',
  now: '2026-12-01T12:10Z',
};
const draw = (change: Partial<CureRequest>) => {
  const given = { ...request, ...change };
  return drawCureCurve(given, cure(given));
};
const xOf = (drawing: Drawing, part: string): number => (partsOf(drawing, part)[0] as LineShape).from.x;

describe('a joint that sets', () => {
  const drawing = draw({})!;
  const stages = partsOf(drawing, 'stage') as readonly CircleShape[];

  it('has its stages, now and the wait on one linear axis', () => {
    const perHour = (stages[2]!.centre.x - stages[1]!.centre.x) / 18;
    expect(stages[1]!.centre.x - stages[0]!.centre.x).toBeCloseTo(4 * perHour, 1);
    expect(xOf(drawing, 'load')).toBeCloseTo(stages[1]!.centre.x, 1);
    expect(xOf(drawing, 'load') - xOf(drawing, 'now')).toBeCloseTo(2 * perHour, 1);
    const { d } = partsOf(drawing, 'wait')[0] as PathShape;
    const xs = [...d.matchAll(/[ML]([\d.-]+)/g)].map((match) => Number(match[1]));
    expect(Math.min(...xs)).toBeGreaterThanOrEqual(xOf(drawing, 'now') - 0.02);
    expect(Math.max(...xs)).toBeLessThanOrEqual(xOf(drawing, 'load') + 0.02);
  });

  it('is drawn only between the stages of the data sheet', () => {
    const { d } = partsOf(drawing, 'curve')[0] as PathShape;
    expect([...d.matchAll(/[ML]([\d.-]+)/g)].map((match) => Number(match[1]))).toEqual(
      stages.map(({ centre }) => centre.x),
    );
  });

  it('says the same in words and in the table', () => {
    expect(wordsOf(drawing)).toEqual(
      expect.arrayContaining(['2 h to wait', 'now 12:10, 1 Dec', 'load from 14:10, 1 Dec']),
    );
    expect(drawing.table.rows).toEqual([
      ['May be handled', '2 h', '10:10, 1 Dec'],
      ['May be loaded', '6 h', '14:10, 1 Dec'],
      ['Full strength', '1 d', '08:10, 2 Dec'],
      ['Now', '4 h', '12:10, 1 Dec'],
    ]);
  });
});

it('is not drawn where nothing was worked out', () => {
  expect(draw({ temperature: of(30, '°C') })).toBeNull();
});

it.each<[string, Partial<CureRequest>]>([
  ['as it is closed', { now: '2026-12-01T08:10Z' }],
  ['when it is ready', { now: '2026-12-01T14:10Z' }],
  ['weeks later', { now: '2027-01-20T08:10Z' }],
  ['in seconds', { sheet: [{ temperature: of(20, '°C'), toLoad: of(2, 's'), full: of(3, 's') }] }],
  ['in months', { sheet: [{ temperature: of(20, '°C'), toLoad: of(60, 'd'), full: of(360, 'd') }] }],
  ['at once', { sheet: [{ temperature: of(20, '°C'), toLoad: of(6, 'h'), full: of(6, 'h') }] }],
])('can be read %s', (_what, change) => {
  const drawing = draw(change)!;
  expect(unreadable(drawing)).toEqual([]);
  expect(JSON.stringify(drawing.shapes)).not.toMatch(/null|NaN/);
});
