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
  const wanted = columns.map(({ name, figures }, index) => {
    const font = figures ? 'figures' : 'text';
    const cells = rows.map((row) => pages.widthOf(row[index] ?? '', font, cellSize));
    // A long text goes on several lines rather than take the others' room.
    return Math.min(
      pages.width / 2,
      Math.max(pages.widthOf(name, 'plate', cellSize), ...cells) + cellPad + 6,
    );
  });
  const all = wanted.reduce((sum, width) => sum + width, 0);
  const scale = Math.min(1.6, pages.width / all);
  return columns.map(({ name, figures }, index): Column => {
    const font: FontName = figures ? 'figures' : 'text';
    const isLast = index === columns.length - 1;
    return { head: name, font, ...(!isLast && { width: (wanted[index] ?? 0) * scale }) };
  });
}
