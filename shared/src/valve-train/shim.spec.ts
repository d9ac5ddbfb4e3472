import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { ShimRequest } from '../contracts/valve-figures.js';
import { shim } from './shim.js';

const mm = (value: number) => ({ value, unit: 'mm' }) as const;
const wanted = { low: mm(0.2), high: mm(0.3) };

describe('the shim', () => {
  // The rule of the trade, old + measured − wanted, worked by hand.
  it('is the old one plus what was measured less what is wanted', () => {
    const answer = shim({ fitted: mm(2.5), measured: mm(0.15), wanted });
    expect(answer.verdict).toBe('fail');
    expect(answer.shim.value).toBeCloseTo(2.4, 12);
    expect(answer.reason).toContain('A shim of 2.400\u2009mm gives the middle of what is wanted.');
  });

  it('may stay where the clearance is right', () => {
    const answer = shim({ fitted: mm(2.5), measured: mm(0.22), wanted });
    expect(answer.verdict).toBe('pass');
    expect(answer.reason).toContain('The shim fitted can stay.');
  });

  it('is chosen from those at hand, in their own units', () => {
    const sizes = [mm(2.3), mm(2.35), { value: 0.095, unit: 'in' } as const];
    // 0.095 in is 2.413 mm and leaves 2.65 − 2.413 = 0.237 mm.
    const answer = shim({ fitted: mm(2.5), measured: mm(0.15), wanted, sizes });
    expect(answer.choice?.shim).toEqual({ value: 0.095, unit: 'in' });
    expect(answer.choice?.lash.value).toBeCloseTo(0.237, 12);
    expect(answer.reason).toContain('which is within what is wanted');
  });

  it('says where none at hand will do, and where the valve may be held open', () => {
    const answer = shim({ fitted: mm(2.5), measured: mm(0), wanted, sizes: [mm(2.6)] });
    expect(answer.reason).toContain('which is not within what is wanted');
    expect(answer.reason).toContain('this is a first guess');
  });

  it('leaves the middle of what is wanted', () => {
    const size = fc.integer({ min: 1, max: 1000 });
    fc.assert(
      fc.property(size, size, size, (measured, low, width) => {
        const range = { low: mm(low / 1000), high: mm((low + width) / 1000) };
        const fitted = mm(3);
        const needed = shim({ fitted, measured: mm(measured / 1000), wanted: range });
        const again = shim({ fitted: needed.shim, measured: mm((low + width / 2) / 1000), wanted: range });
        expect(again.verdict).toBe('pass');
        expect(again.shim.value).toBeCloseTo(needed.shim.value, 9);
        expect(fitted.value + measured / 1000 - needed.shim.value).toBeCloseTo((low + width / 2) / 1000, 9);
      }),
    );
  });
});

const good = { fitted: mm(2.5), measured: mm(0.15), wanted };

it.each([
  ['fitted.value', { ...good, fitted: mm(0) }],
  ['measured.value', { ...good, measured: mm(-0.1) }],
  ['measured', { ...good, measured: 0.15 }],
  ['wanted', { ...good, wanted: [] }],
  ['wanted.low', { ...good, wanted: { low: mm(0.4), high: mm(0.3) } }],
  ['wanted.high.unit', { ...good, wanted: { low: mm(0.2), high: { value: 1, unit: 'N' } } }],
  ['sizes', { ...good, sizes: Array.from({ length: 1000 }, () => mm(2)) }],
  ['sizes[1].value', { ...good, sizes: [mm(2), mm(NaN)] }],
  ['fitted', { ...good, fitted: mm(0.01), measured: mm(0) }],
])('refuses by %s', (field, request) => {
  expect(() => shim(request as ShimRequest)).toThrow(expect.objectContaining({ field }));
});
