import { describe, expect, it } from 'vitest';
import { twoReadings } from '../measuring/two-readings.js';
import { apart } from './apart.js';
import { checksOf } from './checks.js';

const checks = checksOf('Measurement and countersign statistics');
const mm = (value: number) => ({ value, unit: 'mm' }) as const;

const enOf = (x1: number, x2: number, u1: number, u2: number) =>
  twoReadings({
    first: { value: mm(x1), uncertainty: mm(u1) },
    second: { value: mm(x2), uncertainty: mm(u2) },
  });

const run: Readonly<Record<string, () => unknown>> = {
  // The uncertainty that the first printed row implies, put to all three.
  'T9-001': () => [0.006, -0.004, -0.002].map((error) => enOf(error, 0, 0.006 / 0.393, 0).en / error),
  'T9-002': () => enOf(27, 28.1, 0.04 * 27, 0.04 * 28.1).en,
  'T9-004': () => enOf(10.005, 10, 0.004, 0.003).en,
  // Zeta is En of standard uncertainties, which are half the expanded ones.
  'T9-005': () => enOf(10.005, 10, 0.002, 0.0015).en,
};

const guardBand =
  'The chance of a false pass. The product takes the whole U as guard band and gives no chance.';
const study = 'A study of a measuring system. Two people judge each joint by En; no such study is made.';
const notRun: Readonly<Record<string, string>> = {
  'T9-010': guardBand,
  'T9-013': guardBand,
  'T9-021': `Transcribed, no evidence. ${study}`,
  'T9-022': study,
  'T9-024': 'Of one person twice with one tool. Two readings here are by two people, judged by En.',
  'T9-025': 'The two readings are never averaged: the first counts and the second confirms it.',
};

describe('measurement and countersign statistics', () => {
  it.each(Object.keys(run))('%s', (id) => {
    expect(apart(run[id]!(), checks.get(id)!.expected)).toBeLessThan(1e-12);
  });

  it('T9-004: a score of just 1 agrees', () => {
    expect(enOf(10.005, 10, 0.004, 0.003).verdict).toBe('pass');
  });
});

it('leaves no value of the topic out', () => {
  expect([...Object.keys(run), ...Object.keys(notRun)].sort()).toEqual([...checks.keys()].sort());
});
