import type { PersonName } from '@second-spanner/shared/contracts/people';
import type { StepDetail } from '@second-spanner/shared/contracts/sheets';
import { isDone, nextStep } from '@second-spanner/shared/sheet/gates';
import { mayReadAgain } from '@second-spanner/shared/sheet/second-check';
import { appendToLedger } from '../ledger/ledger.service.js';
import type { LedgerEvent } from '../ledger/ledger-event.js';
import type { Database, ShopScope } from '../platform/database/database.js';
import { notFound } from '../platform/errors/http-problem.js';
import { notifySheetChanged } from '../platform/live-events/notify-sheet-changed.js';
import type { SignedIn } from '../platform/signing-in/signed-in.js';
import type { LockedSheetRow, SheetEntity } from './sheet.entity.js';
import { SheetsRepository } from './sheets.repository.js';
import { acceptedOf, currentOf, factsOf, toGateStep, type StepAtHand } from './step-at-hand.js';
import type { StepRow } from './step.entity.js';
import { toStepDetail } from './step.mapper.js';
import { StepsRepository, type StepCounts } from './steps.repository.js';

/** The clock that everything recorded is dated by. */
export type Now = () => Date;

/** A sheet in one transaction, its row locked: everything on it is done one after another. */
export interface OpenSheet {
  readonly scope: ShopScope;
  readonly sheet: LockedSheetRow;
  readonly by: PersonName;
  readonly at: Date;
}

/** What a deed did to a sheet. */
export interface Done {
  readonly events: readonly LedgerEvent[];
  /** The step that it was done on, as it stands afterwards. */
  readonly step?: StepAtHand;
  readonly change?: Partial<SheetEntity>;
}

/** A step after a deed on it, as the person who did it may see it. */
export interface StepAnswer {
  /** False when the request was sent before: then nothing was done again. */
  readonly isNew: boolean;
  readonly detail: StepDetail;
}

/** Opens sheets for deeds. A deed on a step that answers null did nothing, and nobody is told. */
export class SheetWork {
  constructor(
    private readonly database: Database,
    private readonly now: Now,
  ) {}

  async onSheet(who: SignedIn, sheetId: string, deed: (open: OpenSheet) => Promise<Done>): Promise<void> {
    await this.open(who, sheetId, async (open) => close(open, await deed(open)));
  }

  /** @param code of the step, or how to find it on the open sheet */
  async onStep(
    who: SignedIn,
    sheetId: string,
    code: string | ((open: OpenSheet) => Promise<string>),
    deed: (open: OpenSheet, step: StepAtHand) => Promise<Done | null>,
  ): Promise<StepAnswer> {
    return this.open(who, sheetId, async (open) => {
      const step = await openStep(open, typeof code === 'string' ? code : await code(open));
      const done = await deed(open, step);
      const { version } = open.sheet;
      const after = done === null ? { version, step } : await close(open, done);
      const detail = { sheetId, person: who.person, version: after.version, step: after.step ?? step };
      return { isNew: done !== null, detail: toStepDetail(detail) };
    });
  }

  private async open<T>(
    { shop, person }: SignedIn,
    sheetId: string,
    work: (open: OpenSheet) => Promise<T>,
  ): Promise<T> {
    return this.database.withShop(shop.id, async (scope) => {
      const sheet = await new SheetsRepository(scope).lock(sheetId);
      if (!sheet) throw notFound('sheet');
      const by = { id: person.id, name: person.name, role: person.role };
      return work({ scope, sheet, by, at: this.now() });
    });
  }
}

/** A step of an open sheet with its records. */
async function openStep({ scope, sheet }: OpenSheet, code: string): Promise<StepAtHand> {
  const found = await new StepsRepository(scope).atHand(sheet.id, code);
  if (!found) throw notFound('step');
  const { state: sheetState, countersigner } = sheet;
  return { sheetState, secondPerson: countersigner.name, secondPersonId: countersigner.id, ...found };
}

/** A sheet after a deed on it. */
interface Closed {
  readonly version: number;
  readonly step: StepAtHand | undefined;
}

/** Counts again what the deed changed, appends to the ledger, and lets everybody who looks know. */
async function close({ scope, sheet, by, at }: OpenSheet, { events, step, change }: Done): Promise<Closed> {
  const counted = step && recounted(step, at);
  if (counted) await new StepsRepository(scope).setCounts(counted.row.id, countsOf(counted.row));
  const version = sheet.version + 1;
  // The ledger first: a sheet that is released takes no more lines.
  const dated = events.map((event) => ({ at, event }));
  await appendToLedger(scope, sheet.id, by, dated);
  const sums = counted && sumsOf(counted.steps);
  await new SheetsRepository(scope).update(sheet.id, { ...sums, ...change, version, changedAt: at });
  notifySheetChanged(scope, sheet.id, version);
  return { version, step: counted };
}

/** What a sheet counts of its steps. */
function sumsOf(steps: readonly StepRow[]): Pick<SheetEntity, 'stepsDone' | 'openSnags' | 'nextStep'> {
  const gates = steps.map(toGateStep);
  return {
    stepsDone: gates.filter(isDone).length,
    openSnags: steps.reduce((sum, { openSnags }) => sum + openSnags, 0),
    nextStep: nextStep(gates),
  };
}

/** A step with everything that is counted of its records counted again. */
function recounted(step: StepAtHand, at: Date): StepAtHand {
  const row = { ...step.row, ...countStep(step, at) };
  return { ...step, row, steps: step.steps.map((each) => (each.id === row.id ? row : each)) };
}

function countsOf(row: StepRow): StepCounts {
  const { round, entriesFromRound, done, verdict, recorderIds, countersigned } = row;
  const { openSnags, awaiting, awaitingSince, critical, uncriticalReason } = row;
  return {
    ...{ round, entriesFromRound, done, verdict, recorderIds, countersigned },
    ...{ openSnags, awaiting, awaitingSince, critical, uncriticalReason },
  };
}

function countStep(step: StepAtHand, at: Date): Partial<StepCounts> {
  const { row, records } = step;
  const { critical } = row;
  const facts = factsOf(step);
  const { done, verdict, recorders, countersigned, openSnags } = facts;
  const waitsForSecond =
    critical &&
    !countersigned &&
    mayReadAgain(records.definition, currentOf(step), facts, acceptedOf(records));
  const awaiting = openSnags > 0 ? 'snag' : waitsForSecond ? 'second-check' : null;
  const since = awaiting === row.awaiting ? row.awaitingSince : at;
  return {
    ...{ done, verdict, countersigned, openSnags },
    recorderIds: [...recorders],
    awaiting,
    awaitingSince: awaiting === null ? null : since,
  };
}
