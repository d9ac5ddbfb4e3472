import { drawSign, signWords, type SignKind } from '@second-spanner/shared/drawing/signs';
import {
  judgementSign,
  judgementWord,
  type JudgementPart,
} from '@second-spanner/shared/workings/judgement-words';
import { draw } from '../../paper/draw.js';
import type { Pages } from '../../paper/page.js';

type Say = (text: string) => string;

const indent = 92;
const size = 9.5;

/** What came of it: sign, word and reason. */
export function drawJudgement(pages: Pages, judged: JudgementPart, say: Say): void {
  const about = judged.of === undefined ? [] : [say(judged.of)];
  const [sign, word] = [judgementSign(judged), say(judgementWord(judged))];
  signed(pages, { sign, word, about, lines: [say(judged.reason)] });
}

/** What is to be minded, with its sign. */
export function drawCautions(pages: Pages, cautions: readonly string[]): void {
  if (cautions.length === 0) return;
  signed(pages, { sign: 'caution', word: signWords.caution, about: [], lines: cautions });
}

interface Signed {
  readonly sign: SignKind;
  readonly word: string;
  /** Said before the lines, stronger. */
  readonly about: readonly string[];
  readonly lines: readonly string[];
}

/** Sign and word, and the lines beside them, or below a word that is too long for that. */
function signed(pages: Pages, { sign, word, about, lines }: Signed): void {
  const width = pages.width - indent;
  const isLong = pages.widthOf(word, 'text-strong', 11) > indent - 25;
  const texts = [
    ...about.map((words) => ({ words, font: 'text-medium' as const })),
    ...lines.map((words) => ({ words, font: 'text' as const })),
  ];
  const heights = texts.map(({ words, font }) => pages.heightOf(words, width, font, size));
  const high = heights.reduce((sum, height) => sum + height, isLong ? 15 : 0);
  pages.need(high + 12);
  pages.y += 3;
  draw(pages.document, drawSign(sign), pages.left, pages.y - 1, 16);
  pages.text(word, pages.left + 21, pages.y, { font: 'text-strong', size: 11, width: pages.width - 21 });
  if (isLong) pages.y += 15;
  for (const { words, font } of texts)
    pages.y += pages.text(words, pages.left + indent, pages.y, { font, size, width });
  pages.y = Math.max(pages.y, pages.y + 15 - high) + 4;
  pages.rule(pages.y - 2, 0.35);
}
