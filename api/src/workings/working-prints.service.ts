import type { CarSummary } from '@second-spanner/shared/contracts/car-files';
import type { KeptWorking } from '@second-spanner/shared/contracts/kept-workings';
import { begunFrom, type Working, type WorkingCase } from '@second-spanner/shared/workings/working';
import { typedLines } from '@second-spanner/shared/workings/working-text';
import { HttpProblem, notFound, refusedByRules } from '../platform/errors/http-problem.js';
import type { SignedIn } from '../platform/signing-in/signed-in.js';
import { parsePaper } from '../paper/paper-size.js';
import type { Print } from '../printing/print-task.js';
import type { KeptWorkingsService } from './kept-workings.service.js';
import { fileName } from './file-name.js';
import type { WorkingPaper } from './paper/working-paper.js';
import { readTyped } from './read-typed.js';
import { loadWorking, workOut } from './work-out.js';

export interface PrintedWorking {
  readonly name: string;
  readonly pdf: Uint8Array;
}

/** Puts workings on paper, in the trade words of the person who asks. */
export class WorkingPrints {
  constructor(
    private readonly keptWorkings: Pick<KeptWorkingsService, 'findWithCar'>,
    private readonly publicUrl: URL,
    private readonly toPdf: Print,
    private readonly now: () => Date,
  ) {}

  /** A case as it stands in an address. Throws a 404 problem for an unknown key, 400 for a case without an answer. */
  async case(
    who: SignedIn,
    key: string,
    typed: Readonly<Record<string, unknown>>,
    paper: unknown,
  ): Promise<PrintedWorking> {
    const working = await loadWorking(key);
    if (!working) throw notFound('working');
    // A day, and no moment: within it, two sheets of one case are the same to the byte.
    const day = `${this.now().toISOString().slice(0, 10)}T00:00:00.000Z`;
    const read = readTyped(working, typed, '');
    return this.print(who, { working, typed: read, paper, kept: null, date: day, path: '' });
  }

  /** A working kept with a car, worked out again from what was typed. */
  async kept(
    who: SignedIn,
    { carId, id }: { readonly carId: string; readonly id: string },
    paper: unknown,
  ): Promise<PrintedWorking> {
    const { car, kept } = await this.keptWorkings.findWithCar(who, carId, id);
    const working = await loadWorking(kept.working);
    if (!working) throw notFound('working');
    const { typed, keptAt: date } = kept;
    try {
      return await this.print(who, { working, typed, paper, kept: { car, kept }, date, path: 'typed.' });
    } catch (error) {
      if (!(error instanceof HttpProblem && error.trouble === 'bad-input')) throw error;
      throw refusedByRules(`This working asks otherwise since it was kept: ${error.detail}`);
    }
  }

  private async print({ shop, person }: SignedIn, toPrint: ToPrint): Promise<PrintedWorking> {
    const { working, typed, kept, date } = toPrint;
    const size = parsePaper(toPrint.paper);
    const dialect = person.dialect ?? shop.dialect;
    const { parts, assumed, cautions, basis } = workOut(working, typed, dialect, toPrint.path);
    // What it was begun from stands over the page, and not among what was typed.
    const { [begunFrom]: of = '', ...fields } = typed;
    const paper: WorkingPaper = {
      ...{ title: working.title, asks: working.asks, typed: typedLines(working, fields), begunFrom: of },
      ...{ parts, assumed, cautions, basis, date, dialect, paper: size },
      ...{ shopName: shop.name, demo: shop.demo, address: this.addressOf(working, typed) },
      workedOutBy: kept?.kept.keptBy ?? person.name,
      kept: kept && {
        ...{ title: kept.kept.title, keptAt: kept.kept.keptAt },
        ...{ carCode: kept.car.code, carName: kept.car.name },
      },
    };
    const name = fileName(working.key, of, kept?.car.code);
    return { name, pdf: await this.toPdf({ kind: 'working', paper }) };
  }

  /** Where the same case opens again. */
  private addressOf({ group, key }: Working, typed: WorkingCase): string {
    const address = new URL(`/workings/${group}/${key}`, this.publicUrl);
    for (const [name, text] of Object.entries(typed)) if (text !== '') address.searchParams.set(name, text);
    return address.href;
  }
}

interface ToPrint {
  readonly working: Working;
  readonly typed: WorkingCase;
  readonly paper: unknown;
  readonly kept: { readonly car: CarSummary; readonly kept: KeptWorking } | null;
  /** ISO time that stands on the paper. */
  readonly date: string;
  readonly path: string;
}
