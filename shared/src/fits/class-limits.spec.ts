import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { classLimits } from './class-limits.js';

const limits = (size: number, code: string) => {
  const { lower, upper } = classLimits(size, code, /^[A-Z]/.test(code) ? 'hole' : 'shaft', 'part');
  return [upper, lower];
};

describe('limits of a class', () => {
  // JIS B 0401:1999 (the deviations of ISO 286-2), shaft table of a cutting-tool catalogue, source JIS.
  it.each([
    [2, 'g6', -2, -8],
    [2, 'k6', 6, 0],
    [5, 'e8', -20, -38],
    [5, 'r6', 23, 15],
    [8, 'js7', 7.5, -7.5],
    [8, 'm5', 12, 6],
    [14, 'd9', -50, -93],
    [14, 's6', 39, 28],
    [24, 'f7', -20, -41],
    [24, 'n6', 28, 15],
    [40, 'p6', 42, 26],
    [40, 'm6', 25, 9],
    [60, 'r6', 60, 41],
    [60, 'k5', 15, 2],
    [60, 's6', 72, 53],
    [80, 'r6', 62, 43],
  ] as const)('%d mm shaft %s', (size, code, upper, lower) => {
    expect(limits(size, code)).toEqual([upper, lower]);
  });

  // Hole tables of a mould-base catalogue of 2020, technical reference pp. 281 and 287.
  it.each([
    [2, 'K7', 0, -10],
    [2, 'N8', -4, -18],
    [2, 'R7', -10, -20],
    [5, 'D10', 78, 30],
    [5, 'K8', 5, -13],
    [5, 'R7', -11, -23],
    [8, 'M8', 1, -21],
    [14, 'K6', 2, -9],
    [14, 'JS6', 5.5, -5.5],
    [24, 'N8', -3, -36],
    [24, 'E9', 92, 40],
    [40, 'K7', 7, -18],
    [40, 'R7', -25, -50],
    [60, 'M8', 5, -41],
    [65, 'R7', -30, -60],
    [70, 'R7', -32, -62],
    [80, 'H10', 120, 0],
    [110, 'N6', -16, -38],
    [110, 'R7', -41, -76],
    [150, 'K8', 20, -43],
    [170, 'R7', -53, -93],
    [200, 'N6', -22, -51],
    [250, 'R7', -67, -113],
    [200, 'H11', 290, 0],
    // T5-041 (DIN ISO 286 extract); P8 has the same upper limit, ISO 286-2:2010 (from memory).
    [5, 'P9', -12, -42],
    [5, 'P8', -12, -30],
  ] as const)('%d mm hole %s', (size, code, upper, lower) => {
    expect(limits(size, code)).toEqual([upper, lower]);
  });

  it('puts the end of a band into the band', () => {
    // IT7 is 18 µm over 10 to 18 mm and 21 µm over 18 to 30 mm (T5-005, T5-007).
    expect(limits(18, 'H7')).toEqual([18, 0]);
    expect(limits(18.001, 'H7')).toEqual([21, 0]);
  });

  it('mirrors the loose letters: hole D to H over nominal as shaft d to h under it', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 1, max: 250, noNaN: true }),
        fc.constantFrom('d', 'e', 'f', 'g', 'h', 'js'),
        fc.integer({ min: 5, max: 11 }),
        (size, letter, grade) => {
          const [shaftUpper = NaN, shaftLower = NaN] = limits(size, `${letter}${grade}`);
          const [upper, lower] = limits(size, `${letter.toUpperCase()}${grade}`);
          expect(upper).toBeCloseTo(-shaftLower, 9);
          expect(lower).toBeCloseTo(-shaftUpper, 9);
        },
      ),
    );
  });
});
