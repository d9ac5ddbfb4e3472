import type { RowsField } from '@second-spanner/shared/workings/working';
import { describe, expect, it } from 'vitest';
import { columnUnit, inCell, inColumnUnit, shownRows, withCell, withoutRow } from './rows';

const field: RowsField = {
  kind: 'rows',
  name: 'readings',
  label: 'Readings',
  row: 'reading',
  least: 2,
  most: 4,
  columns: [
    { kind: 'quantity', name: 'size', label: 'Size', of: 'length', unit: 'mm' },
    { kind: 'text', name: 'where', label: 'Where' },
  ],
};
const size = field.columns[0]!;

describe('a list of rows', () => {
  it('stands with as many rows as there must be, are, or were asked for, and no more than there may be', () => {
    expect(shownRows(field, '', 0)).toHaveLength(2);
    expect(shownRows(field, '1 mm|;2 mm|;3 mm|', 0)).toHaveLength(3);
    expect(shownRows(field, '1 mm|', 3)).toHaveLength(3);
    expect(shownRows(field, '1 mm|', 9)).toHaveLength(4);
  });

  it('takes a cell, and lets a row go', () => {
    const rows = shownRows(field, '1 mm|top', 3);
    expect(withCell(field, rows, { row: 2, column: 'size', text: '3 mm' })).toBe('1 mm|top;|;3 mm|');
    expect(withoutRow(field, shownRows(field, '1 mm|top;2 mm|low', 0), 0)).toBe('2 mm|low');
  });

  it('has one unit over a column: its first figure’s, the chosen one, or its own', () => {
    expect(columnUnit(size, shownRows(field, '|;0.5 in|', 0), 'thou')).toBe('in');
    expect(columnUnit(size, shownRows(field, '', 0), 'thou')).toBe('thou');
    expect(columnUnit(size, [], undefined)).toBe('mm');
    expect(columnUnit(field.columns[1]!, [], undefined)).toBeNull();
  });

  it('says the figures of a column in another unit without converting them', () => {
    const rows = shownRows(field, '1 mm|top;0.5 in|;3|', 0);
    expect(inColumnUnit(field, rows, { column: 'size', from: 'mm', to: 'µm' })).toBe(
      '1 µm|top;0.5 in|;3 µm|',
    );
  });

  it('shows a unit in a cell only where it is not the column’s', () => {
    expect(inCell('1,5 mm', 'mm')).toBe('1,5');
    expect(inCell('0.5 in', 'mm')).toBe('0.5 in');
    expect(inCell('top', null)).toBe('top');
  });
});
