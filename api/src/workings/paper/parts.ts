import type { AnswerPart } from '@second-spanner/shared/workings/working';
import type { Pages } from '../../paper/page.js';
import { table } from '../../paper/table.js';
import { columnsFor, leastWidth } from './columns.js';
import { besideWidth, drawBeside, drawSmall, type Block } from './drawn.js';
import { drawFacts } from './facts.js';
import { drawJudgement } from './judgement.js';
import { saidAlready } from './said-already.js';

type Part<Kind extends AnswerPart['kind']> = Extract<AnswerPart, { kind: Kind }>;
/** A text in the trade words of whom it is for. */
export type Say = (text: string) => string;

/** The parts of an answer, below what stands. */
export function drawParts(pages: Pages, parts: readonly AnswerPart[], say: Say): void {
  for (let at = 0; at < parts.length; at += 1) {
    const part = parts[at];
    if (part?.kind === 'drawing') at += drawing(pages, part, { all: parts, after: parts.slice(at + 1) }, say);
    else if (part) drawPart(pages, part, say);
  }
}

interface Among {
  readonly all: readonly AnswerPart[];
  readonly after: readonly AnswerPart[];
}

/** A drawing with its table and what else has room beside it; gives back how many parts those are. */
function drawing(pages: Pages, part: Part<'drawing'>, { all, after }: Among, say: Say): number {
  const own = tableOf(part, all, say);
  const isWide = (one: AnswerPart): boolean => {
    const shown =
      one.kind === 'drawing' ? tableOf(one, all, say) : one.kind === 'table' ? inWords(one, say) : null;
    return shown !== null && !fitsBeside(pages, shown);
  };
  const end = after.findIndex(isWide);
  const beside = after.slice(0, end < 0 ? after.length : end).map(
    (one): Block =>
      (on) =>
        drawInColumn(on, one, all, say),
  );
  const shown = { drawing: part.drawing, caption: say(part.caption) };
  const blocks = own === null ? [] : [(on: Pages) => drawTable(on, own)];
  if (own === null || fitsBeside(pages, own)) return drawBeside(pages, shown, blocks, beside);
  const count = drawBeside(pages, shown, [], beside);
  drawTable(pages, own);
  return count;
}

function drawInColumn(pages: Pages, part: AnswerPart, all: readonly AnswerPart[], say: Say): void {
  if (part.kind !== 'drawing') {
    drawPart(pages, part, say);
    return;
  }
  const own = tableOf(part, all, say);
  const blocks = own === null ? [] : [(on: Pages) => drawTable(on, own)];
  drawSmall(pages, { drawing: part.drawing, caption: say(part.caption) }, blocks);
}

/** The table of a drawing; null where other parts say the same. */
function tableOf({ drawing }: Part<'drawing'>, all: readonly AnswerPart[], say: Say): TableWords | null {
  const { columns, rows } = drawing.table;
  if (rows.length === 0 || saidAlready(drawing.table, all)) return null;
  return inWords({ columns: columns.map((name) => ({ name })), rows }, say);
}

function drawPart(pages: Pages, part: Exclude<AnswerPart, { kind: 'drawing' }>, say: Say): void {
  switch (part.kind) {
    case 'judgement':
      drawJudgement(pages, part, say);
      return;
    case 'facts':
      facts(pages, part, say);
      return;
    case 'table':
      heading(pages, say(part.heading));
      drawTable(pages, inWords(part, say));
      return;
    case 'steps':
      steps(pages, part, say);
  }
}

/** A heading that never stands alone at the foot of a page. */
export function heading(pages: Pages, words: string): void {
  pages.need(44);
  pages.y += 4;
  pages.y += pages.text(words, pages.left, pages.y, { font: 'text-strong', size: 10 }) + 2;
}

function facts(pages: Pages, part: Part<'facts'>, say: Say): void {
  if (part.heading === undefined) pages.y += 5;
  else heading(pages, say(part.heading));
  drawFacts(
    pages,
    part.facts.map(({ name, value, note }) => ({
      ...{ name: say(name), value: say(value) },
      ...(note !== undefined && { note: say(note) }),
    })),
  );
}

type TableWords = Pick<Part<'table'>, 'columns' | 'rows'>;

const inWords = ({ columns, rows }: TableWords, say: Say): TableWords => ({
  columns: columns.map((column) => ({ ...column, name: say(column.name) })),
  rows: rows.map((row) => row.map(say)),
});

const fitsBeside = (pages: Pages, { columns, rows }: TableWords): boolean =>
  leastWidth(pages, columns, rows) <= besideWidth(pages);

/** Ruled rows close to each other. */
function drawTable(pages: Pages, { columns, rows }: TableWords): void {
  const cells = rows.map((row) => ({ cells: row }));
  table(pages, columnsFor(pages, columns, rows), cells, undefined, 1.5);
}

function steps(pages: Pages, part: Part<'steps'>, say: Say): void {
  heading(pages, say(part.heading));
  part.steps.forEach((step, index) => {
    const width = pages.width - 22;
    const words = say(step);
    pages.need(pages.heightOf(words, width, 'text', 9) + 3);
    pages.text(`${index + 1}.`, pages.left, pages.y, { font: 'figures', size: 9, width: 20 });
    pages.y += pages.text(words, pages.left + 22, pages.y, { size: 9, width }) + 2;
  });
  pages.y += 2;
}
