import { randomUUID } from 'node:crypto';
import type { NewCountersignatureRequest } from '@second-spanner/shared/contracts/sheets';
import { finalPass, planOf } from '@second-spanner/shared/sheet/plan-of';
import type { LedgerEvent } from '../ledger/ledger-event.js';
import { badInput, conflict, refusedByRules } from '../platform/errors/http-problem.js';
import type { SignedIn } from '../platform/signing-in/signed-in.js';
import { isReplay, onceFor } from './once.service.js';
import type { CountersignatureRow } from './record.entity.js';
import { RecordsRepository, type Once } from './records.repository.js';
import { partiesOf, type SecondReadingsService } from './second-readings.service.js';
import type { Done, OpenSheet, SheetWork, StepAnswer } from './sheet-work.service.js';
import { raiseSnag } from './snag-deeds.service.js';
import { hasOpenDisagreement, type StepAtHand } from './step-at-hand.js';
import { whyNotAgree, whyNotCountersign, whySheetClosed } from './step-rules.js';

/** Countersigns steps, or disputes them. */
export class CountersigningService {
  constructor(
    private readonly work: SheetWork,
    private readonly readings: SecondReadingsService,
  ) {}

  async countersign(
    who: SignedIn,
    sheetId: string,
    code: string,
    request: NewCountersignatureRequest,
    key: string,
  ): Promise<StepAnswer> {
    const once = onceFor(key, { personId: who.person.id, sheetId, code, body: request });
    return this.work.onStep(who, sheetId, code, async (open, step) => {
      const sentBefore = await new RecordsRepository(open.scope).sentUnder('countersignatures', key);
      if (isReplay(sentBefore, once)) return null;
      const closed = whySheetClosed(step.sheetState);
      if (closed !== null) throw refusedByRules(closed);
      refuseSecondTime(open, step);
      const why = whyNotCountersign(step, open.by.id);
      if (why !== null) throw refusedByRules(why);
      const { outcome } = request;
      return outcome === 'agree'
        ? this.agree(open, step, request, once)
        : this.dispute(open, step, request, once);
    });
  }

  private async agree(
    open: OpenSheet,
    step: StepAtHand,
    request: NewCountersignatureRequest,
    once: Once,
  ): Promise<Done> {
    if (request.reason !== undefined) {
      throw badInput({ field: 'reason', message: 'Only a dispute has a reason.' });
    }
    const why = whyNotAgree(step, open.by.id);
    if (why !== null) throw refusedByRules(why);
    requirePulls(step, request.pullsWitnessed ?? []);
    await this.requireStillAgreeing(open, step);
    const signed = await sign(open, step, request, once);
    return { events: [toEvent(step, signed)], step: withSignature(step, signed) };
  }

  /** The wrench's setting is read before the pulls; what was then recorded must still be what was read. */
  private async requireStillAgreeing(open: OpenSheet, step: StepAtHand): Promise<void> {
    const { row, records } = step;
    const own = records.secondReadings.find(({ round, by }) => round === row.round && by.id === open.by.id);
    if (own?.content.kind !== 'setting-and-pull-witnessed' || own.agreement.verdict !== 'pass') return;
    const agreement = await this.readings.agreementOf(open, step, own.content);
    if (agreement.verdict !== 'pass') throw refusedByRules(agreement.reason);
  }

  private async dispute(
    open: OpenSheet,
    step: StepAtHand,
    request: NewCountersignatureRequest,
    once: Once,
  ): Promise<Done> {
    const { reason } = request;
    if (reason === undefined) throw badInput({ field: 'reason', message: 'Say what is wrong.' });
    const signed = await sign(open, step, request, once);
    const disputed = withSignature(step, signed);
    const event = toEvent(step, signed);
    if (hasOpenDisagreement(step.records)) return { events: [event], step: disputed };
    const parties = partiesOf(open, step);
    const after = await raiseSnag(open, disputed, {
      ...{ cause: 'disagreement', words: reason, parties, entryId: null },
    });
    return { events: [event, ...after.events], step: after.step };
  }
}

/** One agreement a round; and nobody disputes twice what is still disputed. */
function refuseSecondTime({ by }: OpenSheet, { row, records }: StepAtHand): void {
  const ofRound = records.countersignatures.filter(({ round }) => round === row.round);
  const agreed = ofRound.find(({ outcome }) => outcome === 'agree');
  if (agreed) throw conflict(`Step ${row.code} is countersigned by ${agreed.by.name} already.`);
  const disputed = ofRound.some((each) => each.by.id === by.id);
  if (disputed && hasOpenDisagreement(records)) {
    throw conflict('You dispute this step already; the {snag} must be settled first.');
  }
}

/** Who watched the pulls names every fastener of the last torque pass. */
function requirePulls({ records: { definition } }: StepAtHand, witnessed: readonly string[]): void {
  const watched = definition.kind === 'tightening' && definition.secondCheck === 'setting-and-pull-witnessed';
  if (!watched) {
    if (witnessed.length === 0) return;
    throw badInput({ field: 'pullsWitnessed', message: 'This step has no pulls to witness.' });
  }
  const pass = finalPass(definition);
  const fasteners = planOf(definition)
    .steps.filter((step) => step.pass === pass)
    .map(({ fastener }) => fastener);
  const unknown = witnessed.find((fastener) => !fasteners.includes(fastener));
  if (unknown !== undefined) {
    const message = `There is no ${definition.group.noun} ${unknown} in pass ${pass}.`;
    throw badInput({ field: 'pullsWitnessed', message });
  }
  const missing = fasteners.filter((fastener) => !witnessed.includes(fastener));
  if (missing.length === 0) return;
  throw refusedByRules(`Not witnessed yet: ${definition.group.noun} ${missing.join(', ')}.`);
}

async function sign(
  { scope, sheet, by, at }: OpenSheet,
  { row }: StepAtHand,
  { outcome, reason, pullsWitnessed = [] }: NewCountersignatureRequest,
  once: Once,
): Promise<CountersignatureRow> {
  const signed: CountersignatureRow = {
    ...{ id: randomUUID(), round: row.round, outcome, reason: reason ?? null, by, at: at.toISOString() },
    pullsWitnessed: outcome === 'agree' ? [...new Set(pullsWitnessed)] : [],
  };
  await new RecordsRepository(scope).addCountersignature({ sheetId: sheet.id, stepId: row.id }, signed, once);
  return signed;
}

function toEvent({ row }: StepAtHand, signed: CountersignatureRow): LedgerEvent {
  const { id, round, outcome, reason, pullsWitnessed } = signed;
  return { kind: 'countersignature', step: row.code, id, round, outcome, reason, pullsWitnessed };
}

const withSignature = (step: StepAtHand, signed: CountersignatureRow): StepAtHand => ({
  ...step,
  records: { ...step.records, countersignatures: [...step.records.countersignatures, signed] },
});
