import { describe, expect, it } from 'vitest';
import type { Tool } from '../contracts/registers.js';
import type { EntryContent, MeasurementStep, SecondReadingContent } from '../contracts/steps.js';
import type { RecordedEntry } from './current-entries.js';
import { compareSecond } from './second-check.js';

const gauge = (id: string, code: string, uncertainty: number): Tool => ({
  id,
  code,
  name: 'Dial gauge',
  kind: 'dial-gauge',
  low: { value: 0, unit: 'mm' },
  high: { value: 10, unit: 'mm' },
  resolution: { value: 0.01, unit: 'mm' },
  uncertainty: { value: uncertainty, unit: 'mm' },
  calibrationDue: '2027-03-14',
});

const endFloat: MeasurementStep = {
  code: '3.9',
  stage: 3,
  title: 'Crankshaft end float',
  instruction: '',
  restsOn: [],
  hold: true,
  critical: true,
  secondCheck: 'measured-again',
  kind: 'measurement',
  method: 'dial-gauge',
  limits: { low: { value: 0.1, unit: 'mm' }, high: { value: 0.25, unit: 'mm' } },
  unit: 'mm',
  at: ['Centre main'],
};
const first: EntryContent = {
  kind: 'measurement',
  at: 'Centre main',
  value: { value: 0.17, unit: 'mm' },
  toolId: 'first',
};
const entries: readonly RecordedEntry[] = [
  { id: 'e', content: first, verdict: 'pass', round: 1, replaces: null, by: 'builder' },
];
const check = {
  definition: endFloat,
  entries,
  tools: [gauge('first', 'T-04', 0.012), gauge('second', 'T-12', 0.01), gauge('coarse', 'T-30', 0.05)],
  on: '2026-12-01',
};
const again = (value: number, toolId = 'second'): SecondReadingContent => ({
  kind: 'measured-again',
  toolId,
  readings: [{ at: 'Centre main', value: { value, unit: 'mm' } }],
});

describe('a clearance measured again', () => {
  it('agrees up to En 1', () => {
    // En = (x1 − x2)/√(U1² + U2²), ISO 13528:2022, 9.7 (from memory): 0.01/√(0.012² + 0.010²) = 0.640.
    const agreement = compareSecond(check, again(0.18));
    expect(agreement.verdict).toBe('pass');
    expect(Math.abs(agreement.rows[0]?.en ?? 9)).toBeCloseTo(0.64, 2);
    expect(compareSecond(check, again(0.19)).verdict).toBe('fail');
  });

  it('does not agree when the second reading itself fails a limit', () => {
    expect(compareSecond(check, again(0.27)).verdict).toBe('fail');
  });

  it('asks only for agreement where the foreman accepted the first reading as it is', () => {
    const accepted = { ...first, value: { value: 0.27, unit: 'mm' } } as const;
    const entry = {
      id: 'e',
      content: accepted,
      verdict: 'fail',
      round: 1,
      replaces: null,
      by: 'builder',
    } as const;
    expect(compareSecond({ ...check, entries: [entry] }, again(0.275)).verdict).toBe('pass');
    expect(compareSecond({ ...check, entries: [entry] }, again(0.3)).verdict).toBe('fail');
  });

  it('refuses the first tool, a tool too coarse, and a reading left out', () => {
    expect(() => compareSecond(check, again(0.18, 'first'))).toThrow(/not independent/);
    expect(() => compareSecond(check, again(0.18, 'coarse'))).toThrow(/finer/);
    expect(() => compareSecond(check, { kind: 'measured-again', toolId: 'second', readings: [] })).toThrow(
      /Centre main/,
    );
    expect(() => compareSecond(check, { kind: 'inspected', outcome: 'pass', seen: [] })).toThrow(
      /measured-again/,
    );
  });
});
