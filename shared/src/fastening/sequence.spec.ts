import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { FastenerLayout } from '../contracts/calculations.js';
import { standsAtEdge } from './edge.js';
import { requireLayout } from './layout.js';
import { generalSequence } from './sequence.js';

const order = (fasteners: FastenerLayout): string => generalSequence(requireLayout(fasteners)).join(' ');

describe('circles', () => {
  it.each([
    // The star pattern of ASME PCC-1, from memory.
    [4, '1 3 2 4'],
    [8, '1 5 3 7 2 6 4 8'],
    [12, '1 7 4 10 2 8 5 11 3 9 6 12'],
    [16, '1 9 5 13 3 11 7 15 2 10 6 14 4 12 8 16'],
    // common practice, no source: the five-stud star, and six in opposite pairs.
    [5, '1 3 5 2 4'],
    [6, '1 4 2 5 3 6'],
  ])('of %d', (count, expected) => {
    expect(order({ pattern: 'circle', count })).toBe(expected);
  });

  it('placed by hand go opposite and crossing too', () => {
    // The same eight places, clockwise from the top as one sees them, named by letters.
    const positions = [...'abcdefgh'].map((fastener, i) => ({
      fastener,
      x: 40 * Math.sin((i * Math.PI) / 4),
      y: 100 - 40 * Math.cos((i * Math.PI) / 4),
    }));
    expect(order({ positions })).toBe('a e c g b f d h');
  });

  it('of an even number always go straight across', () => {
    fc.assert(
      fc.property(fc.integer({ min: 1, max: 100 }), (half) => {
        const places = order({ pattern: 'circle', count: 2 * half })
          .split(' ')
          .map(Number);
        for (let i = 0; i < places.length; i += 2) expect((places[i + 1] ?? 0) - (places[i] ?? 0)).toBe(half);
      }),
    );
  });

  it('of an odd number always go to one of the two farthest', () => {
    fc.assert(
      fc.property(fc.integer({ min: 1, max: 90 }), (half) => {
        const count = 2 * half + 1;
        const places = order({ pattern: 'circle', count }).split(' ').map(Number);
        places.slice(1).forEach((place, i) => {
          expect([half, half + 1]).toContain((place - (places[i] ?? 0) + count) % count);
        });
      }),
    );
  });
});

describe('lines and grids', () => {
  it.each([
    // HEADC: begin at the centre, work outward; which side of a pair comes first is free.
    [5, '3 2 4 1 5'],
    [6, '3 4 2 5 1 6'],
    [1, '1'],
  ])('a line of %d', (count, expected) => {
    expect(order({ pattern: 'line', count })).toBe(expected);
  });

  it('goes from column to column outwards on a head of 2 × 5', () => {
    // T4-149, HEADC: the columns' distance from the centre never decreases.
    const columns = order({ pattern: 'grid', rows: 2, columns: 5 })
      .split(' ')
      .map((fastener) => Math.abs(((Number(fastener) - 1) % 5) - 2));
    expect(columns).toEqual([0, 0, 1, 1, 1, 1, 2, 2, 2, 2]);
  });

  it('crosses over at each step outwards', () => {
    // common practice, no source: the four of a ring corner to corner, on 1–5 over 6–10.
    expect(order({ pattern: 'grid', rows: 2, columns: 5 })).toBe('3 8 2 9 4 7 1 10 5 6');
  });

  it('never comes nearer to the centre again, wherever the fasteners stand', () => {
    const anyPlace = fc.tuple(fc.integer({ min: -50, max: 50 }), fc.integer({ min: -50, max: 50 }));
    const anyPlaces = fc.uniqueArray(anyPlace, { minLength: 1, maxLength: 40, selector: String });
    fc.assert(
      fc.property(anyPlaces, (places) => {
        const positions = places.map(([x, y], i) => ({ fastener: `n${i}`, x, y }));
        const mean = (axis: 0 | 1): number =>
          places.reduce((sum, place) => sum + place[axis], 0) / places.length;
        const out = order({ positions })
          .split(' ')
          .map((name) => positions.find(({ fastener }) => fastener === name))
          .map((place) => Math.hypot((place?.x ?? NaN) - mean(0), (place?.y ?? NaN) - mean(1)));
        out.slice(1).forEach((distance, i) => expect(distance).toBeGreaterThanOrEqual((out[i] ?? 0) - 1e-3));
      }),
    );
  });
});

describe('where an edge is', () => {
  const edges = (fasteners: FastenerLayout): string => {
    const layout = requireLayout(fasteners);
    return layout.positions
      .map(({ fastener }) => fastener)
      .filter((fastener) => standsAtEdge(layout, fastener))
      .join(' ');
  };

  it.each([
    // By the meaning of the word.
    ['the two ends of a line', { pattern: 'line', count: 5 }, '1 5'],
    ['the end columns of two rows', { pattern: 'grid', rows: 2, columns: 5 }, '1 5 6 10'],
    ['the end rows of two columns', { pattern: 'grid', rows: 4, columns: 2 }, '1 2 7 8'],
    ['all round three rows', { pattern: 'grid', rows: 3, columns: 3 }, '1 2 3 4 6 7 8 9'],
    ['all round four rows', { pattern: 'grid', rows: 4, columns: 4 }, '1 2 3 4 5 8 9 12 13 14 15 16'],
    ['nowhere on a circle', { pattern: 'circle', count: 6 }, ''],
    ['nowhere with four in a square', { pattern: 'grid', rows: 2, columns: 2 }, ''],
    ['nowhere with two or with one', { pattern: 'line', count: 2 }, ''],
  ] as const)('is %s', (_, layout, expected) => {
    expect(edges(layout)).toBe(expected);
  });

  it('is at the ends of a pan whose bolts stand round its rim, not in the middle of its long sides', () => {
    const positions = [
      { fastener: 'left', x: 0, y: 10 },
      { fastener: 'top left', x: 10, y: 0 },
      { fastener: 'top', x: 30, y: 0 },
      { fastener: 'top right', x: 50, y: 0 },
      { fastener: 'right', x: 60, y: 10 },
      { fastener: 'bottom right', x: 50, y: 20 },
      { fastener: 'bottom', x: 30, y: 20 },
      { fastener: 'bottom left', x: 10, y: 20 },
    ];
    expect(edges({ positions })).toBe('left right');
  });

  it('is nowhere on a circle placed by hand', () => {
    const positions = Array.from({ length: 7 }, (_, i) => ({
      fastener: `${i}`,
      x: Math.cos((i * 2 * Math.PI) / 7),
      y: Math.sin((i * 2 * Math.PI) / 7),
    }));
    expect(edges({ positions })).toBe('');
  });
});
