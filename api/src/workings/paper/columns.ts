import type { FontName } from '../../paper/fonts.js';
import { cellPad, cellSize, type Column } from '../../paper/table.js';
import type { Pages } from '../../paper/page.js';

interface NamedColumn {
  readonly name: string;
  readonly figures?: true;
}

/** Columns as wide as what stands in them, the room shared by need; the last takes what is left. */
export function columnsFor(
  pages: Pages,
  columns: readonly NamedColumn[],
  rows: readonly (readonly string[])[],
): readonly Column[] {
  const wanted = widthsFor(pages, columns, rows, pages.width / 2);
  const scale = Math.min(1.6, pages.width / sum(wanted));
  return columns.map(({ name, figures }, index): Column => {
    const font: FontName = figures ? 'figures' : 'text';
    const isLast = index === columns.length - 1;
    return { head: name, font, ...(!isLast && { width: (wanted[index] ?? 0) * scale }) };
  });
}

/** The points that a table needs for each column to have its words on a line, but for long texts. */
export const leastWidth = (
  pages: Pages,
  columns: readonly NamedColumn[],
  rows: readonly (readonly string[])[],
): number => sum(widthsFor(pages, columns, rows, longText));

/** Points beyond which a cell may well go on several lines. */
const longText = 110;

const sum = (widths: readonly number[]): number => widths.reduce((all, width) => all + width, 0);

/** A long text goes on several lines rather than take the others' room. */
function widthsFor(
  pages: Pages,
  columns: readonly NamedColumn[],
  rows: readonly (readonly string[])[],
  most: number,
): readonly number[] {
  return columns.map(({ name, figures }, index) => {
    const font = figures ? 'figures' : 'text';
    const cells = rows.map((row) => pages.widthOf(row[index] ?? '', font, cellSize));
    const head = pages.widthOf(name, 'plate', 8);
    return Math.max(head, Math.min(most, Math.max(0, ...cells))) + cellPad + 4;
  });
}
