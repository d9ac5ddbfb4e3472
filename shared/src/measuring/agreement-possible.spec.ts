import { describe, expect, it } from 'vitest';
import type { Quantity } from '../contracts/quantity.js';
import { agreementPossible } from './agreement-possible.js';

const mm = (value: number): Quantity => ({ value, unit: 'mm' });

/** Four to one; common practice, no source. Worked by hand. */
describe('agreementPossible', () => {
  it.each([
    [0.01, mm(0.04), mm(0.08), true],
    [0.0101, mm(0.04), mm(0.08), false],
    [0.02, undefined, mm(0.08), true],
    [0.021, undefined, mm(0.08), false],
    [0.01, undefined, undefined, false],
  ])('±%d mm in %j to %j: %s', (uncertainty, low, high, possible) => {
    expect(agreementPossible(mm(uncertainty), low, high)).toBe(possible);
  });

  it('compares across units', () => {
    // 1 thou = 25.4 µm, by definition: a quarter of 4 thou.
    const low: Quantity = { value: 1, unit: 'thou' };
    const high: Quantity = { value: 5, unit: 'thou' };
    expect(agreementPossible({ value: 25.4, unit: 'µm' }, low, high)).toBe(true);
    expect(agreementPossible({ value: 25.5, unit: 'µm' }, low, high)).toBe(false);
  });

  it('has no tolerance for a temperature with one limit', () => {
    expect(agreementPossible({ value: 1, unit: 'K' }, undefined, { value: 90, unit: '°C' })).toBe(false);
  });

  it('refuses an uncertainty of another kind', () => {
    expect(() => agreementPossible({ value: 1, unit: 'N·m' }, mm(1), mm(2))).toThrow(
      expect.objectContaining({ name: 'InputError', field: 'uncertainty.unit' }),
    );
  });
});
