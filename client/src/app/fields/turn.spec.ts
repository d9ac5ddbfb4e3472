import { describe, expect, it } from 'vitest';
import { turned } from './turn';

// Geometry: two turns of the crank are one round of the cycle.
const cycle = { from: 0, to: 720 };

describe('turning the crank', () => {
  it.each([
    [0, 10, 10],
    [10, -1, 9],
    [715, 10, 5],
    [5, -10, 715],
    [719, 1, 720],
    [720, 1, 1],
    [0, -1, 719],
    [12.5, 1, 13.5],
    [0.1, 0.2, 0.3],
  ])('from %d° by %d° comes to %d°', (angle, by, on) => {
    expect(turned(angle, by, cycle)).toBe(on);
  });

  it('goes round below nought too', () => {
    expect(turned(175, 10, { from: -180, to: 180 })).toBe(-175);
  });
});
