import { describe, expect, it } from 'vitest';
import { ceilTo, decimalsOf, floorTo, roundTo } from './round.js';

// Rounding by hand, on the decimal digits as they are written.
describe('rounding', () => {
  it('reads the decimal digits, not the binary ones', () => {
    expect(roundTo(1.005, 2)).toBe(1.01);
    expect(floorTo(0.29, 2)).toBe(0.29);
    expect(ceilTo(1.1, 1)).toBe(1.1);
  });

  it('goes the way it says on both sides of zero', () => {
    expect([floorTo(-1.21, 1), ceilTo(-1.29, 1), roundTo(-1.25, 1)]).toEqual([-1.3, -1.2, -1.3]);
  });

  it('copes with numbers that print with an exponent', () => {
    expect([roundTo(1.26e-7, 8), ceilTo(1e-9, 3), roundTo(1.5e21, 0)]).toEqual([1.3e-7, 0.001, 1.5e21]);
  });
});

describe('decimalsOf', () => {
  it.each([
    [27, 0],
    [55.4, 1],
    [0.0015, 4],
    [1.5e-7, 8],
    [1e21, 0],
  ])('%d has %d', (value, decimals) => {
    expect(decimalsOf(value)).toBe(decimals);
  });
});
