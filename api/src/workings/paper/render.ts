import { tradeText } from '@second-spanner/shared/contracts/trade-words';
import { Pages } from '../../paper/page.js';
import { stamp } from '../../paper/stamp.js';
import { standsApart, workingFrame } from './frame.js';
import { drawPart, heading, tableOf, type Say } from './parts.js';
import type { WorkingPaper } from './working-paper.js';

/** A working as a PDF, in the order of its page. Two renderings of the same are the same to the byte. */
export async function renderWorking(working: WorkingPaper): Promise<Buffer> {
  const pages = new Pages(workingFrame(working));
  const say: Say = (text) => tradeText(text, working.dialect);
  pages.paragraph(say(working.asks), { font: 'text-medium', size: 13 });
  keptWith(pages, working);
  heading(pages, 'What was typed');
  tableOf(
    pages,
    [{ name: 'What' }, { name: 'As typed', figures: true }],
    working.typed.map(({ label, value }) => [label, value]),
    say,
  );
  for (const part of working.parts) drawPart(pages, part, say);
  lines(pages, 'Take care', working.cautions, say);
  lines(pages, 'Assumed', working.assumed, say);
  lines(pages, 'Worked out by', working.basis, say);
  if (standsApart(working.address))
    lines(pages, 'Where this case opens again', [working.address], (text) => text);
  return pages.finish();
}

function keptWith(pages: Pages, { kept }: WorkingPaper): void {
  if (!kept) return;
  const { title, carName, carCode, keptBy, keptAt } = kept;
  pages.paragraph(`${title}. Kept with ${carName}, ${carCode}, by ${keptBy}, ${stamp(keptAt)} UTC.`, {
    size: 9.5,
  });
}

function lines(pages: Pages, head: string, texts: readonly string[], say: Say): void {
  if (texts.length === 0) return;
  heading(pages, head);
  for (const text of texts) pages.paragraph(say(text), { size: 9.5 });
}
