import type { AnswerPart } from '@second-spanner/shared/workings/working';

type TablePart = Extract<AnswerPart, { kind: 'table' }>;

/** Pixels: what a phone of 360 px leaves to a table, a character of it, and the gap between two columns. */
const room = 328;
const character = 8;
const gap = 12;

const longest = (texts: readonly string[]): number => Math.max(0, ...texts.map(({ length }) => length));

/**
 * Whether a table is too wide for a phone, so that its rows are stacked there. Figures are not parted, words break
 * between any two of them.
 */
export function isTooWide({ columns, rows }: Pick<TablePart, 'columns' | 'rows'>): boolean {
  const widths = columns.map(({ name, figures }, i) => {
    const cells = rows.map((row) => row[i] ?? '');
    const pieces = figures === true ? cells : cells.flatMap((cell) => cell.split(' '));
    return character * longest([...name.split(' '), ...pieces]);
  });
  const total = widths.reduce((sum, width) => sum + width, 0);
  return total + gap * (columns.length - 1) > room;
}
