import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  anywhere,
  asPairs,
  holds,
  intersection,
  nowhere,
  shifted,
  stretched,
  union,
  windowFrom,
  type Windows,
} from './windows.js';

// Expected values follow from the definition of a closed interval on a circle of 720°.

describe('windows on the cycle', () => {
  it('splits a window that runs over 720°', () => {
    expect(asPairs(windowFrom(-10, 10))).toEqual([
      [0, 10],
      [710, 720],
    ]);
  });

  it('takes 0° and 720° for one point', () => {
    const meeting = intersection(windowFrom(700, 720), windowFrom(0, 10));
    expect(asPairs(meeting)).toEqual([[0, 0]]);
    expect(holds(windowFrom(700, 720), 0)).toBe(true);
    expect(holds(windowFrom(0, 10), 720)).toBe(true);
  });

  it('keeps single points', () => {
    const top = union(windowFrom(0, 0), windowFrom(360, 360));
    expect(asPairs(shifted(top, -360))).toEqual([
      [0, 0],
      [360, 360],
    ]);
    expect(intersection(top, windowFrom(1, 359))).toEqual(nowhere);
  });

  it('becomes the whole circle, and cuts it', () => {
    expect(stretched(windowFrom(0, 300), 210, 210)).toEqual(anywhere);
    expect(union(windowFrom(0, 400), windowFrom(400, 720))).toEqual(anywhere);
    expect(asPairs(intersection(anywhere, windowFrom(650, 800)))).toEqual([
      [0, 80],
      [650, 720],
    ]);
  });

  it('swallows more than one window past 720°', () => {
    const three = union(union(windowFrom(10, 20), windowFrom(30, 40)), windowFrom(500, 510));
    expect(asPairs(union(three, windowFrom(505, 755)))).toEqual([
      [0, 40],
      [500, 720],
    ]);
  });
});

describe('properties', () => {
  const anyWindows = fc
    .array(fc.tuple(fc.integer({ min: -1000, max: 1000 }), fc.integer({ min: 0, max: 800 })), {
      maxLength: 5,
    })
    .map((list) =>
      list.reduce<Windows>((all, [from, length]) => union(all, windowFrom(from, from + length)), nowhere),
    );
  const anyAngle = fc.integer({ min: -1000, max: 2000 });

  it('holds in a union what is in either, in an intersection what is in both', () => {
    fc.assert(
      fc.property(anyWindows, anyWindows, anyAngle, (one, other, angle) => {
        expect(holds(union(one, other), angle)).toBe(holds(one, angle) || holds(other, angle));
        expect(holds(intersection(one, other), angle)).toBe(holds(one, angle) && holds(other, angle));
      }),
    );
  });

  it('carries and stretches every point', () => {
    fc.assert(
      fc.property(anyWindows, anyAngle, fc.nat(400), fc.nat(400), (windows, by, back, on) => {
        expect(holds(shifted(windows, by), 100 + by)).toBe(holds(windows, 100));
        const reachable = Array.from({ length: back + on + 1 }, (_, i) => i - back);
        expect(holds(stretched(windows, back, on), by)).toBe(
          reachable.some((step) => holds(windows, by - step)),
        );
      }),
    );
  });

  it('lies in order within 0–720, apart', () => {
    fc.assert(
      fc.property(anyWindows, (windows) => {
        const ends = asPairs(windows).flat();
        expect(ends.every((end) => end >= 0 && end <= 720)).toBe(true);
        expect(ends).toEqual([...ends].sort((a, b) => a - b));
      }),
    );
  });
});
