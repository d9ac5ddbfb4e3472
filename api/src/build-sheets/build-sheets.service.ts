import { parsePaper } from '../paper/paper-size.js';
import type { SignedIn } from '../platform/signing-in/signed-in.js';
import type { SheetReading } from '../sheets/sheet-reading.service.js';
import type { Print } from '../printing/print-task.js';

export interface PrintedSheet {
  readonly name: string;
  readonly pdf: Uint8Array;
}

/** Prints sheets as the person who asks may see them: what is covered from them is covered on paper. */
export class BuildSheetsService {
  constructor(
    private readonly sheets: SheetReading,
    private readonly publicUrl: URL,
    private readonly toPdf: Print,
  ) {}

  /** @throws InputError on `paper`; a problem when there is no such sheet for this person */
  async print(who: SignedIn, id: string, paper: unknown): Promise<PrintedSheet> {
    const size = parsePaper(paper);
    const details = await this.sheets.details(who, id);
    const build = {
      ...details,
      paper: size,
      ...{ shopName: who.shop.name, demo: who.shop.demo, dialect: who.shop.dialect },
      verificationAddress: new URL('/v', this.publicUrl).href,
    };
    const pdf = await this.toPdf({ kind: 'build-sheet', build });
    return { name: pdfName(details.sheet.code), pdf };
  }
}

/** A file name that can stand in a header: a header holds neither quotes nor letters beyond the basic ones. */
export const pdfName = (sheetCode: string): string =>
  `build-sheet-${sheetCode.replaceAll(/[^A-Za-z0-9-]/g, '_')}.pdf`;
