import { describe, expect, it } from 'vitest';
import type { RoundReading, RunningClearanceRequest } from '../contracts/measuring.js';
import type { Quantity, Unit } from '../contracts/quantity.js';
import { runningClearance } from './running-clearance.js';

const of = (value: number, unit: Unit = 'mm'): Quantity => ({ value, unit });
const at = (axis: string, ...values: readonly number[]): readonly RoundReading[] =>
  values.map((value, i) => ({ height: `${i + 1}`, axis, value: of(value) }));
const hole = at('upright', 50.04, 50.05);
const shaft = at('upright', 49.99, 50);

/** Worked by hand. */
describe('runningClearance', () => {
  const limits = { low: of(0.04), high: of(0.06) };

  it('is the smallest hole less the largest shaft, and the other way round', () => {
    const answer = runningClearance({ hole, shaft, limits });
    expect(answer.least.value).toBeCloseTo(0.04, 12);
    expect(answer.mean.value).toBeCloseTo(0.05, 12);
    expect(answer.most.value).toBeCloseTo(0.06, 12);
    expect(answer.verdict).toBe('pass');
  });

  it('takes the uncertainty of both readings', () => {
    // √2 × 0.003 = 0.004 24 of room at the least: 0.045 − 0.040 = 0.005.
    const judge = (uncertainty: number) =>
      runningClearance({
        ...{ hole: at('a', 50.05), shaft: at('a', 50), limits: { low: of(0.045) } },
        uncertainty: of(uncertainty),
      }).verdict;
    expect(judge(0.0035)).toBe('pass');
    expect(judge(0.0036)).toBe('doubtful');
  });

  it('fails at the least and at the most', () => {
    const small = runningClearance({ hole, shaft, limits: { low: of(0.041) } });
    expect(small.verdict).toBe('fail');
    expect(small.reason).toContain('Least:');
    expect(runningClearance({ hole, shaft, limits: { high: of(0.059) } }).reason).toContain('Most:');
  });

  it('answers in the unit of the limits', () => {
    // 2 thou = 0.0508 mm (T1-019).
    const answer = runningClearance({
      ...{ hole: at('a', 50.0508), shaft: at('a', 50) },
      limits: { low: of(1, 'thou'), high: of(2, 'thou') },
    });
    expect(answer.least.unit).toBe('thou');
    expect(answer.least.value).toBeCloseTo(2, 9);
    expect(answer.verdict).toBe('pass');
  });

  it('leaves out the split', () => {
    const relieved = [...hole, ...at('at the split', 50.09)];
    const answer = runningClearance({ hole: relieved, shaft, limits, splitAxis: 'at the split' });
    expect(answer.verdict).toBe('pass');
    expect(answer.most.value).toBeCloseTo(0.06, 12);
    expect(runningClearance({ hole: relieved, shaft, limits }).verdict).toBe('fail');
  });

  it('fails a shaft that does not go in, with no limits too', () => {
    expect(runningClearance({ hole: at('a', 50), shaft: at('a', 50.01) }).verdict).toBe('fail');
    expect(runningClearance({ hole, shaft }).verdict).toBe('not-judged');
    expect(
      runningClearance({ hole: at('a', 50.001), shaft: at('a', 50), uncertainty: of(0.005) }).verdict,
    ).toBe('doubtful');
  });

  it('calls the tool too coarse for the band', () => {
    const { verdict, reason } = runningClearance({ hole, shaft, limits, uncertainty: of(0.01) });
    expect(verdict).toBe('doubtful');
    expect(reason).toContain('too coarse');
  });

  it.each<[string, unknown]>([
    ['hole', { shaft }],
    ['shaft', { hole, shaft: [] }],
    ['shaft[0].value.unit', { hole, shaft: [{ height: 'a', axis: 'a', value: of(1, 'kg') }] }],
    ['splitAxis', { hole, shaft, splitAxis: 'slanting' }],
    ['limits.low.value', { hole, shaft, limits: { low: of(-1) } }],
  ])('is refused on %s', (field, request) => {
    expect(() => runningClearance(request as RunningClearanceRequest)).toThrow(
      expect.objectContaining({ name: 'InputError', field }),
    );
  });
});
