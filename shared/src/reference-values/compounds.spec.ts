import { describe, expect, it } from 'vitest';
import type { CurePoint } from '../contracts/curing.js';
import { cure } from '../curing/cure.js';
import { convert } from '../quantities/convert.js';
import { apart } from './apart.js';
import { checksOf } from './checks.js';

const checks = checksOf('Anaerobic compounds');
const start = '2026-12-01T08:00:00.000Z';

/** Seconds from closing to loading, by a data sheet of one line. */
const secondsToLoad = (point: CurePoint): number => {
  const { loadAt } = cure({ sheet: [point], temperature: point.temperature, applied: start, now: start });
  return (Date.parse(loadAt ?? '') - Date.parse(start)) / 1000;
};
const hot = { value: 300, unit: '°F' } as const;
const seconds = { value: 45, unit: 's' } as const;
const room = { value: 22, unit: '°C' } as const;
const hours = { value: 3, unit: 'h' } as const;

const run: Readonly<Record<string, () => unknown>> = {
  'T8-007': () => convert({ value: 30, unit: 'thou' }, 'mm').value,
  'T8-008': () => [
    convert(hot, '°C').value,
    secondsToLoad({ temperature: hot, toLoad: seconds, full: seconds }),
    secondsToLoad({ temperature: room, toLoad: hours, full: hours }) / 3600,
  ],
  'T8-009': () => convert(hot, 'K').value,
};

const ownSheet =
  'Transcribed, no evidence. The product holds no figures of compounds: a shop enters those of its own data sheet.';
const notRun: Readonly<Record<string, string>> = {
  'T8-001': ownSheet,
  'T8-002': ownSheet,
  'T8-003': ownSheet,
  'T8-004': ownSheet,
  'T8-011': `${ownSheet} Lines of a sheet can tell materials and activator apart.`,
};

describe('anaerobic compounds', () => {
  it.each(Object.keys(run))('%s', (id) => {
    expect(apart(run[id]!(), checks.get(id)!.expected)).toBeLessThan(1e-12);
  });
});

it('leaves no value of the topic out', () => {
  expect([...Object.keys(run), ...Object.keys(notRun)].sort()).toEqual([...checks.keys()].sort());
});
