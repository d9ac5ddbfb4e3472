import { tradeText } from '@second-spanner/shared/contracts/trade-words';
import { Pages } from '../../paper/page.js';
import { dayOf, stamp } from '../../paper/stamp.js';
import { drawLargeCode, workingFrame } from './frame.js';
import { sideBySide, type Block } from './drawn.js';
import { drawFacts } from './facts.js';
import { drawCautions, drawJudgement } from './judgement.js';
import { drawParts, heading, type Say } from './parts.js';
import type { WorkingPaper } from './working-paper.js';

/** Points that the first line stands closer to the title block than on a sheet of many pages. */
const closer = 7;

/**
 * A working as a PDF, on one page where it can be. Cautions stand under the judgement that they belong to.
 * Two renderings of the same are the same to the byte.
 */
export async function renderWorking(working: WorkingPaper): Promise<Buffer> {
  const pages = new Pages(workingFrame(working));
  const say: Say = (text) => tradeText(text, working.dialect);
  pages.y -= closer;
  if (working.begunFrom !== '') pages.paragraph(working.begunFrom, { font: 'text-strong', size: 13 });
  question(pages, say(working.asks), whoAndWhen(working));
  heading(pages, 'What was typed');
  drawFacts(
    pages,
    working.typed.map(({ label, value }) => ({ name: say(label), value: say(value) })),
  );
  const [judged, rest] = atJudgement(working.parts);
  for (const part of judged) drawJudgement(pages, part, say);
  drawCautions(pages, working.cautions.map(say));
  drawParts(pages, rest, say);
  grounds(pages, working.basis.map(say), working.assumed.map(say));
  drawLargeCode(pages, working.address);
  return pages.finish();
}

/** The question, and who answered it on the same line where there is room. */
function question(pages: Pages, asks: string, who: string): void {
  const needed = pages.widthOf(asks, 'text-medium', 11) + pages.widthOf(who, 'text', 9) + 16;
  if (needed <= pages.width) pages.text(who, pages.left, pages.y + 2, { size: 9, align: 'right' });
  pages.paragraph(asks, { font: 'text-medium', size: 11 });
  if (needed > pages.width) pages.paragraph(who, { size: 9 });
}

type Parts = WorkingPaper['parts'];
type Judgement = Extract<Parts[number], { kind: 'judgement' }>;

/** The judgements that an answer begins with, and the rest of it. */
function atJudgement(parts: Parts): readonly [readonly Judgement[], Parts] {
  const end = parts.findIndex(({ kind }) => kind !== 'judgement');
  const count = end < 0 ? parts.length : end;
  const isJudgement = (part: Parts[number]): part is Judgement => part.kind === 'judgement';
  return [parts.slice(0, count).filter(isJudgement), parts.slice(count)];
}

function whoAndWhen({ kept, workedOutBy, date }: WorkingPaper): string {
  if (!kept) return `Worked out by ${workedOutBy}, ${dayOf(date)}.`;
  const { title, carName, carCode, keptAt } = kept;
  return `${title}. Kept with ${carName}, ${carCode}, by ${workedOutBy}, ${stamp(keptAt)} UTC.`;
}

function grounds(pages: Pages, basis: readonly string[], assumed: readonly string[]): void {
  const ofBasis: Block = (on) => lines(on, 'Worked out by', basis);
  const ofAssumed: Block = (on) => lines(on, 'Assumed', assumed);
  if (basis.length > 0 && assumed.length > 0) sideBySide(pages, ofAssumed, ofBasis);
  else [ofAssumed, ofBasis].forEach((block) => block(pages));
}

function lines(pages: Pages, head: string, texts: readonly string[]): void {
  if (texts.length === 0) return;
  heading(pages, head);
  for (const text of texts) pages.paragraph(text, { size: 8 });
}
