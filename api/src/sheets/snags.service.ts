import type { NewSnagRequest, SettleSnagRequest } from '@second-spanner/shared/contracts/sheets';
import { may } from '@second-spanner/shared/contracts/permissions';
import { conflict, forbidden, notFound, refusedByRules } from '../platform/errors/http-problem.js';
import type { SignedIn } from '../platform/signing-in/signed-in.js';
import type { SnagRow } from './record.entity.js';
import type { OpenSheet, SheetWork, StepAnswer } from './sheet-work.service.js';
import { raiseSnag, settle } from './snag-deeds.service.js';
import { SnagsRepository } from './snags.repository.js';
import { currentOf, type StepAtHand } from './step-at-hand.js';
import { whyNotAccept, whyNotSettle, whySheetClosed } from './step-rules.js';

/** Raises and settles snags. */
export class SnagsService {
  constructor(private readonly work: SheetWork) {}

  async raise(who: SignedIn, sheetId: string, code: string, { words }: NewSnagRequest): Promise<StepAnswer> {
    return this.work.onStep(who, sheetId, code, async (open, step) => {
      const closed = whySheetClosed(step.sheetState);
      if (closed !== null) throw refusedByRules(closed);
      return raiseSnag(open, step, { cause: 'raised', words, parties: [], entryId: doubted(step) });
    });
  }

  async settle(
    who: SignedIn,
    sheetId: string,
    snagId: string,
    request: SettleSnagRequest,
  ): Promise<StepAnswer> {
    if (request.how === 'accepted-as-it-is' && !may(who.person.role, 'snags.accept')) {
      throw forbidden('Only a foreman accepts a {snag} as it is.');
    }
    const stepOf = async ({ scope }: OpenSheet): Promise<string> => {
      const code = await new SnagsRepository(scope).stepOf(sheetId, snagId);
      if (code === null) throw notFound('snag');
      return code;
    };
    return this.work.onStep(who, sheetId, stepOf, async (open, step) => {
      const snag = step.records.snags.find(({ id }) => id === snagId);
      if (!snag) throw notFound('snag');
      if (snag.settled) throw conflict(`This {snag} was settled by ${snag.settled.by.name} already.`);
      const why = whyNotSettle(step, snag, open.by.id);
      if (why !== null) throw refusedByRules(why);
      const own = request.how === 'accepted-as-it-is' ? whyNotAccept(step, snag, open.by.id) : null;
      if (own !== null) throw refusedByRules(own);
      const { step: settled, events } = await settle(open, step, snag, request);
      return { events, step: withRounds(settled, snag, request) };
    });
  }
}

/**
 * What was redone or replaced begins a new round: second readings and countersignatures count no longer. What was
 * recorded counts no longer either, but for a failed entry, which its own correction replaces.
 */
function withRounds(step: StepAtHand, { cause }: SnagRow, { how }: SettleSnagRequest): StepAtHand {
  if (how === 'accepted-as-it-is') return step;
  const round = step.row.round + 1;
  const entriesFromRound = cause === 'failed' ? step.row.entriesFromRound : round;
  return { ...step, row: { ...step.row, round, entriesFromRound } };
}

/** The latest entry that is doubtful: a snag raised on it lets the foreman decide what no tool could. */
const doubted = (step: StepAtHand): string | null =>
  currentOf(step)
    .filter(({ verdict }) => verdict === 'doubtful')
    .at(-1)?.id ?? null;
