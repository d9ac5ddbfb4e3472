import type { StepDetail } from '@second-spanner/shared/contracts/sheets';
import type { Pages } from '../../paper/page.js';
import { verdict } from '../../paper/table.js';
import { people, type Wording } from '../words.js';
import { judged } from './simple.js';

/** The head of a step that has a block of its own: code, title, verdict, people. */
export function stepTitle(pages: Pages, step: StepDetail, words: Wording, room: number): void {
  pages.need(room);
  const title = `${step.code}  ${words.say(step.title)}`;
  const height = pages.text(title, pages.left, pages.y, {
    font: 'text-strong',
    size: 10.5,
    width: pages.width - 240,
  });
  const cell = judged(step);
  if (typeof cell !== 'string') verdict(pages, cell.sign, pages.left + pages.width - 232, pages.y + 1);
  pages.text(people(step), pages.left + pages.width - 150, pages.y + 2, {
    size: 8.5,
    width: 150,
    align: 'right',
  });
  pages.y += height + 4;
}

/** Small print under a block, then room. */
export function under(pages: Pages, lines: readonly string[]): void {
  for (const line of lines) pages.paragraph(line, { size: 8, colour: '#404040' });
  pages.y += 6;
}
