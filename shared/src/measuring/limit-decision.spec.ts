import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { LimitDecisionRequest } from '../contracts/calculations.js';
import type { Quantity, Unit } from '../contracts/quantity.js';
import { roundInwards } from '../quantities/print.js';
import { limitDecision } from './limit-decision.js';

const of =
  (unit: Unit) =>
  (value: number): Quantity => ({ value, unit });
const Nm = of('N·m');
const mm = of('mm');
const spaced = (text: string): string => text.replaceAll('\u2009', ' ');
const ask = (request: unknown) => limitDecision(request as LimitDecisionRequest);

/**
 * The guard band taken as the whole expanded uncertainty, on both sides of a limit (ILAC-G8:09/2019, from
 * memory): good from limit − U inwards, bad beyond limit + U. Worked by hand.
 */
describe('limitDecision at one limit of 57 N·m, tool ± 1.1 N·m', () => {
  it.each([
    [55.4, 'pass'],
    [55.9, 'pass'],
    [55.95, 'doubtful'],
    [57, 'doubtful'],
    [58.1, 'doubtful'],
    [58.15, 'fail'],
    [200, 'fail'],
  ])('%d N·m: %s', (value, verdict) => {
    expect(limitDecision({ value: Nm(value), high: Nm(57), uncertainty: Nm(1.1) }).verdict).toBe(verdict);
  });

  it('says the margin, the limit, the tool and the rule', () => {
    const { reason } = limitDecision({ value: Nm(55.4), high: Nm(57), uncertainty: Nm(1.1) });
    expect(spaced(reason)).toContain(
      "55.4 N·m is 0.5 N·m inside the limit of 57.0 N·m, after the tool's ±1.1 N·m.",
    );
    expect(reason).toContain('Rule: it passes only when clear of the limit');
  });

  it('prints the reading to no more digits than were measured, whatever the tool’s share of it comes to', () => {
    // 4 % of 27.4 is 1.096, by hand.
    const { reason } = limitDecision({ value: Nm(27.4), high: Nm(29), uncertainty: Nm(1.096) });
    expect(spaced(reason)).toMatch(/^27\.4 N·m is 0\.504 N·m inside the limit of 29\.000 N·m/);
  });

  it('says how far a reading is over', () => {
    expect(spaced(limitDecision({ value: Nm(58.2), high: Nm(57), uncertainty: Nm(1.1) }).reason)).toContain(
      "58.2 N·m is 1.2 N·m over the limit of 57.0 N·m, more than the tool's ±1.1 N·m can explain.",
    );
  });
});

describe('limitDecision between two limits', () => {
  // GB1, a metrology note of 2024: 10 ± 1 judged with U 0.2 leaves 9.2 to 10.8 to accept.
  it.each([
    [9.2, 'pass'],
    [10.8, 'pass'],
    [9.19, 'doubtful'],
    [10.81, 'doubtful'],
    [8.79, 'fail'],
    [11.21, 'fail'],
  ])('10 ± 1 with U 0.2: %d is %s', (value, verdict) => {
    const request = { value: mm(value), low: mm(9), high: mm(11), uncertainty: mm(0.2) };
    expect(limitDecision(request).verdict).toBe(verdict);
  });

  it('names the limit that is nearer', () => {
    const { reason } = limitDecision({ value: mm(8.5), low: mm(9), high: mm(11), uncertainty: mm(0.2) });
    expect(spaced(reason)).toContain('8.5 mm is 0.5 mm under the limit of 9.0 mm');
  });

  it('calls the tool too coarse, and nothing a fail, when no room is left to pass', () => {
    for (const value of [40, 55.5, 200]) {
      const answer = limitDecision({ value: Nm(value), low: Nm(54), high: Nm(57), uncertainty: Nm(1.6) });
      expect(answer.verdict).toBe('doubtful');
      expect(spaced(answer.reason)).toContain('The tool is too coarse: its ±1.6 N·m leaves no room');
    }
  });

  it('still passes the one reading in the middle of a band of just twice the uncertainty', () => {
    expect(limitDecision({ value: Nm(55.5), low: Nm(54), high: Nm(57), uncertainty: Nm(1.5) }).verdict).toBe(
      'pass',
    );
  });

  it('says so when the reading is outside even as read by a tool too coarse', () => {
    const { reason } = limitDecision({ value: Nm(200), low: Nm(54), high: Nm(57), uncertainty: Nm(2) });
    expect(spaced(reason)).toContain('200 N·m is 143 N·m over the limit of 57 N·m as read.');
  });
});

describe('limitDecision without uncertainty or limits', () => {
  it('gives a limit to the good side', () => {
    expect(limitDecision({ value: mm(0.05), low: mm(0.05), high: mm(0.1) }).verdict).toBe('pass');
    expect(limitDecision({ value: mm(0.1), low: mm(0.05), high: mm(0.1) }).verdict).toBe('pass');
    expect(limitDecision({ value: mm(0.101), low: mm(0.05), high: mm(0.1) }).verdict).toBe('fail');
  });

  it('says that no uncertainty was given, or that it was given as nothing', () => {
    expect(limitDecision({ value: mm(0.05), high: mm(0.1) }).reason).toContain('no uncertainty was given');
    expect(limitDecision({ value: mm(0.05), high: mm(0.1), uncertainty: mm(0) }).reason).toContain(
      'given as nothing',
    );
  });

  it('does not judge without a limit', () => {
    expect(limitDecision({ value: mm(0.05), uncertainty: mm(0.01) }).verdict).toBe('not-judged');
  });
});

describe('limitDecision over several units', () => {
  it('finds a figure on its own limit in another unit', () => {
    // T1-008: 27 lbf·ft = 36.607 084 604 947 810 8 N·m (NIST SP 811 App. B.8).
    const limit = { value: 27, unit: 'lbf·ft' } as const;
    expect(limitDecision({ value: Nm(36.60708460494781), high: limit }).verdict).toBe('pass');
    expect(limitDecision({ value: Nm(36.60708460494781), low: limit }).verdict).toBe('pass');
    expect(limitDecision({ value: Nm(36.607085), high: limit }).verdict).toBe('fail');
  });

  it('prints the limit in the unit of the reading, inwards, and as it was given', () => {
    // T1-019: 0.002 in = 0.0508 mm.
    const { reason } = limitDecision({ value: mm(0.05), high: { value: 0.002, unit: 'in' } });
    expect(spaced(reason)).toContain('0.05 mm is 0.0008 mm inside the limit of 0.0508 mm (0.002 in).');
  });

  it('takes the uncertainty of a temperature as an interval', () => {
    // A difference of 1.8 °F is 1 °C (T1-025 divided by 80).
    const request = (value: number) => ({
      value: { value, unit: '°C' as const },
      high: { value: 90, unit: '°C' as const },
      uncertainty: { value: 1.8, unit: '°F' as const },
    });
    expect(limitDecision(request(88.9)).verdict).toBe('pass');
    expect(limitDecision(request(89.1)).verdict).toBe('doubtful');
    expect(limitDecision(request(91.1)).verdict).toBe('fail');
  });

  it('judges temperatures and signed gaps below zero', () => {
    expect(
      limitDecision({ value: { value: -10, unit: '°C' }, low: { value: -20, unit: '°C' } }).verdict,
    ).toBe('pass');
    expect(limitDecision({ value: mm(-0.3), low: mm(-0.5), high: mm(0.5) }).verdict).toBe('pass');
  });
});

describe('limitDecision refuses', () => {
  it.each<[string, unknown, string]>([
    ['nothing', undefined, 'request'],
    ['no value', { high: Nm(57) }, 'value'],
    ['not a number', { value: Nm(NaN), high: Nm(57) }, 'value.value'],
    ['infinity', { value: Nm(Infinity), high: Nm(57) }, 'value.value'],
    ['a limit that is not a number', { value: Nm(5), high: Nm(NaN) }, 'high.value'],
    [
      'an infinite uncertainty',
      { value: Nm(5), high: Nm(9), uncertainty: Nm(Infinity) },
      'uncertainty.value',
    ],
    ['a negative torque', { value: Nm(-5), high: Nm(57) }, 'value.value'],
    ['a negative uncertainty', { value: Nm(5), high: Nm(9), uncertainty: Nm(-1) }, 'uncertainty.value'],
    ['a limit of another kind', { value: Nm(5), low: mm(1) }, 'low.unit'],
    ['an uncertainty of another kind', { value: Nm(5), low: Nm(1), uncertainty: mm(1) }, 'uncertainty.unit'],
    ['an unknown unit', { value: { value: 5, unit: 'furlong' } }, 'value.unit'],
    ['low above high', { value: Nm(5), low: Nm(9), high: { value: 1, unit: 'lbf·ft' } }, 'low'],
    ['a limit of null', { value: Nm(5), low: null }, 'low'],
  ])('%s', (_what, request, field) => {
    expect(() => ask(request)).toThrow(expect.objectContaining({ name: 'InputError', field }));
  });
});

describe('limitDecision, whatever the figures', () => {
  const figure = fc.double({ min: 0, max: 500, noNaN: true });
  const torque = fc.record({
    value: figure,
    unit: fc.constantFrom<Unit>('N·m', 'lbf·ft', 'lbf·in', 'kgf·m', 'kgf·cm'),
  });

  it('never passes a reading within the uncertainty of a limit', () => {
    fc.assert(
      fc.property(figure, figure, fc.double({ min: 0, max: 50, noNaN: true }), (value, high, half) => {
        const { verdict } = limitDecision({ value: Nm(value), high: Nm(high), uncertainty: Nm(half) });
        const clear = high - value;
        if (clear < half - 1e-9) expect(verdict).not.toBe('pass');
        if (Math.abs(clear) < half - 1e-9) expect(verdict).toBe('doubtful');
      }),
    );
  });

  it('never fails without uncertainty what it passes with it', () => {
    fc.assert(
      fc.property(torque, torque, torque, (value, low, uncertainty) => {
        const strict = limitDecision({ value, low, uncertainty }).verdict;
        const plain = limitDecision({ value, low }).verdict;
        if (strict === 'pass') expect(plain).toBe('pass');
        if (strict === 'fail') expect(plain).toBe('fail');
      }),
    );
  });

  it('never passes at a limit rounded inwards what fails at the limit as given', () => {
    fc.assert(
      fc.property(torque, torque, fc.nat(3), fc.constantFrom('low', 'high'), (value, limit, digits, side) => {
        const rounded = roundInwards(limit, value.unit, digits, side as 'low' | 'high');
        if (limitDecision({ value, [side]: limit }).verdict === 'fail' && rounded.value >= 0) {
          expect(limitDecision({ value, [side]: rounded }).verdict).toBe('fail');
        }
      }),
      { numRuns: 500 },
    );
  });
});
