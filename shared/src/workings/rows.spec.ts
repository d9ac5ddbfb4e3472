import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { readRows, writeRows } from './rows.js';
import type { WorkingCase } from './working.js';

const columns = ['place', 'value'];

describe('rows in an address', () => {
  it('come back as they were, whatever is typed', () => {
    const row = fc.record({ place: fc.string(), value: fc.string({ minLength: 1 }) });
    fc.assert(
      fc.property(fc.array(row), (rows) => {
        expect(readRows(writeRows(rows, columns), columns)).toEqual(rows);
      }),
    );
  });

  it('are readable, and leave out empty rows at the end', () => {
    const rows: readonly WorkingCase[] = [{ place: 'top', value: '88.01 mm' }, { place: 'middle' }, {}];
    expect(writeRows(rows, columns)).toBe('top|88.01 mm;middle|');
  });

  it('take an address that was cut short, and drop cells too many', () => {
    expect(readRows('top;a|b|c', columns)).toEqual([
      { place: 'top', value: '' },
      { place: 'a', value: 'b' },
    ]);
  });
});
