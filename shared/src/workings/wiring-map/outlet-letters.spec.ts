import { describe, expect, it } from 'vitest';
import { outletLetters } from './outlet-letters.js';

describe('letters of the outlets beside the posts', () => {
  // The side-outlet cap as the design draws it: A and B down the left, C and D down the right.
  it('go down the left side, then down the right', () => {
    expect(outletLetters([45, 135, 225, 315])).toEqual(['C', 'D', 'B', 'A']);
  });

  it('are all different where posts stand on the middle line', () => {
    expect(new Set(outletLetters([0, 60, 120, 180, 240, 300])).size).toBe(6);
  });

  it('do not depend on how far round the angle was written', () => {
    expect(outletLetters([-45, 495])).toEqual(outletLetters([315, 135]));
  });
});
