import { randomUUID } from 'node:crypto';
import { InputError } from '@second-spanner/shared/contracts/input-error';
import type { NewEntryRequest } from '@second-spanner/shared/contracts/sheets';
import type { Tool } from '@second-spanner/shared/contracts/registers';
import type { Judgement } from '@second-spanner/shared/contracts/verdict';
import { judgeEntry } from '@second-spanner/shared/sheet/judge-entry';
import { appendToLedger, type DatedEvent } from '../ledger/ledger.service.js';
import type { LedgerEvent } from '../ledger/ledger-event.js';
import { badInput, refusedByRules } from '../platform/errors/http-problem.js';
import type { SignedIn } from '../platform/signing-in/signed-in.js';
import type { ToolsService } from '../registers/tools.service.js';
import { requireItsPlace } from './entry-place.js';
import { fromContent } from './from-content.js';
import { isReplay, onceFor } from './once.service.js';
import { PhotosRepository } from './photos.repository.js';
import type { EntryRow } from './record.entity.js';
import { RecordsRepository, type Once } from './records.repository.js';
import type { Now, OpenSheet, SheetWork, StepAnswer } from './sheet-work.service.js';
import { raiseForFailure, settleByCorrection, type After } from './snag-deeds.service.js';
import type { StepAtHand } from './step-at-hand.js';
import { whyNotRecord } from './step-rules.js';

/** Records what a builder read, pulled, saw or photographed. */
export class EntriesService {
  constructor(
    private readonly work: SheetWork,
    private readonly tools: ToolsService,
    private readonly now: Now,
  ) {}

  async record(
    who: SignedIn,
    sheetId: string,
    code: string,
    request: NewEntryRequest,
    key: string,
  ): Promise<StepAnswer> {
    const once = onceFor(key, { personId: who.person.id, sheetId, code, body: request });
    return this.work.onStep(who, sheetId, code, async (open, step) => {
      const sentBefore = await new RecordsRepository(open.scope).sentUnder('entries', key);
      if (isReplay(sentBefore, once)) return null;
      const { content } = request;
      const tool = 'toolId' in content ? await this.tools.findIn(open.scope, content.toolId) : null;
      return this.keep(open, step, request, once, tool ? [tool] : []);
    });
  }

  /** Records several entries of one step one after another, each dated by the clock, and answers their ids. */
  async recordAll(
    who: SignedIn,
    sheetId: string,
    code: string,
    requests: readonly NewEntryRequest[],
  ): Promise<string[]> {
    const ids: string[] = [];
    const events: DatedEvent[] = [];
    await this.work.onStep(who, sheetId, code, async (open, first) => {
      let step = first;
      const tools = await this.tools.listIn(open.scope);
      for (const request of requests) {
        const at = this.now();
        const once = onceFor(randomUUID(), { personId: who.person.id, sheetId, code, body: request });
        const after = await this.keep({ ...open, at }, step, request, once, tools);
        events.push(...after.events.map((event) => ({ at, event })));
        step = after.step;
        ids.push(step.records.entries.at(-1)?.id ?? '');
      }
      await appendToLedger(open.scope, sheetId, open.by, events);
      return { events: [], step };
    });
    return ids;
  }

  private async keep(
    open: OpenSheet,
    step: StepAtHand,
    request: NewEntryRequest,
    once: Once,
    tools: readonly Tool[],
  ): Promise<After> {
    const { scope, sheet, by, at } = open;
    const why = whyNotRecord(step, by.id);
    if (why !== null) throw refusedByRules(why);
    requireItsPlace(step, request);
    const judgement = await judge(open, step, request, tools);
    const round = roundOf(step, request);
    const { replaces = null, reason: replaceReason = null, content } = request;
    const entry: EntryRow = {
      ...{ id: randomUUID(), round, content, ...judgement, replaces, replaceReason, by },
      at: at.toISOString(),
    };
    const of = { sheetId: sheet.id, stepId: step.row.id };
    await new RecordsRepository(scope).addEntry(of, entry, once);
    const recorded = withEntry(step, entry);
    const after =
      entry.verdict === 'fail'
        ? await raiseForFailure(open, recorded, entry)
        : await settleByCorrection(open, recorded, entry);
    return { events: [toEvent(step, entry), ...after.events], step: after.step };
  }
}

async function judge(
  { scope, at }: OpenSheet,
  { records: { definition } }: StepAtHand,
  { content }: NewEntryRequest,
  tools: readonly Tool[],
): Promise<Judgement> {
  if (content.kind === 'photo' && !(await new PhotosRepository(scope).isStored(content.fileId))) {
    throw badInput({ field: 'content.fileId', message: 'There is no such photo: store it first.' });
  }
  try {
    const { verdict, reason } = judgeEntry(definition, content, {
      tools,
      on: at.toISOString().slice(0, 10),
    });
    return { verdict, reason };
  } catch (error) {
    throw error instanceof InputError ? fromContent(error) : error;
  }
}

/** A correction after a second reading of this round begins a new one: what was read again counts no longer. */
function roundOf({ row, records }: StepAtHand, { replaces }: NewEntryRequest): number {
  const readAgain = records.secondReadings.some(({ round }) => round === row.round);
  return replaces !== undefined && readAgain ? row.round + 1 : row.round;
}

const withEntry = (step: StepAtHand, entry: EntryRow): StepAtHand => ({
  ...step,
  row: { ...step.row, round: entry.round },
  records: { ...step.records, entries: [...step.records.entries, entry] },
});

function toEvent({ row }: StepAtHand, entry: EntryRow): LedgerEvent {
  const { id, round, content, verdict, reason, replaces, replaceReason } = entry;
  return { kind: 'entry', step: row.code, id, round, content, verdict, reason, replaces, replaceReason };
}
