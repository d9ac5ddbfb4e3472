import { grey, type Pages } from '../../paper/page.js';

export interface Fact {
  readonly name: string;
  readonly value: string;
  readonly note?: string;
}

const size = 9;
const nameSize = 8.5;
const noteSize = 8;
const between = 14;
/** Points below which one column is all that can be read. */
const roomForTwo = 360;
/** A fact higher than this beside another takes the whole width. */
const highest = 30;
const shareOfName = 0.46;

/** Names with their values, two side by side where there is room; a long one has the width to itself. */
export function drawFacts(pages: Pages, facts: readonly Fact[]): void {
  for (const row of rowsOf(pages, facts)) {
    const width = (pages.width - between * (row.places - 1)) / row.places;
    const height = Math.max(...row.facts.map((fact) => heightOf(pages, fact, width)));
    pages.need(height + 3);
    row.facts.forEach((fact, index) => {
      const x = pages.left + index * (width + between);
      drawFact(pages, fact, x, width);
      pages.rule(pages.y + height + 1, 0.35, x, width);
    });
    pages.y += height + 3;
  }
}

interface FactRow {
  readonly facts: readonly Fact[];
  readonly places: number;
}

function rowsOf(pages: Pages, facts: readonly Fact[]): readonly FactRow[] {
  if (pages.width < roomForTwo) return facts.map((fact) => ({ facts: [fact], places: 1 }));
  const half = (pages.width - between) / 2;
  const rows: FactRow[] = [];
  for (const fact of facts) {
    const last = rows.at(-1);
    if (heightOf(pages, fact, half) > highest) rows.push({ facts: [fact], places: 1 });
    else if (last?.places === 2 && last.facts.length === 1)
      rows[rows.length - 1] = { ...last, facts: [...last.facts, fact] };
    else rows.push({ facts: [fact], places: 2 });
  }
  return rows;
}

/** The points of a name and of its value, never more for the name than beside another fact. */
function widths(width: number): readonly [number, number] {
  const name = Math.min(width * shareOfName, 120);
  return [name, width - name - 6];
}

function heightOf(pages: Pages, fact: Fact, width: number): number {
  const [left, right] = widths(width);
  const { name, value, note = '' } = fact;
  const noted =
    note === '' || besideValue(pages, fact, right) ? 0 : pages.heightOf(note, right, 'text', noteSize);
  return Math.max(
    pages.heightOf(name, left, 'plate', nameSize),
    pages.heightOf(value, right, 'figures', size) + noted,
  );
}

function drawFact(pages: Pages, fact: Fact, x: number, width: number): void {
  const { name, value, note = '' } = fact;
  const [left, right] = widths(width);
  pages.text(name, x, pages.y + 0.5, { font: 'plate', size: nameSize, width: left, colour: grey });
  const at = x + left + 6;
  const below = pages.text(value, at, pages.y, { font: 'figures', size, width: right });
  if (note === '') return;
  const style = { size: noteSize, width: right, colour: grey };
  if (besideValue(pages, fact, right)) pages.text(note, at + valueWidth(pages, value), pages.y + 1.5, style);
  else pages.text(note, at, pages.y + below, style);
}

const valueWidth = (pages: Pages, value: string): number => pages.widthOf(value, 'figures', size) + 6;

/** Whether a note has room on the line of its value. */
const besideValue = (pages: Pages, { value, note = '' }: Fact, width: number): boolean =>
  valueWidth(pages, value) + pages.widthOf(note, 'text', noteSize) <= width;
