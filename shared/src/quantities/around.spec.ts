import fc from 'fast-check';
import { expect, it } from 'vitest';
import { around } from './around.js';

it.each([
  // By definition of an angle round a circle.
  [0, 0],
  [360, 0],
  [-360, 0],
  [-10, 350],
  [725, 5],
  [-1e-17, 0],
])('%d° is %d°', (angle, same) => {
  expect(around(angle)).toBe(same);
});

it('changes an angle by whole turns alone', () => {
  fc.assert(
    fc.property(fc.integer({ min: -100_000, max: 100_000 }), (angle) => {
      const turns = (angle - around(angle)) / 360;
      expect(Number.isInteger(turns)).toBe(true);
      expect(around(angle)).toBeGreaterThanOrEqual(0);
      expect(around(angle)).toBeLessThan(360);
    }),
  );
});
