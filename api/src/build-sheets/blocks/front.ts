import { sheetStateWords } from '@second-spanner/shared/sheet/words';
import type { BuildSheet } from '../build-sheet.js';
import type { Pages } from '../../paper/page.js';
import { stamp } from '../../paper/stamp.js';
import type { Wording } from '../words.js';

/** What the sheet is of, and who worked it. */
export function front(pages: Pages, { sheet, shopName }: BuildSheet, words: Wording): void {
  pages.y += pages.text(sheet.carName, pages.left, pages.y, { font: 'text-medium', size: 20 }) + 2;
  const facts: readonly (readonly [string, string])[] = [
    ['Engine', `${sheet.engineCode}, number ${sheet.engineNumber}`],
    ['Owner', sheet.ownerName ?? 'the shop'],
    ['Spec', `${sheet.specTitle}, edition ${sheet.specEdition}`],
    ['Shop', shopName],
    ['Builder', sheet.builder.name],
    ['Second person', sheet.countersigner.name],
    [
      'Sheet',
      `${sheet.code}, ${sheetStateWords[sheet.state]}, ${sheet.stepsDone} of ${sheet.stepsTotal} steps done`,
    ],
    ['Last change', stamp(sheet.changedAt)],
  ];
  const half = pages.width / 2;
  facts.forEach(([caption, value], index) => {
    const x = pages.left + (index % 2) * half;
    pages.text(caption, x, pages.y + 1, { font: 'plate', size: 8.5, width: 80, colour: '#404040' });
    pages.text(value, x + 84, pages.y, { size: 9.5, width: half - 92 });
    if (index % 2 === 1) pages.y += 15;
  });
  pages.y += 4;
  pages.paragraph(
    words.say(
      'Each reading is judged against the spec with the uncertainty of the tool: it passes inside the limits less that, fails beyond them plus that, and is doubtful between. What a second person read was entered before the first reading was shown. Times are UTC.',
    ),
    { size: 8.5, colour: '#404040' },
  );
}
