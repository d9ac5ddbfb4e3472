import { shopNote, type Frame } from '../paper/frame.js';
import { grey, type Pages } from '../paper/page.js';
import { drawCode, runsOf, type Run } from '../paper/quick-response.js';
import type { BuildSheet } from './build-sheet.js';

/** The title block and the foot of a build sheet: a released one bears the code that it is verified by. */
export function frameOf(build: BuildSheet): Frame {
  const { sheet, paper, shopName } = build;
  const name = `${sheet.carName}, engine ${sheet.engineCode}`;
  const spec = `${sheet.engineCode}, edition ${sheet.specEdition}`;
  return {
    ...{ paper, author: shopName, made: new Date(sheet.changedAt), note: shopNote(build) },
    title: `Build sheet ${sheet.code}, ${name}`,
    head: {
      caption: sheet.state === 'released' ? 'Build sheet' : 'Build sheet: RUNNING, NOT SIGNED',
      name,
      cells: [
        { caption: 'Sheet', value: sheet.code, width: 74, font: 'figures-medium' },
        { caption: 'Spec', value: spec, width: 96, font: 'text-medium' },
        { caption: 'Engine number', value: sheet.engineNumber, width: 104, font: 'figures-medium' },
      ],
    },
    foot:
      sheet.state === 'released' && sheet.verificationCode
        ? verified(build, sheet.verificationCode)
        : running(build),
  };
}

function verified({ verificationAddress }: BuildSheet, code: string): Frame['foot'] {
  const address = `${verificationAddress}/${code}`;
  let runs: readonly Run[] | undefined;
  return (pages: Pages, top: number) => {
    const x = pages.left;
    drawCode(pages.document, (runs ??= runsOf(address)), x, top + 8, 44);
    const words = 'To check that this is the sheet that was signed';
    pages.text(words, x + 54, top + 9, { font: 'plate', size: 8, width: 300 });
    pages.text(code, x + 54, top + 20, { font: 'figures-medium', size: 11, width: 300 });
    pages.text(address, x + 54, top + 36, { size: 8, width: 330, colour: grey });
  };
}

const running =
  ({ sheet }: BuildSheet): Frame['foot'] =>
  (pages, top) => {
    const x = pages.left;
    pages.text('Running sheet, not signed', x, top + 9, { font: 'text-strong', size: 12, width: 300 });
    const words = `As it stood on version ${sheet.version}. It can't be verified until it is released.`;
    pages.text(words, x, top + 27, { size: 8, width: 330, colour: grey });
  };
