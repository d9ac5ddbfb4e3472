import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { RoundReading, RoundReadingsRequest } from '../contracts/measuring.js';
import type { Quantity, Unit } from '../contracts/quantity.js';
import { roundReadings } from './round-readings.js';

const of = (value: number, unit: Unit = 'mm'): Quantity => ({ value, unit });
const heights = ['top', 'middle', 'bottom'];
const on = (axis: string, ...values: readonly number[]): readonly RoundReading[] =>
  values.map((value, i) => ({ height: heights[i] ?? `${i}`, axis, value: of(value) }));

/** T7-014, YAN: a diesel's service manual, roundness and cylindricity of a bore. */
const readings = [...on('along', 88.012, 88.01, 88.006), ...on('across', 88.004, 88.003, 88.004)];

describe('roundReadings of a bore', () => {
  const bore = roundReadings({
    of: 'bore',
    readings,
    limits: { low: of(88), high: of(88.012) },
    ovalityLimit: of(0.03),
    taperLimit: of(0.005),
  });

  it('gives ovality and taper', () => {
    expect(bore.ovality?.value).toBeCloseTo(0.008, 12);
    expect(bore.taper?.value).toBeCloseTo(0.006, 12);
  });

  it('gives mean, least and most', () => {
    expect([bore.least.value, bore.most.value]).toEqual([88.003, 88.012]);
    // Worked by hand: (12 + 10 + 6 + 4 + 3 + 4)/6 = 6.5 µm over 88.
    expect(bore.mean.value).toBeCloseTo(88.0065, 10);
  });

  it('judges size, ovality and taper each, and answers with the worst', () => {
    expect(bore.parts.map(({ of: part, verdict }) => [part, verdict])).toEqual([
      ['size', 'pass'],
      ['ovality', 'pass'],
      ['taper', 'fail'],
    ]);
    expect(bore.verdict).toBe('fail');
    expect(bore.reason).toContain('Taper: 0.006');
    expect([bore.worstHeight, bore.worstAxis]).toEqual(['top', 'along']);
  });

  it('takes √2 of the uncertainty for what two readings make', () => {
    // 0.008 + √2 × 0.0015 = 0.010 12: within 0.010 only by the uncertainty of one reading.
    const judge = (uncertainty: number) =>
      roundReadings({ of: 'bore', readings, ovalityLimit: of(0.01), uncertainty: of(uncertainty) }).verdict;
    expect(judge(0.0014)).toBe('pass');
    expect(judge(0.0015)).toBe('doubtful');
  });

  it('is not judged without limits, and names the place where it is worn', () => {
    const plain = roundReadings({ of: 'bore', readings });
    expect(plain.verdict).toBe('not-judged');
    expect(plain.parts).toEqual([]);
    expect([plain.worstHeight, plain.worstAxis]).toEqual(['top', 'along']);
    const journal = roundReadings({ of: 'journal', readings });
    expect([journal.worstHeight, journal.worstAxis]).toEqual(['middle', 'across']);
  });

  it('says that two points do not show lobing', () => {
    expect(bore.cautions[0]).toContain('lobing');
  });

  it('does not judge an ovality of one axis, though the size is good', () => {
    const one = roundReadings({
      of: 'bore',
      readings: on('along', 88.01, 88.01),
      limits: { high: of(88.02) },
      ovalityLimit: of(0.01),
    });
    expect(one.ovality).toBeNull();
    expect(one.verdict).toBe('not-judged');
    expect(one.cautions.join(' ')).toContain('ovality does not show');
  });

  it('judges readings in several units by one', () => {
    // 0.002 in = 0.0508 mm (T1-019).
    const mixed = [
      { height: 'top', axis: 'a', value: of(2, 'in') },
      { height: 'top', axis: 'b', value: of(50.8508, 'mm') },
    ];
    const answer = roundReadings({ of: 'bore', readings: mixed, ovalityLimit: of(2, 'thou') });
    expect(answer.ovality?.unit).toBe('in');
    expect(answer.ovality?.value).toBeCloseTo(0.002, 10);
    expect(answer.verdict).toBe('pass');
  });
});

describe('roundReadings of shells', () => {
  const shell = [...on('upright', 50.04, 50.041), ...on('at the split', 50.07, 50.072)];
  const request: RoundReadingsRequest = {
    of: 'shell',
    readings: shell,
    limits: { low: of(50.03), high: of(50.05) },
    capTorqued: true,
  };

  it('leaves out the split, where they are relieved', () => {
    const answer = roundReadings({ ...request, splitAxis: 'at the split' });
    expect(answer.verdict).toBe('pass');
    expect(answer.most.value).toBe(50.041);
    expect(answer.ovality).toBeNull();
  });

  it('judges the axis at 90° alone where it is named', () => {
    const slanting = { ...request, readings: [...shell, ...on('slanting', 50.06)] };
    expect(roundReadings({ ...slanting, splitAxis: 'at the split' }).verdict).toBe('fail');
    expect(roundReadings({ ...slanting, judgedAxis: 'upright' }).verdict).toBe('pass');
  });

  it('does not guess the split', () => {
    const answer = roundReadings(request);
    expect(answer.verdict).toBe('not-judged');
    expect(answer.reason).toContain('at 90°');
  });

  it('is not judged with the cap slack, and says so where nothing was said', () => {
    const loose = roundReadings({ ...request, splitAxis: 'at the split', capTorqued: false });
    expect(loose.verdict).toBe('not-judged');
    const silent = roundReadings({ ...request, splitAxis: 'at the split', capTorqued: undefined });
    expect(silent.verdict).toBe('pass');
    expect(silent.cautions.join(' ')).toContain('with the cap torqued');
  });
});

it('never passes a bore with a reading within the uncertainty of a limit', () => {
  const value = fc.double({ min: 87.9, max: 88.1, noNaN: true });
  fc.assert(
    fc.property(
      fc.array(value, { minLength: 1, maxLength: 6 }),
      fc.double({ min: 0, max: 0.02, noNaN: true }),
      (values, half) => {
        const { verdict } = roundReadings({
          of: 'bore',
          readings: values.map((one, i) => ({ height: `${i}`, axis: 'along', value: of(one) })),
          limits: { low: of(87.95), high: of(88.05) },
          uncertainty: of(half),
        });
        const clear = Math.min(...values.map((one) => Math.min(one - 87.95, 88.05 - one)));
        if (clear < half - 1e-9) expect(verdict).not.toBe('pass');
        if (clear < -half - 1e-9) expect(verdict).toBe('fail');
      },
    ),
  );
});

it.each<[string, unknown]>([
  ['request', 7],
  ['of', { of: 'tunnel', readings }],
  ['readings', { of: 'bore', readings: [] }],
  ['readings', { of: 'bore', readings: Array.from({ length: 5000 }, () => readings[0]) }],
  ['readings[0].height', { of: 'bore', readings: [{ height: 'x'.repeat(1e6), axis: 'a', value: of(1) }] }],
  ['readings[0].value.value', { of: 'bore', readings: [{ height: 'a', axis: 'a', value: of(-1) }] }],
  ['readings[0].value.unit', { of: 'bore', readings: [{ height: 'a', axis: 'a', value: of(1, 'N') }] }],
  ['readings[1]', { of: 'bore', readings: [readings[0], readings[0]] }],
  ['limits.low', { of: 'bore', readings, limits: { low: of(2), high: of(1) } }],
  ['limits.high.unit', { of: 'bore', readings, limits: { high: of(1, 'bar') } }],
  ['ovalityLimit.value', { of: 'bore', readings, ovalityLimit: of(-1) }],
  ['uncertainty.value', { of: 'bore', readings, uncertainty: of(Infinity) }],
  ['splitAxis', { of: 'shell', readings, splitAxis: 'upright' }],
  ['splitAxis', { of: 'shell', readings: on('along', 50), splitAxis: 'along' }],
  ['judgedAxis', { of: 'shell', readings, splitAxis: 'along', judgedAxis: 'along' }],
  ['capTorqued', { of: 'shell', readings, splitAxis: 'along', capTorqued: 'yes' }],
])('is refused on %s', (field, request) => {
  expect(() => roundReadings(request as RoundReadingsRequest)).toThrow(
    expect.objectContaining({ name: 'InputError', field }),
  );
});
