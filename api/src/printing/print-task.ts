import type { BuildSheet } from '../build-sheets/build-sheet.js';
import type { WorkingPaper } from '../workings/paper/working-paper.js';

/** What is to be put on paper: plain data, so that it can be sent to another thread. */
export type PrintTask =
  | { readonly kind: 'build-sheet'; readonly build: BuildSheet }
  | { readonly kind: 'working'; readonly paper: WorkingPaper };

/** Makes a PDF, on whichever thread. */
export type Print = (task: PrintTask) => Promise<Uint8Array>;
