import type { PersonName } from '@second-spanner/shared/contracts/people';
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
import { currentOf, factsOf, toGateStep, type StepAtHand } from './step-at-hand.js';
import type { StepRow } from './step.entity.js';
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

/** Opens sheets for deeds. A deed that answers null did nothing, and nobody is told. */
export class SheetWork {
  constructor(
    private readonly database: Database,
    private readonly now: Now,
  ) {}

  /** Whether the deed did something. */
  async onSheet(
    { shop, person }: SignedIn,
    sheetId: string,
    deed: (open: OpenSheet) => Promise<Done | null>,
  ): Promise<boolean> {
    return this.database.withShop(shop.id, async (scope) => {
      const sheet = await new SheetsRepository(scope).lock(sheetId);
      if (!sheet) throw notFound('sheet');
      const by = { id: person.id, name: person.name, role: person.role };
      const open = { scope, sheet, by, at: this.now() };
      const done = await deed(open);
      if (done !== null) await close(open, done);
      return done !== null;
    });
  }

  async onStep(
    who: SignedIn,
    sheetId: string,
    code: string,
    deed: (open: OpenSheet, step: StepAtHand) => Promise<Done | null>,
  ): Promise<boolean> {
    return this.onSheet(who, sheetId, async (open) => deed(open, await openStep(open, code)));
  }
}

/** A step of an open sheet with its records. */
export async function openStep({ scope, sheet }: OpenSheet, code: string): Promise<StepAtHand> {
  const repository = new StepsRepository(scope);
  const steps = await repository.list(sheet.id);
  const found = await repository.withRecords(sheet.id, code);
  if (!found) throw notFound('step');
  const { state: sheetState, countersigner } = sheet;
  return { sheetState, secondPerson: countersigner.name, steps, row: found, records: found };
}

/** Counts again what the deed changed, appends to the ledger, and lets everybody who looks know. */
async function close({ scope, sheet, by, at }: OpenSheet, { events, step, change }: Done): Promise<void> {
  const counted = step && (await closeStep(scope, step, at));
  const version = sheet.version + 1;
  // The ledger first: a sheet that is released takes no more lines.
  const dated = events.map((event) => ({ at, event }));
  await appendToLedger(scope, sheet.id, by, dated);
  await new SheetsRepository(scope).update(sheet.id, { ...counted, ...change, version, changedAt: at });
  notifySheetChanged(scope, sheet.id, version);
}

async function closeStep(
  scope: ShopScope,
  step: StepAtHand,
  at: Date,
): Promise<Pick<SheetEntity, 'stepsDone' | 'openSnags' | 'nextStep'>> {
  const counts = countStep(step, at);
  await new StepsRepository(scope).setCounts(step.row.id, counts);
  const steps = step.steps.map((row): StepRow => (row.id === step.row.id ? { ...row, ...counts } : row));
  const gates = steps.map(toGateStep);
  return {
    stepsDone: gates.filter(isDone).length,
    openSnags: steps.reduce((sum, { openSnags }) => sum + openSnags, 0),
    nextStep: nextStep(gates),
  };
}

function countStep(step: StepAtHand, at: Date): StepCounts {
  const { row, records } = step;
  const { round, entriesFromRound, critical, uncriticalReason } = row;
  const facts = factsOf(step);
  const { done, verdict, recorders, countersigned, openSnags } = facts;
  const waitsForSecond =
    critical && !countersigned && mayReadAgain(records.definition, currentOf(step), facts);
  const awaiting = openSnags > 0 ? 'snag' : waitsForSecond ? 'second-check' : null;
  const since = awaiting === row.awaiting ? row.awaitingSince : at;
  return {
    ...{ round, entriesFromRound, critical, uncriticalReason, done, verdict, countersigned, openSnags },
    recorderIds: [...recorders],
    awaiting,
    awaitingSince: awaiting === null ? null : since,
  };
}
