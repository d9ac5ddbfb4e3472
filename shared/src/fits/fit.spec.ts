import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { FitRequest } from '../contracts/fits.js';
import { InputError } from '../contracts/input-error.js';
import { convert } from '../quantities/convert.js';
import { fit as fitOf } from './fit.js';

const mm = (value: number) => ({ value, unit: 'mm' }) as const;
const classes = (size: number, hole: string, shaft: string): FitRequest => ({
  hole: { size: mm(size), class: hole },
  shaft: { size: mm(size), class: shaft },
});

describe('a fit by classes', () => {
  it.each([
    // ANSI B4.2 in print (ISO preferred fits): 20 mm H7/g6 0.007 to 0.041; 40 mm H7/p6 −0.042 to −0.001.
    [20, 'H7', 'g6', 'clearance', 7, 41],
    [40, 'H7', 'p6', 'interference', -42, -1],
    // T5-034: the most is nothing, so that it is an interference fit.
    [12, 'H7', 'p6', 'interference', -29, 0],
    // T5-021: the least is nothing, so that it is a clearance fit.
    [8, 'H7', 'h6', 'clearance', 0, 24],
    // T5-026.
    [18, 'H7', 'k6', 'transition', -12, 17],
  ] as const)('%d mm %s/%s', (size, hole, shaft, kind, least, most) => {
    const answer = fitOf(classes(size, hole, shaft));
    expect(answer.kind).toBe(kind);
    expect(answer.least.unit).toBe('mm');
    expect(answer.least.value * 1000).toBeCloseTo(least, 9);
    expect(answer.most.value * 1000).toBeCloseTo(most, 9);
  });

  it('takes a size in inches and answers in them', () => {
    // 0.787 402 in is 20 mm within a nanometre: the band over 18 to 30 mm.
    const { least } = fitOf({
      hole: { size: { value: 20 / 25.4, unit: 'in' }, class: 'H7' },
      shaft: { low: mm(19.98), high: mm(20) },
    });
    expect(least).toEqual({ value: 0, unit: 'in' });
  });
});

describe('a fit by limits', () => {
  it('is the difference of the sizes whatever their units', () => {
    // 1 in = 25.4 mm exactly.
    const answer = fitOf({
      hole: { low: { value: 1, unit: 'in' }, high: { value: 1.001, unit: 'in' } },
      shaft: { low: mm(25.3), high: mm(25.4) },
    });
    expect(answer.kind).toBe('clearance');
    expect(answer.least).toEqual({ value: 0, unit: 'in' });
    expect(answer.most.value).toBeCloseTo(0.001 + 0.1 / 25.4, 12);
  });

  it('never has a least over its most, and turns round when hole and shaft change places', () => {
    const limits = fc
      .tuple(fc.double({ min: 1, max: 200, noNaN: true }), fc.double({ min: 0, max: 1, noNaN: true }))
      .map(([low, width]) => ({ low: mm(low), high: mm(low + width) }));
    fc.assert(
      fc.property(limits, limits, (hole, shaft) => {
        const { least, most } = fitOf({ hole, shaft });
        expect(least.value).toBeLessThanOrEqual(most.value);
        const turned = fitOf({ hole: shaft, shaft: hole });
        expect(convert(turned.least, 'mm').value).toBeCloseTo(-most.value, 9);
      }),
    );
  });
});

describe('input that cannot be used', () => {
  const good = classes(20, 'H7', 'p6');
  const hole = (part: unknown) => ({ ...good, hole: part });

  it.each([
    ['request', null],
    ['hole', { shaft: good.shaft }],
    ['hole.low', hole({})],
    ['hole.low', hole({ low: mm(20.1), high: mm(20) })],
    ['hole.low.value', hole({ low: mm(0), high: mm(20) })],
    ['hole.high.unit', hole({ low: mm(20), high: { value: 20, unit: 'kg' } })],
    ['hole.class', hole({ size: mm(20), class: 'h7' })],
    ['hole.class', hole({ size: mm(20), class: 'Z7' })],
    ['hole.class', hole({ size: mm(20), class: 'H4' })],
    ['hole.class', hole({ size: mm(20), class: 'H'.repeat(1e6) })],
    ['hole.class', hole({ size: mm(20), class: 7 })],
    ['hole.class', hole({ size: mm(20), class: 'K9' })],
    ['hole.size', hole({ size: mm(251), class: 'H7' })],
    ['hole.size', hole({ size: mm(0.5), class: 'H7' })],
    ['hole.size.value', hole({ size: mm(NaN), class: 'H7' })],
    ['hole.size', hole({ class: 'H7' })],
    ['shaft.class', { ...good, shaft: { size: mm(20), class: 'P6' } }],
  ])('%s', (field, request) => {
    expect(() => fitOf(request as FitRequest)).toThrow(InputError);
    expect(() => fitOf(request as FitRequest)).toThrow(expect.objectContaining({ field }));
  });
});
