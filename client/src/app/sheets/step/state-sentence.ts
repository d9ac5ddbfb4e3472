import type { SheetState } from '@second-spanner/shared/contracts/sheets';

const sentences: Record<Exclude<SheetState, 'on-the-stand'>, string> = {
  planned: 'This sheet is planned. Nothing is recorded before it is put on the stand.',
  countersigning: 'The builder has signed this sheet: it takes no more entries unless it is sent back.',
  'signed-off': 'This sheet is signed off: it takes no more entries unless it is sent back.',
  released: 'This sheet is released and frozen.',
};

/** Why a sheet takes no entries as it stands; null on the stand. */
export function stateSentence(state: SheetState): string | null {
  return state === 'on-the-stand' ? null : sentences[state];
}
