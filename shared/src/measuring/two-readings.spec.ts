import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { TwoReadingsRequest } from '../contracts/calculations.js';
import type { Quantity, Unit } from '../contracts/quantity.js';
import { twoReadings } from './two-readings.js';

const reading = (value: number, uncertainty: number, unit: Unit) => ({
  value: { value, unit },
  uncertainty: { value: uncertainty, unit },
});
const ask = (request: unknown) => twoReadings(request as TwoReadingsRequest);

describe('twoReadings', () => {
  it('scales with the difference as the NIST reference page prints it', () => {
    // T9-001, NIST Dataplot reference manual, ISO 13528 En score: En per unit of difference is 65.5, where
    // √(U₁² + U₂²) = 0.015267 is implied by its rows.
    const half = 0.015267 / Math.SQRT2;
    const en = (difference: number) =>
      twoReadings({ first: reading(1 + difference, half, 'mm'), second: reading(1, half, 'mm') }).en;
    expect(en(0.006)).toBeCloseTo(0.393, 3);
    expect(en(-0.004)).toBeCloseTo(-0.262, 3);
    expect(en(-0.002)).toBeCloseTo(-0.131, 3);
  });

  it('agrees on 27.0 and 28.1 lbf·ft at 4 % each', () => {
    // T9-002, ISO 13528 En score page and a proficiency provider's formula: −0.705 682 855 059.
    const answer = twoReadings({
      first: reading(27, 1.08, 'lbf·ft'),
      second: reading(28.1, 1.124, 'lbf·ft'),
    });
    expect(answer.en).toBeCloseTo(-0.7056828550594477, 12);
    expect(answer.verdict).toBe('pass');
    expect(answer.reason.replaceAll('\u2009', ' ')).toBe(
      '27.0 lbf·ft and 28.1 lbf·ft agree: they are 1.1 lbf·ft apart, and the two tools may differ by 1.56 lbf·ft (En = −0.71; up to 1 either way agrees).',
    );
  });

  it('counts exactly 1 as agreeing, and a little more not', () => {
    // T9-004: 10.005 against 10.000, U 0.004 and 0.003.
    const answer = (value: number) =>
      twoReadings({ first: reading(value, 0.004, 'mm'), second: reading(10, 0.003, 'mm') });
    expect(answer(10.005).en).toBeCloseTo(1, 9);
    expect(answer(10.005).verdict).toBe('pass');
    expect(answer(10.00501).verdict).toBe('fail');
    expect(answer(10.00501).reason).toContain('En = 1.002;');
  });

  it('compares readings in different units', () => {
    // 0.002 in = 0.0508 mm (T1-019): the same size, so En is 0.
    const answer = twoReadings({
      first: { value: { value: 0.0508, unit: 'mm' }, uncertainty: { value: 2, unit: 'µm' } },
      second: { value: { value: 0.002, unit: 'in' }, uncertainty: { value: 0.1, unit: 'thou' } },
    });
    expect(answer.en).toBeCloseTo(0, 9);
    expect(answer.verdict).toBe('pass');
  });

  it('takes the uncertainty of a temperature as an interval', () => {
    // A difference of 1.8 °F is 1 °C: En = 3/√(1 + 1), worked by hand.
    const answer = twoReadings({
      first: { value: { value: 93, unit: '°C' }, uncertainty: { value: 1, unit: 'K' } },
      second: { value: { value: 90, unit: '°C' }, uncertainty: { value: 1.8, unit: '°F' } },
    });
    expect(answer.en).toBeCloseTo(3 / Math.SQRT2, 9);
    expect(answer.verdict).toBe('fail');
    expect(answer.reason).toContain('do not agree');
  });

  const good = reading(1, 0.1, 'mm');
  it.each<[string, unknown, string]>([
    ['nothing', null, 'request'],
    ['no second', { first: good }, 'second'],
    ['no uncertainty', { first: good, second: { value: good.value } }, 'second.uncertainty'],
    ['another kind', { first: good, second: reading(1, 0.1, 'N·m') }, 'second.value.unit'],
    ['not a number', { first: reading(NaN, 0.1, 'mm'), second: good }, 'first.value.value'],
    ['infinity', { first: good, second: reading(1, Infinity, 'mm') }, 'second.uncertainty.value'],
    ['a negative uncertainty', { first: reading(1, -1, 'mm'), second: good }, 'first.uncertainty.value'],
    [
      'no uncertainty at all',
      { first: reading(1, 0, 'mm'), second: reading(2, 0, 'mm') },
      'first.uncertainty.value',
    ],
    [
      'one equal to nothing',
      { first: reading(1, 0, 'mm'), second: reading(1, 0, 'mm') },
      'first.uncertainty.value',
    ],
    [
      'one beneath division',
      { first: reading(1, 5e-324, 'mm'), second: reading(9, 0, 'mm') },
      'first.uncertainty.value',
    ],
  ])('refuses %s', (_what, request, field) => {
    expect(() => ask(request)).toThrow(expect.objectContaining({ name: 'InputError', field }));
  });

  it('is the same whoever reads first, but for the sign', () => {
    const figure = fc.double({ min: 0, max: 500, noNaN: true });
    const half = fc.double({ min: 0.01, max: 20, noNaN: true });
    const one = fc
      .record({ value: figure, uncertainty: half })
      .map(({ value, uncertainty }) => reading(value, uncertainty, 'N·m'));
    fc.assert(
      fc.property(one, one, (first, second) => {
        const [there, back] = [twoReadings({ first, second }), twoReadings({ first: second, second: first })];
        expect(there.en + back.en).toBeCloseTo(0, 9);
        expect(there.verdict).toBe(back.verdict);
        expect(there.verdict).toBe(Math.abs(there.en) <= 1 + 1e-9 ? 'pass' : 'fail');
      }),
    );
  });

  it('answers a quantity with an alias as its unit', () => {
    const alias = { value: 27, unit: 'ft-lb' as Quantity['unit'] };
    const side = { value: alias, uncertainty: { ...alias, value: 1 } };
    expect(twoReadings({ first: side, second: side })).toMatchObject({ verdict: 'pass', en: 0 });
  });
});
