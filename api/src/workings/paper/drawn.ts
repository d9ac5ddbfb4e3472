import type { Drawing } from '@second-spanner/shared/drawing/shapes';
import { draw, heightOf } from '../../paper/draw.js';
import type { Column, Pages } from '../../paper/page.js';

const between = 16;
/** Points that a unit of a drawing takes: at the least its words, of 13 units, stand at 8 points. */
const smallestScale = 0.62;
const largestScale = 0.76;
/** Points that a drawing may be high, unless it would fall below its smallest scale. */
const highest = 216;
/** Points by which the column beside a drawing may go past it. */
const past = 32;

/** The width of each of two columns. */
export const besideWidth = (pages: Pages): number => (pages.width - between) / 2;

export interface Shown {
  readonly drawing: Drawing;
  readonly caption: string;
}

/** Draws something where the pages stand. */
export type Block = (pages: Pages) => void;

/**
 * A drawing at half the page's width. In the column beside it stands what belongs to it, and of what comes `after`
 * as much as there is room for: gives back how many of those.
 */
export function drawBeside(
  pages: Pages,
  { drawing, caption }: Shown,
  own: readonly Block[],
  after: readonly Block[],
): number {
  const half = besideWidth(pages);
  const column = { x: pages.left + half + between, width: half };
  const scale = Math.min(largestScale, highest / drawing.height);
  const width = Math.min(half, drawing.width * Math.max(smallestScale, scale));
  const height = heightOf(drawing, width);
  const words = pages.heightOf(caption, half, 'text-medium', 9);
  const high = height + words + 7;
  const ownHigh = own.reduce((sum, block) => sum + heightIn(pages, column, block), 0);
  pages.need(Math.max(high, Number.isFinite(ownHigh) ? ownHigh : 0) + 4);
  pages.y += 4;
  const top = pages.y;
  const { page } = pages.document;
  draw(pages.document, drawing, pages.left, top, width);
  pages.text(caption, pages.left, top + height + 4, { font: 'text-medium', size: 9, width: half });
  const count = fitting(pages, column, after, high - ownHigh + past);
  pages.within(column, () => [...own, ...after.slice(0, count)].forEach((block) => block(pages)));
  // What stands beside it may have gone on to a new page.
  if (pages.document.page === page) pages.y = Math.max(pages.y, top + high);
  return count;
}

/** A drawing as small as can be read, with what belongs to it below: for the column beside another. */
export function drawSmall(pages: Pages, { drawing, caption }: Shown, own: readonly Block[]): void {
  const width = Math.min(pages.width, drawing.width * smallestScale);
  const height = heightOf(drawing, width);
  pages.need(height + 24);
  pages.y += 4;
  draw(pages.document, drawing, pages.left, pages.y, width);
  pages.y += height + 4;
  pages.paragraph(caption, { font: 'text-medium', size: 9 });
  own.forEach((block) => block(pages));
}

/** How many of the blocks stand in a column before its room is used up. */
function fitting(pages: Pages, column: Column, blocks: readonly Block[], room: number): number {
  let left = room;
  const first = blocks.findIndex((block) => (left -= heightIn(pages, column, block)) < 0);
  return first < 0 ? blocks.length : first;
}

/** The height of a block in a column; infinite when it is more than a page. */
function heightIn(pages: Pages, column: Column, block: Block): number {
  const trial = pages.trial();
  const [{ page }, top] = [trial.document, trial.y];
  trial.within(column, () => block(trial));
  return trial.document.page === page ? trial.y - top : Infinity;
}

/** Two blocks beside each other, kept together. */
export function sideBySide(pages: Pages, left: Block, right: Block): void {
  const width = besideWidth(pages);
  const columns = [pages.left, pages.left + width + between].map((x) => ({ x, width }));
  const blocks = [left, right];
  const heights = columns.map((column, index) => heightIn(pages, column, blocks[index] ?? left));
  const high = Math.max(...heights);
  if (!Number.isFinite(high)) {
    blocks.forEach((block) => block(pages));
    return;
  }
  // The space below the last line may fall away.
  pages.need(high - 3);
  const top = pages.y;
  columns.forEach((column, index) => {
    pages.y = top;
    pages.within(column, () => blocks[index]?.(pages));
  });
  pages.y = top + high;
}
