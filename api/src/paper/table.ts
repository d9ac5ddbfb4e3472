import { drawSign, signWords, type SignKind } from '@second-spanner/shared/drawing/signs';
import { draw } from './draw.js';
import type { FontName } from './fonts.js';
import type { Pages } from './page.js';

export interface Column {
  readonly head: string;
  /** Points; columns without a width share what is left. */
  readonly width?: number;
  readonly font?: FontName;
  readonly align?: 'left' | 'right';
}

/** A text, or a verdict with its sign. */
export type Cell = string | { readonly sign: SignKind };

export interface Row {
  readonly cells: readonly Cell[];
  /** Small print under the row, across from the second column on. */
  readonly under?: readonly string[];
}

interface Place {
  readonly x: number;
  readonly width: number;
}

export const cellSize = 8.5;
export const cellPad = 8;

/** Points over and under what stands in a row. */
const usualPad = 3;

/**
 * A table of ruled rows at the pages' present place; its head is repeated on a new page. `pad` is what stands free
 * over and under the words of a row, in points.
 */
export function table(
  pages: Pages,
  columns: readonly Column[],
  rows: readonly Row[],
  within?: Place,
  pad = usualPad,
): void {
  const area = within ?? { x: pages.left, width: pages.width };
  const places = placesOf(columns, area);
  head(pages, columns, places, area);
  for (const row of rows) {
    const height = heightOf(pages, row, columns, places, area) + 2 * pad;
    if (pages.y + height > pages.bottom) {
      pages.next();
      head(pages, columns, places, area);
    }
    drawRow(pages, row, columns, places, pad);
    pages.y += height;
    pages.rule(pages.y - 1, 0.35, area.x, area.width);
  }
  pages.y += 4;
}

function placesOf(columns: readonly Column[], area: Place): readonly Place[] {
  const fixed = columns.reduce((sum, { width = 0 }) => sum + width, 0);
  const free = columns.filter(({ width }) => width === undefined).length;
  let x = area.x;
  return columns.map(({ width = (area.width - fixed) / Math.max(1, free) }) => {
    const place = { x, width };
    x += width;
    return place;
  });
}

function head(pages: Pages, columns: readonly Column[], places: readonly Place[], area: Place): void {
  pages.need(34);
  columns.forEach(({ head: words, align = 'left' }, index) => {
    const place = places[index];
    if (place)
      pages.text(words, place.x, pages.y, {
        font: 'plate',
        size: 8,
        width: place.width - cellPad,
        align,
        colour: '#404040',
      });
  });
  pages.y += 13;
  pages.rule(pages.y - 1, 0.9, area.x, area.width);
}

function heightOf(
  pages: Pages,
  row: Row,
  columns: readonly Column[],
  places: readonly Place[],
  area: Place,
): number {
  const heights = row.cells.map((cell, index) => {
    if (typeof cell !== 'string') return 11;
    return pages.heightOf(
      cell,
      (places[index]?.width ?? 0) - cellPad,
      columns[index]?.font ?? 'text',
      cellSize,
    );
  });
  const underWidth = area.x + area.width - (places[1]?.x ?? area.x);
  const under = (row.under ?? []).reduce(
    (sum, words) => sum + pages.heightOf(words, underWidth - cellPad, 'text', 8) + 1,
    0,
  );
  return Math.max(11, ...heights) + under;
}

function drawRow(
  pages: Pages,
  row: Row,
  columns: readonly Column[],
  places: readonly Place[],
  pad: number,
): void {
  let lowest = 0;
  row.cells.forEach((cell, index) => {
    const place = places[index];
    if (!place) return;
    const { font = 'text', align = 'left' } = columns[index] ?? {};
    if (typeof cell === 'string') {
      lowest = Math.max(
        lowest,
        pages.text(cell, place.x, pages.y + pad, {
          font,
          size: cellSize,
          width: place.width - cellPad,
          align,
        }),
      );
    } else {
      verdict(pages, cell.sign, place.x, pages.y + pad - 0.5);
    }
  });
  let y = pages.y + pad + Math.max(11, lowest);
  const from = places[1];
  const to = places.at(-1);
  if (!from || !to) return;
  for (const words of row.under ?? []) {
    const width = to.x + to.width - from.x - cellPad;
    y += pages.text(words, from.x, y, { size: 8, width, colour: '#404040' }) + 1;
  }
}

/** Sign and word go together, always. */
export function verdict(pages: Pages, kind: SignKind, x: number, y: number): void {
  draw(pages.document, drawSign(kind), x, y, 10);
  pages.text(signWords[kind], x + 13, y + 0.5, { font: 'text-strong', size: 8.5, width: 60 });
}
