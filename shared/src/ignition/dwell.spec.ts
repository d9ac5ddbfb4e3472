import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { DwellRequest } from '../contracts/ignition-checks.js';
import { dwell } from './dwell.js';

describe('dwell', () => {
  it('is 4 of 6 ms for 60° of 90° on a four at 5000 rev/min', () => {
    // T2-059 and T2-060, DW1: prints 6 ms and 4 ms.
    const answer = dwell({ cylinders: 4, dwell: 60, crankSpeed: 5000 });
    expect(answer.betweenSparks?.value).toBeCloseTo(0.006, 12);
    expect(answer.closedFor?.value).toBeCloseTo(0.004, 12);
  });

  it('leaves the rest of the interval open', () => {
    // T2-064, DW3: prints 38°; T2-062, DW2: prints 56 %.
    expect(dwell({ cylinders: 4, dwell: 52 }).openAngle).toBe(38);
    expect(dwell({ cylinders: 4, dwell: 50 }).share).toBeCloseTo(0.5555555555555556, 12);
    expect(dwell({ cylinders: 4, dwell: 50 })).not.toHaveProperty('betweenSparks');
  });

  it('comes twice as often on a two-stroke, whose distributor turns at crank speed', () => {
    const four = dwell({ cylinders: 4, dwell: 60, crankSpeed: 3000 });
    const two = dwell({ cylinders: 4, dwell: 60, crankSpeed: 3000, strokesPerCycle: 2 });
    expect(two.interval).toBe(four.interval);
    expect(two.betweenSparks?.value).toBeCloseTo((four.betweenSparks?.value ?? NaN) / 2, 12);
  });

  it('fills the turn: closed and open of every cylinder are 360°, and the time that of a cycle', () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 1, max: 16 }),
        fc.double({ min: 0.01, max: 0.99, noNaN: true }),
        fc.integer({ min: 1, max: 9000 }),
        (cylinders, share, crankSpeed) => {
          const closed = (share * 360) / cylinders;
          const answer = dwell({ cylinders, dwell: closed, crankSpeed });
          expect(cylinders * (closed + answer.openAngle)).toBeCloseTo(360, 9);
          expect(answer.share).toBeCloseTo(share, 9);
          // Two turns of the crank to a cycle.
          expect(((answer.betweenSparks?.value ?? NaN) * cylinders * crankSpeed) / 60).toBeCloseTo(2, 9);
        },
      ),
    );
  });
});

it.each([
  ['cylinders', { cylinders: 0, dwell: 1 }],
  ['cylinders', { cylinders: 1000, dwell: 0.1 }],
  ['cylinders', { cylinders: 3.5, dwell: 1 }],
  ['dwell', { cylinders: 4, dwell: 0 }],
  ['dwell', { cylinders: 4, dwell: 90 }],
  ['dwell', { cylinders: 4, dwell: NaN }],
  ['crankSpeed', { cylinders: 4, dwell: 60, crankSpeed: 0 }],
  ['crankSpeed', { cylinders: 4, dwell: 60, crankSpeed: -5 }],
  ['crankSpeed', { cylinders: 4, dwell: 60, crankSpeed: 1e-308 }],
  ['strokesPerCycle', { cylinders: 4, dwell: 60, strokesPerCycle: 6 }],
])('refuses by %s', (field, request) => {
  expect(() => dwell(request as DwellRequest)).toThrow(expect.objectContaining({ field }));
});
