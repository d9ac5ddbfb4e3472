import { describe, expect, it } from 'vitest';
import type { CapMap, CapMapRequest, Cylinder, Rotation } from '../contracts/calculations.js';
import { capDiagnosis } from '../ignition/cap-diagnosis.js';
import { capMap } from '../ignition/cap-map.js';
import { dwell } from '../ignition/dwell.js';
import { knownOrders } from '../ignition/known-orders.js';
import { leadTest } from '../ignition/lead-test.js';
import { apart } from './apart.js';
import { checksOf } from './checks.js';

const checks = checksOf('Ignition');

const eightA = [1, 8, 4, 3, 6, 5, 7, 2];
const eightB = [1, 8, 7, 2, 6, 5, 4, 3];
const eightC = [1, 5, 4, 2, 6, 3, 7, 8];
const ten = [1, 10, 9, 4, 3, 6, 5, 8, 7, 2];
const six = [1, 5, 3, 6, 2, 4];
const four = [1, 3, 4, 2];

const mapOf = (firingOrder: readonly Cylinder[], more: Partial<CapMapRequest> = {}): CapMap =>
  capMap({ firingOrder, rotation: 'clockwise', ...more });

function intervals(cylinders: number): readonly unknown[] {
  const { crankInterval, distributorInterval } = mapOf(Array.from({ length: cylinders }, (_, i) => i + 1));
  return [crankInterval, distributorInterval];
}

/** The cylinders as they stand round the cap clockwise, from post 1. */
const clockwise = (order: readonly Cylinder[], rotation: Rotation): readonly Cylinder[] =>
  [...mapOf(order, { rotation }).rows].sort((a, b) => a.angle - b.angle).map(({ cylinder }) => cylinder);

/** How late two cylinders fire whose leads are exchanged. */
function lateWhenSwapped(order: readonly number[], one: number, other: number): Record<string, number> {
  const swapped = new Map([
    [one, other],
    [other, one],
  ]);
  const cap = { firingOrder: order, rotation: 'clockwise' } as const;
  const fitted = Object.fromEntries(order.map((cylinder, i) => [i + 1, swapped.get(cylinder) ?? cylinder]));
  const wrong = capDiagnosis({ cap, fitted }).cylinders.filter(({ late }) => late !== 0);
  return Object.fromEntries(wrong.map(({ cylinder, late }) => [String(cylinder), late]));
}

/** Distributor degrees from spark to spark of a six that fires 90 and 150 apart, on posts spaced as expected. */
function oddFireSpacing(expected: readonly number[]): readonly number[] {
  const crank = [90, 150, 90, 150, 90, 150];
  const posts = expected.map((_, i) => ({
    post: String(i + 1),
    angle: expected.slice(0, i).reduce((sum, gap) => sum + gap, 0),
  }));
  const { rows, verdict } = mapOf(six, { intervals: crank, posts });
  if (verdict !== 'pass') return [];
  return rows.map(({ firesAt }, i) => ((rows[i + 1]?.firesAt ?? 720) - firesAt) / 2);
}

/** How far apart a ten that fires 54 and 90 apart in turn has the cylinders half its order apart. */
function halfTheOrderApart(): readonly number[] {
  const { rows, companions } = mapOf(ten, { intervals: ten.map((_, i) => (i % 2 === 0 ? 54 : 90)) });
  if (companions.length > 0) return [];
  const gaps = rows.slice(0, 5).map(({ firesAt }, i) => (rows[i + 5]?.firesAt ?? NaN) - firesAt);
  return [...new Set(gaps)].sort((a, b) => a - b);
}

const kilohmsAFoot = (length: number) =>
  leadTest({
    reading: { value: 15, unit: 'kΩ' },
    kind: 'resistive',
    length: { value: length, unit: 'mm' },
    nominal: {
      low: { value: 7, unit: 'kΩ' },
      high: { value: 10, unit: 'kΩ' },
      per: { value: 1, unit: 'ft' },
    },
  }).limits;

const milliseconds = (seconds: number | undefined): number => (seconds ?? NaN) * 1000;
const atSpeed = dwell({ cylinders: 4, dwell: 60, crankSpeed: 5000 });

const run: Readonly<Record<string, () => unknown>> = {
  'T2-021': () => intervals(5),
  'T2-022': () => intervals(6),
  'T2-024': () => intervals(10),
  'T2-026': () => mapOf([1, 6, 5, 4, 3, 2]).companions,
  'T2-027': () => mapOf(six).companions,
  'T2-031': () => mapOf(eightA).companions,
  'T2-032': () => mapOf(eightB).companions,
  'T2-035': () => mapOf([1, 7, 5, 11, 3, 9, 6, 12, 2, 8, 4, 10]).companions,
  'T2-037': halfTheOrderApart,
  'T2-042': () => clockwise(four, 'clockwise'),
  'T2-043': () => clockwise(four, 'anticlockwise'),
  'T2-044': () => clockwise(eightA, 'clockwise'),
  'T2-045': () => clockwise(eightC, 'anticlockwise'),
  'T2-046': () => clockwise(six, 'anticlockwise'),
  'T2-047': () => lateWhenSwapped(eightA, 5, 7),
  'T2-048': () => lateWhenSwapped(four, 1, 4),
  'T2-049': () => lateWhenSwapped(four, 1, 3),
  'T2-054': () => oddFireSpacing(checks.get('T2-054')?.expected as readonly number[]),
  'T2-059': () => milliseconds(atSpeed.betweenSparks?.value),
  'T2-060': () => milliseconds(atSpeed.closedFor?.value),
  'T2-062': () => dwell({ cylinders: 4, dwell: 50 }).share * 100,
  'T2-064': () => dwell({ cylinders: 4, dwell: 52 }).openAngle,
  'T2-067': () => [kilohmsAFoot(600)?.low.value, kilohmsAFoot(600)?.high.value],
  // The length at which 10 kΩ a foot come to 22 kΩ: the limit grows with the length.
  'T2-068': () => (22 / (kilohmsAFoot(600)?.high.value ?? NaN)) * 600,
};

/** Printed firing orders, which stand in the table of known ones; they prove no formula. */
const transcribed: readonly string[] = [
  'T2-001',
  'T2-003',
  'T2-004',
  'T2-005',
  'T2-006',
  'T2-008',
  'T2-011',
  'T2-012',
  'T2-013',
  'T2-015',
  'T2-016',
  'T2-017',
  'T2-041',
];

const numbering = 'Nothing here turns one maker’s numbering of the cylinders into another’s.';
const notRun: Readonly<Record<string, string>> = {
  'T2-038': numbering,
  'T2-039': numbering,
  'T2-052': 'The orders that a crank allows are not worked out: the firing order is asked for.',
  'T2-056': 'The intervals of an engine that fires unevenly are asked for, not worked out from its angle.',
};

describe('worked out from outside', () => {
  it.each(Object.entries(run))('%s', (id, work) => {
    const check = checks.get(id);
    expect(check?.recomputed).toBe(true);
    expect(apart(work(), check?.expected)).toBeLessThan(1e-9);
  });
});

describe('transcribed, no evidence for a formula', () => {
  it.each(transcribed)('%s stands in the table of known orders', (id) => {
    const check = checks.get(id);
    const expected = check?.expected as readonly number[];
    expect(check?.recomputed).toBe(false);
    expect(knownOrders[expected.length]?.map(({ order }) => order)).toContainEqual(expected);
  });
});

it('is every check of the topic, run or with the reason why not', () => {
  const named = [...Object.keys(run), ...transcribed, ...Object.keys(notRun)];
  expect(named.sort()).toEqual([...checks.keys()].sort());
});
