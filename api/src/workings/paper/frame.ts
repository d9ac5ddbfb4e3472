import { tradeText } from '@second-spanner/shared/contracts/trade-words';
import { shopNote, type Frame, type HeadCell } from '../../paper/frame.js';
import { grey, type Pages } from '../../paper/page.js';
import { drawCode, runsOf, type Run } from '../../paper/quick-response.js';
import { dayOf } from '../../paper/stamp.js';
import type { WorkingPaper } from './working-paper.js';

/** The longest address that the code in the foot still gives to a telephone. */
const longestInFootCode = 160;
/** The longest that a code on the page gives. */
const longestInCode = 900;
const codeSide = 100;
/** The longest that stands in the foot in full. */
const longestInFoot = 140;

/** The title block and the foot of a working on paper. */
export function workingFrame(working: WorkingPaper): Frame {
  const { paper, shopName, date, kept, dialect, begunFrom } = working;
  const name = tradeText(working.title, dialect);
  const day: HeadCell = {
    ...{ caption: kept ? 'Kept' : 'Printed', value: dayOf(date), width: 84, font: 'text-medium' },
  };
  const car: HeadCell | null = kept && {
    ...{ caption: 'Car', value: kept.carCode, width: 74, font: 'figures-medium' },
  };
  const full = begunFrom === '' ? name : `${name}, ${begunFrom}`;
  return {
    ...{ paper, author: shopName, made: new Date(date), note: shopNote(working) },
    title: kept ? `${full}: ${kept.title}, ${kept.carName}` : full,
    head: { caption: 'Working without a sheet', name, cells: car ? [car, day] : [day] },
    foot: footOf(working.address),
  };
}

function footOf(address: string): Frame['foot'] {
  const shown =
    address.length > longestInFoot ? `${address.split('?', 1)[0] ?? ''}, with what was typed above` : address;
  let runs: readonly Run[] | undefined;
  return (pages, top) => {
    let x = pages.left;
    if (address.length <= longestInFootCode) {
      drawCode(pages.document, (runs ??= runsOf(address)), x, top + 8, 44);
      x += 54;
    }
    const words = 'A working without a sheet: it records nothing of any engine.';
    pages.text(words, x, top + 9, { font: 'text-strong', size: 8.5, width: 320 });
    const height = pages.text(shown, x, top + 23, { size: 8, width: 320, colour: grey });
    // On a screen the words open the case, however long its address is.
    pages.document.link(x, top + 23, 320, height, address);
  };
}

/** The code of an address that is too long for the one in the foot, where the page still has room for it. */
export function drawLargeCode(pages: Pages, address: string): void {
  if (address.length <= longestInFootCode || address.length > longestInCode) return;
  if (pages.y + 6 + codeSide > pages.bottom) return;
  const y = pages.bottom - codeSide;
  drawCode(pages.document, runsOf(address), pages.left, y, codeSide);
  pages.text('Opens the same case again', pages.left + codeSide + 12, y + codeSide - 12, { size: 8 });
}
