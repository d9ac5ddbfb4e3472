import type { Page } from '@second-spanner/shared/contracts/paging';
import type { HistoryLine } from '@second-spanner/shared/contracts/sheets';
import { stepOf, toHistoryLine } from '../ledger/history-line.js';
import { newestLines } from '../ledger/ledger.service.js';
import type { Database } from '../platform/database/database.js';
import { badInput } from '../platform/errors/http-problem.js';
import type { SignedIn } from '../platform/signing-in/signed-in.js';
import { pageOf, type Paging } from '../platform/validation/paging.js';
import { findSheet } from './sheet-reading.service.js';
import { coveredFrom } from './step-at-hand.js';
import { StepsRepository } from './steps.repository.js';

/** Tells the history of sheets out of their ledgers, as one person may hear it. */
export class HistoryService {
  constructor(private readonly database: Database) {}

  /** What happened to a sheet, newest first. */
  async lines(who: SignedIn, id: string, paging: Paging): Promise<Page<HistoryLine>> {
    const before = seqOf(paging);
    return this.database.readShop(who.shop.id, async (scope) => {
      await findSheet(who, scope, id);
      const lines = await newestLines(scope, id, before, paging.limit + 1);
      // After the lines: figures that a person may see by then, they may see in these lines too.
      const cases = await new StepsRepository(scope).coverCases(id);
      const covered = new Set(
        cases.filter((step) => coveredFrom(step, step.readers, who.person.id)).map(({ code }) => code),
      );
      return pageOf(
        lines,
        paging,
        ({ seq }) => [String(seq)],
        (line) => toHistoryLine(line, covered.has(stepOf(line) ?? '')),
      );
    });
  }
}

function seqOf({ after }: Paging): number | null {
  if (after === null) return null;
  const [seq = ''] = after;
  if (/^[1-9]\d{0,8}$/.test(seq)) return Number(seq);
  throw badInput({ field: 'cursor', message: 'This cursor is none that was given out here.' });
}
