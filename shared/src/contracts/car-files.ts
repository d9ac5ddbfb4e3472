import type { SheetSummary } from './sheets.js';

export interface CarSummary {
  readonly id: string;
  /** Short code that people say to each other: `LM-C01`. */
  readonly code: string;
  readonly name: string;
  readonly year: number;
  readonly engineCode: string;
  readonly engineNumber: string;
  readonly ownerName: string | null;
  readonly sheetCount: number;
}

export interface CarFile extends CarSummary {
  readonly chassisNumber: string;
  readonly registration: string | null;
  readonly colour: string | null;
  readonly notes: string;
  readonly sheets: readonly SheetSummary[];
}
