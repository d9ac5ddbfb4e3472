import { describe, expect, it } from 'vitest';
import type { ComparePartsRequest } from '../contracts/fits.js';
import { InputError } from '../contracts/input-error.js';
import { compareParts } from './compare-parts.js';

const mm = (value: number) => ({ value, unit: 'mm' }) as const;
const limits = (low: number, high: number) => ({ low: mm(low), high: mm(high) });

const pulleys = (other: Record<string, unknown>, mates?: unknown): ComparePartsRequest =>
  ({
    original: {
      name: 'Pulley that came off',
      dimensions: { bore: limits(16, 16.02), slot: limits(4, 4.03) },
    },
    other: { name: 'New pulley', dimensions: other },
    mates,
  }) as ComparePartsRequest;

describe('another maker’s part', () => {
  // The verdicts follow from the ranges alone: inside, overlapping, apart.
  it.each([
    [limits(16, 16.02), 'pass'],
    [limits(16.005, 16.01), 'pass'],
    [limits(16.01, 16.03), 'doubtful'],
    [limits(16.02, 16.03), 'doubtful'],
    [limits(16.03, 16.04), 'fail'],
    [limits(15.9, 15.99), 'fail'],
  ])('with a bore of %j: %s', (bore, verdict) => {
    const answer = compareParts(pulleys({ bore, slot: limits(4, 4.03) }));
    expect(answer.verdict).toBe(verdict);
    expect(answer.dimensions[0]?.verdict).toBe(verdict);
  });

  it('is compared across units, in the original’s', () => {
    // 0.63 in = 16.002 mm, 0.6305 in = 16.0147 mm exactly.
    const bore = { low: { value: 0.63, unit: 'in' }, high: { value: 0.6305, unit: 'in' } };
    const [first] = compareParts(pulleys({ bore })).dimensions;
    expect(first?.verdict).toBe('pass');
    expect(first?.difference?.unit).toBe('mm');
    expect(first?.difference?.value).toBeCloseTo((16.002 + 16.0147) / 2 - 16.01, 9);
  });

  it('is judged by the play it leaves where its mate is known', () => {
    // Shaft 15.984 to 16.002: bore 16.01 to 16.03 leaves 0.008 to 0.046.
    const mate = (play: unknown) => ({ bore: { is: 'hole', mate: limits(15.984, 16.002), play } });
    const judged = (low: number, high: number) =>
      compareParts(pulleys({ bore: limits(16.01, 16.03) }, mate(limits(low, high)))).dimensions[0];
    expect(judged(0, 0.05)?.verdict).toBe('pass');
    expect(judged(0, 0.04)?.verdict).toBe('doubtful');
    expect(judged(0, 0.04)?.reason).toMatch(/0\.008 to 0\.046 mm of play/);
    expect(judged(-0.02, -0.01)?.verdict).toBe('fail');
  });

  it('takes the compared part for the shaft where it is one', () => {
    const request = pulleys(
      { bore: limits(16, 16.01) },
      { bore: { is: 'shaft', mate: limits(16.02, 16.03), play: limits(0.01, 0.03) } },
    );
    expect(compareParts(request).dimensions[0]?.verdict).toBe('pass');
  });

  it('lists what only one of them has, and does not judge it', () => {
    const answer = compareParts(pulleys({ bore: limits(16, 16.02), rim: limits(112, 112.2) }));
    expect(answer.dimensions.map(({ dimension, verdict }) => [dimension, verdict])).toEqual([
      ['bore', 'pass'],
      ['slot', 'not-judged'],
      ['rim', 'not-judged'],
    ]);
    expect(answer.verdict).toBe('not-judged');
  });
});

describe('input that cannot be used', () => {
  const good = pulleys({ bore: limits(16, 16.02) });
  const many = Object.fromEntries(Array.from({ length: 5000 }, (_, i) => [`d${i}`, limits(1, 2)]));
  it.each([
    ['request', []],
    ['original.name', { ...good, original: { ...good.original, name: '' } }],
    ['other.dimensions', pulleys(many)],
    ['other.dimensions.bore.low', pulleys({ bore: limits(17, 16) })],
    ['other.dimensions.bore.high', pulleys({ bore: { low: mm(1) } })],
    [
      'original.dimensions',
      { original: { name: 'a', dimensions: {} }, other: { name: 'b', dimensions: {} } },
    ],
    ['mates.lip', { ...good, mates: { lip: {} } }],
    ['mates.bore.is', { ...good, mates: { bore: { is: 'pin' } } }],
    [
      'mates.bore.play.high.value',
      {
        ...good,
        mates: { bore: { is: 'hole', mate: limits(15, 16), play: { low: mm(0), high: mm(NaN) } } },
      },
    ],
  ])('%s', (field, request) => {
    expect(() => compareParts(request as ComparePartsRequest)).toThrow(InputError);
    expect(() => compareParts(request as ComparePartsRequest)).toThrow(expect.objectContaining({ field }));
  });
});
