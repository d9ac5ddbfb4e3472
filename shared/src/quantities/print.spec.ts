import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { units, type Unit } from '../contracts/quantity.js';
import { convert, rescale, toSi } from './convert.js';
import { digitsFor, printNumber, printQuantity, roundInwards } from './print.js';

describe('printNumber', () => {
  // Rounding by hand, a half away from zero.
  it.each([
    [36.60708460494781, 1, '36.6'],
    [2.675, 2, '2.68'],
    [1.005, 2, '1.01'],
    [-5, 0, '−5'],
    [-0.04, 1, '0.0'],
    [27, 2, '27.00'],
    [1e-7, 3, '0.000'],
    [1234567, 0, '1234567'],
    [NaN, 1, '–'],
  ])('prints %d with %d decimals as %s', (value, digits, text) => {
    expect(printNumber(value, digits)).toBe(text);
  });
});

describe('printQuantity', () => {
  it('puts a thin space before the unit', () => {
    expect(printQuantity({ value: 27, unit: 'lbf·ft' })).toBe('27\u2009lbf·ft');
  });

  it('shows six significant digits and no idle zeros unless told', () => {
    // T1-008: 27 lbf·ft = 36.607 084 6 N·m. Rounded by hand.
    expect(printQuantity({ value: 36.60708460494781, unit: 'N·m' })).toBe('36.6071\u2009N·m');
    expect(printQuantity({ value: 100, unit: 'kPa' })).toBe('100\u2009kPa');
    expect(printQuantity({ value: 0, unit: 'mm' })).toBe('0\u2009mm');
    expect(printQuantity({ value: 0.0508, unit: 'mm' }, { digits: 2 })).toBe('0.05\u2009mm');
  });
});

describe('digitsFor', () => {
  // The rule in words: the tool's resolution, or two digits past the tolerance, never more than measured.
  it.each([
    [{ resolution: 0.01 }, 2],
    [{ resolution: 0.5 }, 1],
    [{ resolution: 5 }, 0],
    [{ tolerance: 0.02 }, 4],
    [{ tolerance: 3 }, 2],
    [{ tolerance: 0.02, measured: 2 }, 2],
    [{ tolerance: 3, resolution: 0.2 }, 1],
    [{ tolerance: 3000 }, 0],
    [{}, 3],
  ])('%j needs %d', (basis, digits) => {
    expect(digitsFor(basis)).toBe(digits);
  });
});

describe('roundInwards', () => {
  it('rounds a low limit up and a high limit down', () => {
    // T1-008: 27 lbf·ft = 36.607 084 6 N·m.
    expect(roundInwards({ value: 27, unit: 'lbf·ft' }, 'N·m', 1, 'high').value).toBe(36.6);
    expect(roundInwards({ value: 27, unit: 'lbf·ft' }, 'N·m', 1, 'low').value).toBe(36.7);
  });

  it('keeps a limit that lies on the step', () => {
    // T1-019: 0.002 in = 0.0508 mm.
    expect(roundInwards({ value: 0.002, unit: 'in' }, 'mm', 4, 'high').value).toBe(0.0508);
    expect(roundInwards({ value: 0.002, unit: 'in' }, 'mm', 4, 'low').value).toBe(0.0508);
  });

  it('rounds inwards below zero too', () => {
    // 1 thou = 0.0254 mm, by definition.
    expect(roundInwards({ value: -1, unit: 'thou' }, 'mm', 2, 'low').value).toBe(-0.02);
    expect(roundInwards({ value: -1, unit: 'thou' }, 'mm', 2, 'high').value).toBe(-0.03);
  });

  it('never lets a reading through that the original limit would stop', () => {
    const pair = fc.constantFrom<readonly [Unit, Unit]>(
      ...(
        [units.torque, units.length, units.pressure, units.temperature] as readonly (readonly Unit[])[]
      ).flatMap((list) => list.flatMap((from) => list.map((to) => [from, to] as const))),
    );
    const side = fc.constantFrom('low' as const, 'high' as const);
    const value = fc.double({ min: 0.001, max: 5000, noNaN: true });
    fc.assert(
      fc.property(
        pair,
        side,
        value,
        fc.nat(6),
        fc.double({ min: 0, max: 1, noNaN: true }),
        (two, good, at, digits, more) => {
          const [from, to] = two;
          const limit = { value: at, unit: from };
          const rounded = roundInwards(limit, to, digits, good);
          const inside = good === 'low' ? rounded.value + more : rounded.value - more;
          for (const reading of [rounded, { value: inside, unit: to }]) {
            const beyond = good === 'low' ? toSi(limit) - toSi(reading) : toSi(reading) - toSi(limit);
            expect(beyond).toBeLessThanOrEqual(0);
            const back = rescale(reading, from).value;
            expect(good === 'low' ? at - back : back - at).toBeLessThanOrEqual(0);
          }
          // And it gives away no more than one step.
          const lost = Math.abs(rounded.value - convert(limit, to).value);
          expect(lost).toBeLessThanOrEqual(10 ** -digits * (1 + 1e-9) + Math.abs(rounded.value) * 1e-14);
        },
      ),
      { numRuns: 1000 },
    );
  });
});
