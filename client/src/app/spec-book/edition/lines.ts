import type { SpecRow } from '@second-spanner/shared/spec/spec-rows';

/** A row as it stands in the table: under the one it belongs to it needs only the rest of its name. */
export interface ValueLine extends SpecRow {
  readonly belongs: boolean;
}

/** Rows named `Head nuts`, `Head nuts, thread`: the second belongs under the first. */
export function valueLines(rows: readonly SpecRow[]): readonly ValueLine[] {
  let head = '';
  return rows.map((row) => {
    if (head !== '' && row.label.startsWith(`${head}, `)) {
      return { ...row, label: row.label.slice(head.length + 2), belongs: true };
    }
    head = row.label;
    return { ...row, belongs: false };
  });
}
