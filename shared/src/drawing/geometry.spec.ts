import { describe, expect, it } from 'vitest';
import { apart, arc, arrowHead, bearing, corners, fold, hatching, polar, ringPiece } from './geometry.js';

const origin = { x: 0, y: 0 };

/** The strokes of a hatching as pairs of ends. */
function strokes(d: string): readonly (readonly [number, number, number, number])[] {
  return [...d.matchAll(/M(\S+?) ([\d.-]+)L(\S+?) ([\d.-]+)/g)].map((m) => [
    ...([Number(m[1]), Number(m[2]), Number(m[3]), Number(m[4])] as const),
  ]);
}

describe('angles', () => {
  it('run clockwise from straight up, y downwards', () => {
    expect(polar(origin, 10, 0)).toEqual({ x: 0, y: -10 });
    expect(polar(origin, 10, 90)).toEqual({ x: 10, y: 0 });
    expect(polar(origin, 10, 180)).toEqual({ x: 0, y: 10 });
    expect(bearing(origin, { x: -1, y: 0 })).toBe(270);
  });

  it('fold and part', () => {
    expect(fold(-90)).toBe(270);
    expect(fold(730, 720)).toBe(10);
    expect(apart(350, 20)).toBe(30);
  });

  it('sweep an arc clockwise for a larger end, and anticlockwise for a smaller', () => {
    expect(arc(origin, 10, 0, 90)).toBe('M0 -10A10 10 0 0 1 10 0');
    expect(arc(origin, 10, 90, 0)).toBe('M10 0A10 10 0 0 0 0 -10');
    expect(arc(origin, 10, 0, 270)).toContain('0 1 1');
  });

  it('point an arrow head', () => {
    const [tip, left, right] = arrowHead(origin, 90, 'line', 9, 2).points;
    expect(tip).toEqual(origin);
    expect([left, right]).toEqual([
      { x: -9, y: -2 },
      { x: -9, y: 2 },
    ]);
  });
});

describe('hatching', () => {
  const square = corners(10, 10, 20, 20);

  it('stays inside its outline and lies at its angle', () => {
    for (const angle of [45, 135] as const) {
      const lines = strokes(hatching(square, angle, 4).d);
      expect(lines.length).toBeGreaterThan(4);
      for (const [x1, y1, x2, y2] of lines) {
        expect(Math.min(x1, y1, x2, y2)).toBeGreaterThanOrEqual(10);
        expect(Math.max(x1, y1, x2, y2)).toBeLessThanOrEqual(30);
        // On the page y runs downwards, so that a stroke which rises to the right has opposite signs.
        expect((y2 - y1) / (x2 - x1)).toBeCloseTo(angle === 45 ? -1 : 1, 1);
      }
    }
  });

  it('lies the given distance apart', () => {
    const across = strokes(hatching(square, 45, 4).d).map(([x, y]) => (x + y) / Math.SQRT2);
    across.slice(1).forEach((at, i) => {
      expect(at - (across[i] ?? 0)).toBeCloseTo(4, 1);
    });
  });

  it('leaves the middle of a ring open', () => {
    const ring = ringPiece(origin, 20, 30, 0, 270);
    for (const [x1, y1, x2, y2] of strokes(hatching(ring, 45, 3).d)) {
      expect(Math.hypot((x1 + x2) / 2, (y1 + y2) / 2)).toBeGreaterThan(19.8);
    }
  });
});
