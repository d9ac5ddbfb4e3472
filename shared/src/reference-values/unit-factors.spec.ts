import { describe, expect, it } from 'vitest';
import type { Unit } from '../contracts/quantity.js';
import { convert, convertInterval } from '../quantities/convert.js';
import { apart } from './apart.js';
import { checksOf } from './checks.js';

const checks = checksOf('Unit factors');
const to = (value: number, from: Unit, unit: Unit) => (): number =>
  convert({ value, unit: from }, unit).value;
const each =
  (value: number, from: Unit, ...units: readonly Unit[]) =>
  (): readonly number[] =>
    units.map((unit) => convert({ value, unit: from }, unit).value);

const run: Readonly<Record<string, () => unknown>> = {
  'T1-001': to(1, 'lbf', 'N'),
  'T1-002': to(1, 'lbf·ft', 'N·m'),
  'T1-003': to(1, 'lbf·in', 'N·m'),
  'T1-005': to(1, 'kgf·m', 'N·m'),
  'T1-006': to(1, 'kgf·cm', 'N·m'),
  'T1-008': to(27, 'lbf·ft', 'N·m'),
  'T1-009': to(27, 'lbf·ft', 'lbf·in'),
  'T1-010': to(27, 'lbf·ft', 'kgf·m'),
  'T1-011': to(27, 'N·m', 'lbf·ft'),
  'T1-012': to(1, 'psi', 'Pa'),
  'T1-013': to(1, 'bar', 'kPa'),
  'T1-014': to(1, 'bar', 'psi'),
  'T1-017': to(1, 'in', 'mm'),
  'T1-019': to(0.002, 'in', 'mm'),
  'T1-020': to(1, 'in3', 'cm3'),
  'T1-021': to(100, 'cm3', 'in3'),
  'T1-023': to(125, '°C', '°F'),
  'T1-025': () => [80, 90].map((value) => convertInterval({ value, unit: 'K' }, '°F').value),
  'T1-027': each(20, 'N·m', 'kgf·m', 'lbf·ft'),
  'T1-029': each(25, 'N·m', 'kgf·m', 'lbf·ft'),
};

const notRun: Readonly<Record<string, string>> = {
  'T1-004':
    'No engine manual states a torque in ozf·in: it is a unit of instruments, and the product has it not.',
  'T1-007': 'No torque wrench or manual states dN·m: the product has it not.',
  'T1-015': 'An atmosphere is no unit of gauges in a workshop: the product has it not.',
};

describe('unit factors', () => {
  it.each(Object.keys(run))('%s', (id) => {
    expect(apart(run[id]!(), checks.get(id)!.expected)).toBeLessThan(1e-14);
  });

  it('agree with the factors printed, to the digits printed', () => {
    // T1-002: SP 811 prints 1.355 818 for 1.355 817 948 331 400 4.
    expect(Number(to(1, 'lbf·ft', 'N·m')().toFixed(6))).toBe(1.355818);
  });
});

it('leaves no value of the topic out', () => {
  expect([...Object.keys(run), ...Object.keys(notRun)].sort()).toEqual([...checks.keys()].sort());
});
