import type { Page } from '@second-spanner/shared/contracts/paging';
import type { Sheet, SheetSummary, SnagView, StepDetail } from '@second-spanner/shared/contracts/sheets';
import type { Tool } from '@second-spanner/shared/contracts/registers';
import type { Database, ShopScope } from '../platform/database/database.js';
import { notFound } from '../platform/errors/http-problem.js';
import type { SignedIn } from '../platform/signing-in/signed-in.js';
import { pageOf, type Paging } from '../platform/validation/paging.js';
import type { ToolsService } from '../registers/tools.service.js';
import { contentOf, withFrozenHead, withFrozenRecords, type SheetContent } from './sheet-content.js';
import type { WholeSheetRow } from './sheet.entity.js';
import { toSheet, toSheetSummary } from './sheet.mapper.js';
import { SheetsRepository, type SheetFilter } from './sheets.repository.js';
import { factsOf, type StepAtHand } from './step-at-hand.js';
import type { StepRow } from './step.entity.js';
import { toSnag, toStepDetail } from './step.mapper.js';
import { StepsRepository } from './steps.repository.js';

/** Reads sheets as one person may see them. A car owner sees the sheets of their own cars. */
export class SheetReading {
  constructor(
    private readonly database: Database,
    private readonly tools: ToolsService,
  ) {}

  async list(who: SignedIn, filter: SheetFilter, paging: Paging): Promise<Page<SheetSummary>> {
    const rows = await this.database.readShop(who.shop.id, (scope) =>
      sheetsFor(who, scope).list(filter, paging),
    );
    return pageOf(rows, paging, ({ changedAt, id }) => [changedAt.toISOString(), id], toSheetSummary);
  }

  /** The sheets of a car, within somebody else's work on the database. */
  readonly ofCar = async (scope: ShopScope, carId: string): Promise<SheetSummary[]> =>
    (await new SheetsRepository(scope).ofCar(carId)).map(toSheetSummary);

  async version(who: SignedIn, id: string): Promise<number> {
    const version = await this.database.readShop(who.shop.id, (scope) => sheetsFor(who, scope).version(id));
    if (version === null) throw notFound('sheet');
    return version;
  }

  async sheet(who: SignedIn, id: string): Promise<Sheet> {
    return this.database.readShop(who.shop.id, async (scope) => {
      const row = await findSheet(who, scope, id);
      return toSheet(row, await new StepsRepository(scope).list(id), who.person);
    });
  }

  async step(who: SignedIn, id: string, code: string): Promise<StepDetail> {
    return this.database.readShop(who.shop.id, async (scope) => {
      const sheet = await findSheet(who, scope, id);
      const step = await findStep(scope, sheet, code);
      return toStepDetail({ sheetId: id, version: sheet.version, step, person: who.person });
    });
  }

  /**
   * A sheet with all its steps and the tools they were read with, for paper. A released one comes as it was frozen,
   * whatever became of people, cars and tools since.
   */
  async details(who: SignedIn, id: string): Promise<SheetDetails> {
    return this.database.readShop(who.shop.id, async (scope) => {
      const found = await findSheet(who, scope, id);
      const content = found.state === 'released' ? await sheetsFor(who, scope).frozenContent(id) : null;
      const row = content ? withFrozenHead(found, content) : found;
      const read = await allSteps(scope, row);
      const steps = content ? withFrozenRecords(read, content) : read;
      const { person } = who;
      return {
        sheet: toSheet(
          row,
          steps.map((step) => step.row),
          person,
        ),
        steps: steps.map((step) => toStepDetail({ sheetId: id, version: row.version, step, person })),
        tools: content?.tools ?? (await this.tools.listIn(scope)),
      };
    });
  }

  /** A sheet whole and uncovered, for signing, within somebody else's work on the database. */
  async wholeIn(scope: ShopScope, who: SignedIn, id: string): Promise<WholeSheet> {
    const row = await findSheet(who, scope, id);
    const steps = await allSteps(scope, row);
    const content = contentOf(row, steps, await this.tools.listIn(scope));
    return { row, steps: steps.map(countedAnew), content };
  }

  /** All snags of a sheet, oldest first. */
  async snags(who: SignedIn, id: string): Promise<SnagView[]> {
    return this.database.readShop(who.shop.id, async (scope) => {
      const sheet = await findSheet(who, scope, id);
      const steps = await allSteps(scope, sheet);
      return steps
        .flatMap((step) => step.records.snags.map((snag) => toSnag(step, snag, who.person)))
        .sort((a, b) => a.at.localeCompare(b.at));
    });
  }
}

/** A sheet with all its steps, as one person may see them. */
export interface SheetDetails {
  readonly sheet: Sheet;
  readonly steps: readonly StepDetail[];
  readonly tools: readonly Tool[];
}

/** A sheet with its steps, and its content as it would be signed. */
export interface WholeSheet {
  readonly row: WholeSheetRow;
  readonly steps: readonly StepRow[];
  readonly content: SheetContent;
}

export const sheetsFor = ({ person }: SignedIn, scope: ShopScope): SheetsRepository =>
  new SheetsRepository(scope, person.role === 'car-owner' ? person.id : null);

export async function findSheet(who: SignedIn, scope: ShopScope, id: string): Promise<WholeSheetRow> {
  const row = await sheetsFor(who, scope).find(id);
  if (!row) throw notFound('sheet');
  return row;
}

async function findStep(scope: ShopScope, sheet: WholeSheetRow, code: string): Promise<StepAtHand> {
  const found = await new StepsRepository(scope).atHand(sheet.id, code);
  if (!found) throw notFound('step');
  return { ...onSheet(sheet, found.steps), ...found };
}

/** A step's row with its counts worked out from its records: what is signed does not rest on what stands beside them. */
function countedAnew(step: StepAtHand): StepRow {
  const { recorders, ...facts } = factsOf(step);
  return { ...step.row, ...facts, recorderIds: [...recorders] };
}

/** Every step of a sheet with its records. */
export async function allSteps(
  scope: ShopScope,
  sheet: Pick<WholeSheetRow, 'id' | 'state' | 'countersigner'>,
): Promise<StepAtHand[]> {
  const steps = await new StepsRepository(scope).allWithRecords(sheet.id);
  return steps.map((step) => ({ ...onSheet(sheet, steps), row: step, records: step }));
}

const onSheet = (
  { state, countersigner }: Pick<WholeSheetRow, 'state' | 'countersigner'>,
  steps: readonly StepRow[],
): Pick<StepAtHand, 'sheetState' | 'secondPerson' | 'secondPersonId' | 'steps'> => ({
  sheetState: state,
  secondPerson: countersigner.name,
  secondPersonId: countersigner.id,
  steps,
});
