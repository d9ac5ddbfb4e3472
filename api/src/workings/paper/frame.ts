import { tradeText } from '@second-spanner/shared/contracts/trade-words';
import { shopNote, type Frame, type HeadCell } from '../../paper/frame.js';
import { grey } from '../../paper/page.js';
import { drawCode, runsOf, type Run } from '../../paper/quick-response.js';
import { dayOf } from '../../paper/stamp.js';
import type { WorkingPaper } from './working-paper.js';

/** The longest address that a code of this size still gives to a telephone. */
const longestInCode = 160;
/** The longest that stands in the foot in full. */
const longestInFoot = 210;

/** The title block and the foot of a working on paper. */
export function workingFrame(working: WorkingPaper): Frame {
  const { paper, shopName, date, kept, dialect } = working;
  const name = tradeText(working.title, dialect);
  const day: HeadCell = {
    ...{ caption: kept ? 'Kept' : 'Printed', value: dayOf(date), width: 84, font: 'text-medium' },
  };
  const car: HeadCell | null = kept && {
    ...{ caption: 'Car', value: kept.carCode, width: 74, font: 'figures-medium' },
  };
  return {
    ...{ paper, author: shopName, made: new Date(date), note: shopNote(working) },
    title: kept ? `${name}: ${kept.title}, ${kept.carName}` : name,
    head: { caption: 'Working without a sheet', name, cells: car ? [car, day] : [day] },
    foot: footOf(working.address),
  };
}

/** Whether the address is too long for the foot, so that it must stand elsewhere in full. */
export const standsApart = (address: string): boolean => address.length > longestInFoot;

function footOf(address: string): Frame['foot'] {
  const shown = standsApart(address)
    ? `${address.split('?', 1)[0] ?? ''} (in full on the last page)`
    : address;
  let runs: readonly Run[] | undefined;
  return (pages, top) => {
    let x = pages.left;
    if (address.length <= longestInCode) {
      drawCode(pages.document, (runs ??= runsOf(address)), x, top + 8, 44);
      x += 54;
    }
    const words = 'A working without a sheet: it records nothing of any engine.';
    pages.text(words, x, top + 9, { font: 'text-strong', size: 8.5, width: 320 });
    pages.text(shown, x, top + 23, { size: 7.5, width: 320, colour: grey });
  };
}
