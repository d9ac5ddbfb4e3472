import { randomUUID } from 'node:crypto';
import { InputError } from '@second-spanner/shared/contracts/input-error';
import type { Agreement, NewSecondReadingRequest } from '@second-spanner/shared/contracts/sheets';
import type { SecondReadingContent } from '@second-spanner/shared/contracts/steps';
import { compareSecond } from '@second-spanner/shared/sheet/second-check';
import { conflict, refusedByRules } from '../platform/errors/http-problem.js';
import type { SignedIn } from '../platform/signing-in/signed-in.js';
import type { ToolsService } from '../registers/tools.service.js';
import { fromContent } from './from-content.js';
import { isReplay, onceFor } from './once.service.js';
import type { SecondReadingRow } from './record.entity.js';
import { RecordsRepository, type Once } from './records.repository.js';
import type { Done, OpenSheet, SheetWork, StepAnswer } from './sheet-work.service.js';
import { raiseSnag, type After } from './snag-deeds.service.js';
import { currentOf, hasOpenDisagreement, readersOf, type StepAtHand } from './step-at-hand.js';
import { whyNotReadAgain } from './step-rules.js';

/** Keeps the second person's own reading, and only then puts it beside the first. */
export class SecondReadingsService {
  constructor(
    private readonly work: SheetWork,
    private readonly tools: ToolsService,
  ) {}

  async keep(
    who: SignedIn,
    sheetId: string,
    code: string,
    request: NewSecondReadingRequest,
    key: string,
  ): Promise<StepAnswer> {
    const once = onceFor(key, { personId: who.person.id, sheetId, code, body: request });
    return this.work.onStep(who, sheetId, code, async (open, step) => {
      const sentBefore = await new RecordsRepository(open.scope).sentUnder('second_readings', key);
      if (isReplay(sentBefore, once)) return null;
      return this.compare(open, step, request.content, once);
    });
  }

  private async compare(
    open: OpenSheet,
    step: StepAtHand,
    content: SecondReadingContent,
    once: Once,
  ): Promise<Done> {
    const { scope, sheet, by, at } = open;
    const why = whyNotReadAgain(step, by);
    if (why !== null) throw refusedByRules(why);
    if (readersOf(step).includes(by.id)) throw conflict('Your own reading of this round is in already.');
    const { row, records } = step;
    const agreement = await this.agreementOf(open, step, content);
    const reading: SecondReadingRow = {
      ...{ id: randomUUID(), round: row.round, content, agreement, by, at: at.toISOString() },
    };
    await new RecordsRepository(scope).addSecondReading({ sheetId: sheet.id, stepId: row.id }, reading, once);
    const { id, round } = reading;
    const event = { kind: 'second-reading', step: row.code, id, round, content, agreement } as const;
    const read = {
      ...step,
      records: { ...records, secondReadings: [...records.secondReadings, reading] },
    };
    const after = await disagreementOf(open, read, agreement);
    return { events: [event, ...after.events], step: after.step };
  }

  /** How a second reading of a step stands beside what is recorded now. */
  async agreementOf(
    { scope, at }: OpenSheet,
    step: StepAtHand,
    content: SecondReadingContent,
  ): Promise<Agreement> {
    const { definition } = step.records;
    const tools = await this.tools.listIn(scope);
    const entries = currentOf(step);
    try {
      return compareSecond({ definition, entries, tools, on: at.toISOString().slice(0, 10) }, content);
    } catch (error) {
      throw error instanceof InputError ? fromContent(error) : error;
    }
  }
}

/** Two readings that do not agree are a snag by themselves; one that is open already is enough. */
async function disagreementOf(open: OpenSheet, step: StepAtHand, agreement: Agreement): Promise<After> {
  if (agreement.verdict === 'pass' || hasOpenDisagreement(step.records)) return { step, events: [] };
  return raiseSnag(open, step, {
    ...{ cause: 'disagreement', words: agreement.reason, entryId: null },
    parties: partiesOf(open, step),
  });
}

/** The two sides of a disagreement: who recorded what counts, and the second person. */
export const partiesOf = ({ by }: OpenSheet, step: StepAtHand): string[] => [
  ...new Set([...currentOf(step).map((entry) => entry.by), by.id]),
];
