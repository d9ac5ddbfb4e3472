import { describe, expect, it } from 'vitest';
import type { CylinderTestRequest } from '../contracts/measuring.js';
import type { Quantity, Unit } from '../contracts/quantity.js';
import { cylinderTest } from './cylinder-test.js';

const of = (value: number, unit: Unit = 'bar'): Quantity => ({ value, unit });
const dry = (...values: readonly number[]) => values.map((value, i) => ({ cylinder: i + 1, dry: of(value) }));

/** Three quarters, a tenth by oil: common practice, no source. Worked by hand. */
describe('compression', () => {
  it('compares the lowest with the highest', () => {
    const even = cylinderTest({ test: 'compression', readings: dry(10, 9.8, 7.5, 9.9) });
    expect(even).toMatchObject({ verdict: 'pass', lowest: 3, highest: 1, share: 0.75, findings: [] });
    const uneven = cylinderTest({ test: 'compression', readings: dry(10, 9.8, 7, 9.9) });
    expect(uneven.verdict).toBe('fail');
    expect(uneven.reason).toContain('70 %');
    expect(uneven.findings.map(({ finding }) => finding)).toEqual(['low']);
  });

  it('compares across units', () => {
    // T1-014: 1 bar = 14.503 773 773 psi.
    const mixed = [...dry(10), { cylinder: 2, dry: of(145.0377377302092, 'psi') }];
    expect(cylinderTest({ test: 'compression', readings: mixed }).share).toBeCloseTo(1, 12);
  });

  it('names low neighbours, of one bank alone', () => {
    const readings = dry(10, 6, 5.5, 9.9);
    const found = (given: CylinderTestRequest['readings']) =>
      cylinderTest({ test: 'compression', readings: given }).findings.filter(
        ({ finding }) => finding === 'neighbours-low',
      );
    expect(found(readings)).toMatchObject([{ cylinders: [2, 3] }]);
    expect(found(readings.map((one, i) => ({ ...one, bank: i < 2 ? 'left' : 'right' })))).toEqual([]);
    expect(found(dry(6, 10, 6, 9.9))).toEqual([]);
  });

  it.each([
    [6, 6.7, 'rises-wet'],
    [6, 6.6, 'rises-wet'],
    [6, 6.5, 'stays-low-wet'],
    [0, 5, 'rises-wet'],
    [0, 0, 'stays-low-wet'],
  ])('%d bar dry, %d bar with oil: %s', (before, wet, expected) => {
    const readings = [...dry(10, 10), { cylinder: 3, dry: of(before), wet: of(wet) }];
    const { findings } = cylinderTest({ test: 'compression', readings });
    expect(findings.map(({ finding }) => finding)).toEqual(['low', expected]);
  });

  it('counts only the trend of a rebuilt engine, and nothing of one cylinder', () => {
    const rebuilt = cylinderTest({ test: 'compression', readings: dry(10, 5), rebuilt: true });
    expect(rebuilt.verdict).toBe('not-judged');
    expect(rebuilt.reason).toContain('trend');
    expect(cylinderTest({ test: 'compression', readings: dry(10) }).verdict).toBe('not-judged');
  });

  it('fails an engine with no pressure at all', () => {
    expect(cylinderTest({ test: 'compression', readings: dry(0, 0) })).toMatchObject({
      ...{ verdict: 'fail', share: null },
    });
  });
});

describe('leak-down', () => {
  const readings = [8, 25, 9].map((lost, i) => ({ cylinder: i + 1, dry: lost }));
  const tester = { orifice: of(1, 'mm'), supply: of(100, 'psi') };
  const request: CylinderTestRequest = {
    test: 'leak-down',
    readings,
    mostLeak: 20,
    mostLeakAt: tester,
    ...tester,
  };

  it('is judged against the limit of the same tester', () => {
    expect(cylinderTest(request)).toMatchObject({ verdict: 'fail', highest: 2, share: null });
    expect(cylinderTest({ ...request, mostLeak: 25 }).verdict).toBe('pass');
  });

  it('is not judged by another orifice or pressure, or where they were not said', () => {
    expect(cylinderTest({ ...request, orifice: of(1.5, 'mm') }).verdict).toBe('not-judged');
    expect(cylinderTest({ ...request, supply: of(80, 'psi') }).reason).toContain('do not compare');
    const silent = cylinderTest({ ...request, mostLeakAt: undefined });
    expect(silent.verdict).toBe('not-judged');
    expect(silent.findings).toEqual([]);
    expect(cylinderTest({ test: 'leak-down', readings }).verdict).toBe('not-judged');
  });
});

it.each<[string, unknown]>([
  ['test', { test: 'smoke', readings: dry(1) }],
  ['readings', { test: 'compression', readings: [] }],
  ['readings', { test: 'compression', readings: dry(...Array.from({ length: 900 }, () => 1)) }],
  ['readings[1].cylinder', { test: 'compression', readings: [dry(1)[0], dry(1)[0]] }],
  ['readings[0].dry', { test: 'compression', readings: [{ cylinder: 1, dry: 10 }] }],
  ['readings[0].dry', { test: 'leak-down', readings: dry(10) }],
  ['readings[0].dry', { test: 'leak-down', readings: [{ cylinder: 1, dry: 101 }] }],
  ['readings[0].wet.value', { test: 'compression', readings: [{ ...dry(1)[0], wet: of(-1) }] }],
  ['leastShare', { test: 'compression', readings: dry(1), leastShare: 75 }],
  ['mostLeak', { test: 'leak-down', readings: [{ cylinder: 1, dry: 1 }], mostLeak: -1 }],
  [
    'mostLeakAt.supply',
    { test: 'leak-down', readings: [{ cylinder: 1, dry: 1 }], mostLeakAt: { orifice: of(1, 'mm') } },
  ],
  ['rebuilt', { test: 'compression', readings: dry(1), rebuilt: 1 }],
])('is refused on %s', (field, request) => {
  expect(() => cylinderTest(request as CylinderTestRequest)).toThrow(
    expect.objectContaining({ name: 'InputError', field }),
  );
});
