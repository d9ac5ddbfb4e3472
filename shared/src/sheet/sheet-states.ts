import type { SheetState, SignatureMeaning } from '../contracts/sheets.js';

/** What each signature needs the sheet to be in, and what it makes of it. */
export const signing: Record<SignatureMeaning, { readonly from: SheetState; readonly to: SheetState }> = {
  built: { from: 'on-the-stand', to: 'countersigning' },
  countersigned: { from: 'countersigning', to: 'signed-off' },
  released: { from: 'signed-off', to: 'released' },
};

/** Entries are taken only while the engine is on the stand. */
export const takesEntries = (state: SheetState): boolean => state === 'on-the-stand';

/** A sheet may be sent back to the stand after it was signed, until it is released. */
export const maySendBack = (state: SheetState): boolean =>
  state === 'countersigning' || state === 'signed-off';
