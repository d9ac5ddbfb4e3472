import { describe, expect, it } from 'vitest';
import { readAngles, readIntervals, readNumber, readOrder } from './read-texts.js';

// How the trade writes orders and angles: common practice, no source.
describe('reading what is typed about a cap', () => {
  it.each(['1-3-4-2', '1 3 4 2', '1,3,4,2', ' 1–3–4–2 ', '1 - 3 - 4 - 2'])('reads the order %s', (text) => {
    expect(readOrder(text)).toEqual([1, 3, 4, 2]);
  });

  it('takes cylinders that are not all numbered for names', () => {
    expect(readOrder('L1-R1-L2-R2')).toEqual(['L1', 'R1', 'L2', 'R2']);
  });

  it('reads nothing as no cylinders', () => {
    expect(readOrder('  ')).toEqual([]);
  });

  it('reads numbers with a point, a comma, a sign or a degree sign', () => {
    expect(['51.4', '51,4', '-10', '45°', ' 8 '].map(readNumber)).toEqual([51.4, 51.4, -10, 45, 8]);
  });

  it.each(['', 'ten', '1-3', '4.', '1e3'])('takes “%s” for no number', (text) => {
    expect(readNumber(text)).toBeNull();
  });

  it('reads lists of angles, negative ones too, and intervals with dashes', () => {
    expect(readAngles('-45, 45; 135 225.5')).toEqual([-45, 45, 135, 225.5]);
    expect(readIntervals('90-150-90-150')).toEqual([90, 150, 90, 150]);
  });

  it('reads no list that has something else in it', () => {
    expect(readAngles('45, top')).toBeNull();
    expect(readIntervals('90-x')).toBeNull();
  });
});
