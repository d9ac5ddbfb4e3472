import type { Drawing } from '@second-spanner/shared/drawing/shapes';
import { drawSign, signWords } from '@second-spanner/shared/drawing/signs';
import type { AnswerPart } from '@second-spanner/shared/workings/working';
import { draw, heightOf } from '../../paper/draw.js';
import type { Pages } from '../../paper/page.js';
import { table } from '../../paper/table.js';
import { columnsFor } from './columns.js';

type Part<Kind extends AnswerPart['kind']> = Extract<AnswerPart, { kind: Kind }>;
/** A text in the trade words of whom it is for. */
export type Say = (text: string) => string;

/** Points that a unit of a drawing takes: its smallest words can still be read. */
const drawingScale = 0.68;
const highest = 400;

/** One part of an answer, below what stands. */
export function drawPart(pages: Pages, part: AnswerPart, say: Say): void {
  switch (part.kind) {
    case 'judgement':
      judgement(pages, part, say);
      return;
    case 'facts':
      facts(pages, part, say);
      return;
    case 'table':
      heading(pages, say(part.heading));
      tableOf(pages, part.columns, part.rows, say);
      return;
    case 'steps':
      steps(pages, part, say);
      return;
    case 'drawing':
      drawing(pages, part.drawing, say(part.caption), say);
  }
}

/** A heading that never stands alone at the foot of a page. */
export function heading(pages: Pages, words: string): void {
  pages.need(58);
  pages.y += 6;
  pages.y += pages.text(words, pages.left, pages.y, { font: 'text-strong', size: 11 }) + 4;
}

function judgement(pages: Pages, { of, verdict, reason }: Part<'judgement'>, say: Say): void {
  const words = say(reason);
  const indent = 92;
  const width = pages.width - indent;
  const about = of === undefined ? '' : say(of);
  const high = (about === '' ? 0 : 14) + pages.heightOf(words, width, 'text', 10.5);
  pages.need(high + 16);
  pages.y += 5;
  draw(pages.document, drawSign(verdict), pages.left, pages.y - 1, 16);
  pages.text(signWords[verdict], pages.left + 21, pages.y, { font: 'text-strong', size: 11, width: 70 });
  let y = pages.y;
  if (about !== '')
    y += pages.text(about, pages.left + indent, y, { font: 'text-medium', size: 10.5, width });
  y += pages.text(words, pages.left + indent, y, { size: 10.5, width });
  pages.y = y + 7;
  pages.rule(pages.y - 3, 0.35);
}

function facts(pages: Pages, part: Part<'facts'>, say: Say): void {
  if (part.heading === undefined) pages.y += 6;
  else heading(pages, say(part.heading));
  for (const { name, value, note } of part.facts) {
    const [left, right] = [190, pages.width - 198];
    const noted = note === undefined ? '' : say(note);
    const high = Math.max(
      pages.heightOf(say(name), left, 'text', 9.5),
      pages.heightOf(say(value), right, 'figures', 9.5) +
        (noted === '' ? 0 : pages.heightOf(noted, right, 'text', 8)),
    );
    pages.need(high + 6);
    pages.text(say(name), pages.left, pages.y, { size: 9.5, width: left });
    const below = pages.text(say(value), pages.left + 198, pages.y, {
      font: 'figures',
      size: 9.5,
      width: right,
    });
    if (noted !== '') {
      pages.text(noted, pages.left + 198, pages.y + below, { size: 8, width: right, colour: '#404040' });
    }
    pages.y += high + 3;
    pages.rule(pages.y - 1, 0.35);
  }
  pages.y += 4;
}

/** Columns in trade words, as wide as they need. */
export function tableOf(
  pages: Pages,
  columns: Part<'table'>['columns'],
  rows: readonly (readonly string[])[],
  say: Say,
): void {
  const named = columns.map((column) => ({ ...column, name: say(column.name) }));
  const cells = rows.map((row) => row.map(say));
  table(
    pages,
    columnsFor(pages, named, cells),
    cells.map((row) => ({ cells: row })),
  );
}

function steps(pages: Pages, part: Part<'steps'>, say: Say): void {
  heading(pages, say(part.heading));
  part.steps.forEach((step, index) => {
    const width = pages.width - 26;
    const words = say(step);
    pages.need(pages.heightOf(words, width, 'text', 9.5) + 4);
    pages.text(`${index + 1}.`, pages.left, pages.y, { font: 'figures', size: 9.5, width: 22 });
    pages.y += pages.text(words, pages.left + 26, pages.y, { size: 9.5, width }) + 3;
  });
  pages.y += 3;
}

function drawing(pages: Pages, shown: Drawing, caption: string, say: Say): void {
  const fits = Math.min(pages.width, shown.width * drawingScale);
  const width = Math.min(fits, (fits * highest) / heightOf(shown, fits));
  const height = heightOf(shown, width);
  const { columns, rows } = shown.table;
  pages.need(height + (rows.length === 0 ? 30 : 80));
  pages.y += 6;
  draw(pages.document, shown, pages.left, pages.y, width);
  pages.y += height + 4;
  pages.paragraph(caption, { font: 'text-medium', size: 9 });
  if (rows.length === 0) return;
  tableOf(
    pages,
    columns.map((name) => ({ name })),
    rows,
    say,
  );
}
