import { describe, expect, it } from 'vitest';
import type { MeasurementStep } from '../contracts/steps.js';
import type { Verdict } from '../contracts/verdict.js';
import { currentEntries, type RecordedEntry } from './current-entries.js';
import { isRecorded, stepFacts } from './facts.js';

// The rules are those of the sheet itself: an entry is never changed, a correction replaces it. No source.

const gaps: MeasurementStep = {
  code: '4.1',
  stage: 4,
  title: 'Ring end gaps',
  instruction: '',
  restsOn: [],
  hold: false,
  critical: false,
  kind: 'measurement',
  method: 'feeler',
  limits: { low: { value: 0.3, unit: 'mm' } },
  unit: 'mm',
  at: ['Cylinder 1', 'Cylinder 2'],
};

const entry = (
  id: string,
  at: string,
  verdict: Verdict,
  more: Partial<RecordedEntry> = {},
): RecordedEntry => ({
  id,
  content: { kind: 'measurement', at, value: { value: 0.4, unit: 'mm' }, toolId: 't' },
  verdict,
  round: 1,
  replaces: null,
  by: 'builder',
  ...more,
});

const record = (entries: readonly RecordedEntry[], more = {}) => ({
  definition: gaps,
  entries,
  entriesFromRound: 1,
  countersigned: false,
  openSnags: 0,
  accepted: new Set<string>(),
  ...more,
});

describe('what is known of a step', () => {
  it('counts a place as done only when its entry passes', () => {
    const facts = stepFacts(record([entry('a', 'Cylinder 1', 'pass'), entry('b', 'Cylinder 2', 'fail')]));
    expect(facts).toMatchObject({ done: 1, of: 2, verdict: 'fail' });
    expect(isRecorded(facts)).toBe(false);
  });

  it('lets a correction take the place of the entry it replaces, and keeps both', () => {
    const entries = [
      entry('a', 'Cylinder 1', 'pass'),
      entry('b', 'Cylinder 2', 'fail'),
      entry('c', 'Cylinder 2', 'pass', { replaces: 'b', by: 'other' }),
    ];
    const facts = stepFacts(record(entries));
    expect(facts).toMatchObject({ done: 2, of: 2, verdict: 'pass', recorders: ['builder', 'other'] });
    expect(currentEntries(entries, 1).map(({ id }) => id)).toEqual(['a', 'c']);
  });

  it('drops the entries of rounds that were undone', () => {
    const entries = [entry('a', 'Cylinder 1', 'pass'), entry('b', 'Cylinder 2', 'pass', { round: 2 })];
    expect(stepFacts(record(entries, { entriesFromRound: 2 }))).toMatchObject({ done: 1, of: 2 });
  });

  it('counts a fault that the foreman accepted as it is', () => {
    const entries = [entry('a', 'Cylinder 1', 'pass'), entry('b', 'Cylinder 2', 'fail')];
    expect(stepFacts(record(entries, { accepted: new Set(['b']) }))).toMatchObject({
      done: 2,
      verdict: 'pass',
    });
  });

  it('knows nothing before the first entry', () => {
    expect(stepFacts(record([]))).toMatchObject({ done: 0, of: 2, verdict: null, recorders: [] });
  });
});
