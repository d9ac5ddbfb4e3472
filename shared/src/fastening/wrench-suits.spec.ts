import { describe, expect, it } from 'vitest';
import type { WrenchSuitsRequest } from '../contracts/fastening.js';
import { InputError } from '../contracts/input-error.js';
import type { Quantity, Unit } from '../contracts/quantity.js';
import { wrenchSuits } from './wrench-suits.js';

const torque = (value: number, unit: Unit = 'lbf·ft'): Quantity => ({ value, unit });
const good: WrenchSuitsRequest = {
  torque: torque(27),
  tolerance: { low: torque(2), high: torque(2) },
  wrench: {
    kind: 'click',
    range: { low: torque(10), high: torque(80) },
    resolution: torque(0.5),
    calibrationDue: '2027-01-31',
  },
  on: '2026-12-01',
};
const suits = (more: Partial<WrenchSuitsRequest> = {}, wrench: Partial<WrenchSuitsRequest['wrench']> = {}) =>
  wrenchSuits({ ...good, ...more, wrench: { ...good.wrench, ...wrench } });
const verdictOf = (of: string, answer = suits()) => answer.checks.find((check) => check.of === of)?.verdict;

describe('what a wrench may deliver', () => {
  it('is 6 % either side of 8 N·m from a wrench that ends at 10 N·m', () => {
    // T4-138, I6789.
    const { delivers, deviation, assumed } = wrenchSuits({
      torque: torque(8, 'N·m'),
      wrench: { kind: 'click', range: { low: torque(2, 'N·m'), high: torque(10, 'N·m') } },
    });
    expect(deviation).toBe(0.06);
    expect(delivers.low.value).toBeCloseTo(7.52, 9);
    expect(delivers.high.value).toBeCloseTo(8.48, 9);
    expect(assumed.join()).toContain('±6 %');
  });

  it('is 4 % of larger ones, and what is given of any', () => {
    // I6789: 4 % above 10 N·m.
    expect(suits().deviation).toBe(0.04);
    expect(suits({}, { deviation: 0.02 })).toMatchObject({ deviation: 0.02, assumed: [] });
  });

  it('is held against the tolerance as a ratio', () => {
    // 4 lbf·ft of tolerance over 2 × 4 % of 27.
    expect(suits().ratio).toBeCloseTo(4 / 2.16, 12);
    expect(suits({ tolerance: undefined }).ratio).toBeNull();
  });
});

describe('a wrench suits', () => {
  it('when all its checks pass', () => {
    const { verdict, checks, reason } = suits();
    expect(verdict).toBe('pass');
    expect(checks.map((check) => check.verdict)).toEqual(['pass', 'pass', 'pass', 'pass']);
    expect(reason).toContain('in date');
  });

  it('also when something is not known, which it says', () => {
    const { verdict, checks } = suits(
      { tolerance: undefined, on: undefined },
      { resolution: undefined, calibrationDue: undefined },
    );
    expect(verdict).toBe('pass');
    expect(checks.map((check) => check.verdict)).toEqual(['pass', 'not-judged', 'not-judged', 'not-judged']);
  });
});

describe('a wrench does not suit', () => {
  it.each([
    [9, 'fail'],
    [10, 'pass'],
    [80, 'pass'],
    [81, 'fail'],
  ])('%s lbf·ft of 10 to 80: range %s', (value, verdict) => {
    expect(verdictOf('range', suits({ torque: torque(value) }))).toBe(verdict);
  });

  it('surely in the lowest fifth of its range, though its maker vouches for it', () => {
    // ISO 6789-1:2017, 6.2: calibration at 20, 60 and 100 % (from memory); 16 is 20 % of 80.
    expect(suits({ torque: torque(15.9) }).reason).toContain('lowest fifth');
    expect(suits({ torque: torque(16) }).reason).not.toContain('lowest fifth');
  });

  it('too coarse where it may deliver more than the whole tolerance, and is not a fail', () => {
    const { verdict, reason } = suits({ tolerance: { low: torque(1), high: torque(1) } });
    expect(verdict).toBe('doubtful');
    expect(reason).toContain('too coarse');
  });

  it('aimed at the end of a one-sided tolerance', () => {
    const { verdict, reason } = suits({ tolerance: { low: torque(0), high: torque(4) } });
    expect(verdict).toBe('doubtful');
    expect(reason).toContain('aim at the middle');
  });

  it('with divisions too wide', () => {
    expect(verdictOf('resolution', suits({}, { resolution: torque(5) }))).toBe('doubtful');
    expect(verdictOf('resolution', suits({ tolerance: undefined }, { resolution: torque(2) }))).toBe('pass');
  });

  it('past its calibration, which counts to the end of its day', () => {
    expect(verdictOf('calibration', suits({ on: '2027-01-31' }))).toBe('pass');
    const late = suits({ on: '2027-02-01' });
    expect(late.verdict).toBe('doubtful');
    expect(late.reason).toContain('2027-01-31');
  });
});

describe('input that cannot be used', () => {
  const wrench = (more: object) => ({ ...good, wrench: { ...good.wrench, ...more } });
  it.each([
    ['request', null],
    ['torque.value', { ...good, torque: torque(0) }],
    ['tolerance.low', { ...good, tolerance: { low: torque(30), high: torque(2) } }],
    ['wrench', { ...good, wrench: undefined }],
    ['wrench.kind', wrench({ kind: 'long' })],
    ['wrench.range', wrench({ range: undefined })],
    ['wrench.range.low', wrench({ range: { low: torque(80), high: torque(10) } })],
    ['wrench.range.high.value', wrench({ range: { low: torque(0), high: torque(0) } })],
    ['wrench.resolution.value', wrench({ resolution: torque(0) })],
    ['wrench.deviation', wrench({ deviation: NaN })],
    ['wrench.deviation', wrench({ deviation: 4 })],
    ['wrench.calibrationDue', wrench({ calibrationDue: '31 January' })],
    ['on', { ...good, on: undefined }],
    ['on', { ...good, on: '2026-02-30' }],
  ])('%s', (field, request) => {
    expect(() => wrenchSuits(request as WrenchSuitsRequest)).toThrow(InputError);
    expect(() => wrenchSuits(request as WrenchSuitsRequest)).toThrow(expect.objectContaining({ field }));
  });
});
