import { afterEach, describe, expect, it } from 'vitest';
import type { Limits } from '@second-spanner/shared/contracts/spec';
import { chosenUnit, limitsIn, limitsInWords, rememberUnit, unitsLike } from './chosen-unit';

const plain = (text: string): string => text.replace(/\u2009/g, ' ');

describe('the unit in which a person reads', () => {
  afterEach(() => localStorage.clear());

  it('begins with the one that is printed, and is remembered for such figures', () => {
    expect(chosenUnit('N·m')).toBe('N·m');
    rememberUnit('N·m', 'lbf·ft');
    expect(chosenUnit('N·m')).toBe('lbf·ft');
    expect(chosenUnit('mm')).toBe('mm');
    rememberUnit('N·m', 'N·m');
    expect(chosenUnit('N·m')).toBe('N·m');
  });

  it('can only be of the same kind', () => {
    localStorage.setItem('second-spanner.unit.mm', 'bar');
    expect(chosenUnit('mm')).toBe('mm');
    expect(unitsLike('mm')).toEqual(['mm', 'µm', 'in', 'thou']);
  });

  it('shows limits as they are printed in their own unit', () => {
    const limits: Limits = { low: { value: 0.1, unit: 'mm' }, high: { value: 0.25, unit: 'mm' } };
    expect(limitsIn(limits, 'mm')).toEqual(limits);
    expect(plain(limitsInWords(limits, 'mm'))).toBe('0.10 to 0.25 mm');
  });

  it('rounds them to the good side in another, and says what is printed', () => {
    // 1 in is 25.4 mm exactly (NIST SP 811): 0.1 mm is 3.937… thou, 0.25 mm is 9.842… thou.
    const limits: Limits = { low: { value: 0.1, unit: 'mm' }, high: { value: 0.25, unit: 'mm' } };
    const { low, high } = limitsIn(limits, 'thou');
    expect(low?.value).toBeGreaterThanOrEqual(3.937);
    expect(low?.value).toBeLessThan(3.95);
    expect(high?.value).toBeLessThanOrEqual(9.8426);
    expect(high?.value).toBeGreaterThan(9.83);
    expect(plain(limitsInWords(limits, 'thou'))).toContain('(printed 0.10 to 0.25 mm)');
  });
});
