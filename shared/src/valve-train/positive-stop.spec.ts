import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { PositiveStopRequest } from '../contracts/valve-figures.js';
import { positiveStop } from './positive-stop.js';

describe('true TDC from a positive stop', () => {
  it.each([
    // T3-019, DEF: circular mean of 350° and 14° is 2°.
    [350, 14, 2, -2, 12],
    // T3-016, DEG: stop readings 36.75° before and 35.25° after: the pointer is 0.75° out.
    [360 - 36.75, 35.25, 359.25, 0.75, 36],
    // By symmetry, from the definition: the wheel's zero is right.
    [330, 30, 0, 0, 30],
    [80, 160, 120, -120, 40],
    [230, 290, 260, 100, 30],
    [135, 225, 180, 180, 45],
  ])('forward %d°, back %d°', (forward, back, tdc, correction, half) => {
    const answer = positiveStop({ forward, back });
    expect(answer.tdc).toBeCloseTo(tdc, 9);
    expect(answer.correction).toBeCloseTo(correction, 9);
    expect(answer.half).toBeCloseTo(half, 9);
  });

  it('finds a TDC that is simulated, wherever the wheel’s zero is', () => {
    fc.assert(
      fc.property(fc.integer({ min: 0, max: 359 }), fc.integer({ min: 1, max: 90 }), (zero, half) => {
        const shows = (crank: number): number => (crank + zero + 720) % 360;
        const answer = positiveStop({ forward: shows(-half), back: shows(half) });
        expect(answer).toEqual({ tdc: zero, correction: zero < 180 ? 0 - zero : 360 - zero, half });
      }),
    );
  });
});

it.each([
  ['request', undefined],
  ['forward', { back: 14 }],
  ['forward', { forward: -1, back: 14 }],
  ['forward', { forward: NaN, back: 14 }],
  ['back', { forward: 350, back: 361 }],
  ['back', { forward: 350, back: '14' }],
  ['back', { forward: 350, back: 350 }],
  ['back', { forward: 0, back: 360 }],
  // Exchanged: the stop would stand 168° from TDC.
  ['back', { forward: 14, back: 350 }],
])('refuses by %s', (field, request) => {
  expect(() => positiveStop(request as PositiveStopRequest)).toThrow(expect.objectContaining({ field }));
});
