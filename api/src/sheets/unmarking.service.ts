import type { UnmarkCriticalRequest } from '@second-spanner/shared/contracts/sheets';
import { refusedByRules } from '../platform/errors/http-problem.js';
import type { SignedIn } from '../platform/signing-in/signed-in.js';
import type { SheetWork, StepAnswer } from './sheet-work.service.js';
import { whyNotUnmark } from './step-rules.js';

/** Takes the mark of a critical step away, with a reason that prints. */
export class UnmarkingService {
  constructor(private readonly work: SheetWork) {}

  async unmark(
    who: SignedIn,
    sheetId: string,
    code: string,
    { reason }: UnmarkCriticalRequest,
  ): Promise<StepAnswer> {
    return this.work.onStep(who, sheetId, code, (_open, step) => {
      const why = whyNotUnmark(step);
      if (why !== null) throw refusedByRules(why);
      return Promise.resolve({
        events: [{ kind: 'unmarked', step: code, reason }],
        step: { ...step, row: { ...step.row, critical: false, uncriticalReason: reason } },
      });
    });
  }
}
