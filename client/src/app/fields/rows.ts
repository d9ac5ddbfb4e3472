import { units, type Unit } from '@second-spanner/shared/contracts/quantity';
import { kindOfUnit } from '@second-spanner/shared/quantities/unit-names';
import { readRows, writeRows } from '@second-spanner/shared/workings/rows';
import type { CellField, RowsField, WorkingCase } from '@second-spanner/shared/workings/working';
import { joinUnit, splitUnit } from './split-unit';

const namesOf = (field: RowsField): readonly string[] => field.columns.map(({ name }) => name);

/** The rows of a list as they stand on the page: at least so many, the empty ones at the end too. */
export function shownRows(field: RowsField, text: string, atLeast: number): readonly WorkingCase[] {
  const rows = readRows(text, namesOf(field));
  const count = Math.max(rows.length, Math.min(Math.max(field.least, atLeast, 1), field.most));
  return Array.from({ length: count }, (_, i) => rows[i] ?? {});
}

/** The list with one cell changed. */
export function withCell(
  field: RowsField,
  rows: readonly WorkingCase[],
  change: { readonly row: number; readonly column: string; readonly text: string },
): string {
  const { row: at, column, text } = change;
  return writeRows(
    rows.map((row, i) => (i === at ? { ...row, [column]: text } : row)),
    namesOf(field),
  );
}

/** The list without one row. */
export function withoutRow(field: RowsField, rows: readonly WorkingCase[], at: number): string {
  return writeRows(
    rows.filter((_, i) => i !== at),
    namesOf(field),
  );
}

/** The unit of a column: that of its first figure, else the one chosen, else the field's own. */
export function columnUnit(
  column: CellField,
  rows: readonly WorkingCase[],
  chosen: Unit | undefined,
): Unit | null {
  if (column.kind !== 'quantity') return null;
  const written = rows
    .map((row) => splitUnit(row[column.name] ?? '').unit)
    .find((unit) => unit !== undefined && kindOfUnit(unit) === column.of);
  return written ?? chosen ?? column.unit;
}

/** The list with every figure of a column that was in one unit said in another; the figures stay as typed. */
export function inColumnUnit(
  field: RowsField,
  rows: readonly WorkingCase[],
  change: { readonly column: string; readonly from: Unit; readonly to: Unit },
): string {
  const { column, from, to } = change;
  const changed = rows.map((row) => {
    const { figure, unit } = splitUnit(row[column] ?? '');
    return unit === undefined || unit === from ? { ...row, [column]: joinUnit(figure, to) } : row;
  });
  return writeRows(changed, namesOf(field));
}

/** A cell's text without the unit that stands over its column. */
export function inCell(text: string, unit: Unit | null): string {
  const parted = splitUnit(text);
  return unit !== null && parted.unit === unit ? parted.figure : text;
}

/** The units that a column may be in. */
export const unitsOf = (column: CellField): readonly Unit[] =>
  column.kind === 'quantity' ? units[column.of] : [];
