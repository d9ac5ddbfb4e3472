import { randomUUID } from 'node:crypto';
import type { FieldError } from '@second-spanner/shared/contracts/input-error';
import type { PersonName } from '@second-spanner/shared/contracts/people';
import { may } from '@second-spanner/shared/contracts/permissions';
import type { NewSheetRequest } from '@second-spanner/shared/contracts/sheets';
import type { SpecEdition } from '@second-spanner/shared/contracts/spec';
import type { StepDefinition } from '@second-spanner/shared/contracts/steps';
import { nextStep } from '@second-spanner/shared/sheet/gates';
import { proposeSheet, type ProposedSheet } from '@second-spanner/shared/sheet/proposal/propose-sheet';
import { slotsOf } from '@second-spanner/shared/sheet/slots';
import { appendToLedger } from '../ledger/ledger.service.js';
import type { Database, ShopScope } from '../platform/database/database.js';
import { badInput } from '../platform/errors/http-problem.js';
import type { SignedIn } from '../platform/signing-in/signed-in.js';
import type { SpecsService } from '../spec-book/specs.service.js';
import { LayOutRepository } from './lay-out.repository.js';
import type { Now } from './sheet-work.service.js';
import { SheetsRepository } from './sheets.repository.js';
import { toGateStep } from './step-at-hand.js';
import type { StepEntity } from './step.entity.js';
import { shopInitials } from './shop-initials.js';
import { StepsRepository } from './steps.repository.js';

/** What is given for a sheet beside the request. */
export interface Given {
  readonly code?: string;
  readonly proposal?: ProposedSheet;
}

/** Lays out sheets from approved editions. */
export class LayOutService {
  constructor(
    private readonly database: Database,
    private readonly specs: SpecsService,
    private readonly now: Now,
  ) {}

  /**
   * Lays out a planned sheet and answers its id. Its code is the next number of the shop, and its steps are what
   * the spec proposes, where nothing else is given.
   */
  async layOut(who: SignedIn, request: NewSheetRequest, given: Given = {}): Promise<string> {
    return this.database.withShop(who.shop.id, async (scope) => {
      const edition = await this.checked(scope, request);
      const sheets = new SheetsRepository(scope);
      const id = randomUUID();
      const at = this.now();
      const { stages, steps: definitions } = given.proposal ?? proposeSheet(edition.document);
      const steps = definitions.map((definition, index) => toStep(id, definition, index + 1));
      await sheets.insert({
        ...{ id, carId: request.carId, specEditionId: edition.id, builderId: request.builderId },
        ...{ countersignerId: request.countersignerId, createdBy: who.person.id, createdAt: at },
        ...{ changedAt: at, state: 'planned', version: 1, signRound: 1, stages },
        ...{ stepsDone: 0, stepsTotal: steps.length, openSnags: 0 },
        ...{ nextStep: nextStep(steps.map(toGateStep)), contentHash: null, verificationCode: null },
        code:
          given.code ??
          `${shopInitials(who.shop.name)}-${String(await sheets.nextNumber()).padStart(4, '0')}`,
      });
      await new StepsRepository(scope).insertAll(steps);
      const by = { id: who.person.id, name: who.person.name, role: who.person.role };
      const event = { kind: 'laid-out', specHash: edition.hash, steps: steps.length } as const;
      await appendToLedger(scope, id, by, [{ at, event }]);
      return id;
    });
  }

  /** The edition to lay out from. Throws a 400 problem with every field that cannot be used. */
  private async checked(scope: ShopScope, request: NewSheetRequest): Promise<SpecEdition> {
    const repository = new LayOutRepository(scope);
    const engineCode = await repository.engineOf(request.carId);
    const edition = await this.specs.editionIn(scope, request.specEditionId);
    const people = await repository.people([request.builderId, request.countersignerId]);
    const errors = [
      ...(engineCode === null ? [{ field: 'carId', message: 'There is no such car.' }] : []),
      ...editionErrors(edition, engineCode),
      ...personErrors(people, request),
    ];
    if (errors.length > 0 || !edition) throw badInput(...errors);
    return edition;
  }
}

function editionErrors(edition: SpecEdition | null, engineCode: string | null): FieldError[] {
  const error = (message: string): FieldError[] => [{ field: 'specEditionId', message }];
  if (!edition) return error('There is no such edition.');
  if (edition.state !== 'approved') return error('A sheet is laid out from an approved edition only.');
  return engineCode !== null && engineCode !== edition.code
    ? error(`This spec is for the engine ${edition.code}; the car has the engine ${engineCode}.`)
    : [];
}

function personErrors(people: readonly PersonName[], request: NewSheetRequest): FieldError[] {
  const { builderId, countersignerId } = request;
  const roleOf = (id: string) => people.find((person) => person.id === id)?.role;
  const [builder, second] = [roleOf(builderId), roleOf(countersignerId)];
  const errors: FieldError[] = [];
  if (!builder || !may(builder, 'entries.record')) {
    errors.push({ field: 'builderId', message: 'Choose a builder of the shop.' });
  }
  if (!second || !may(second, 'second-checks.make')) {
    errors.push({ field: 'countersignerId', message: 'Choose a second person of the shop.' });
  } else if (builderId === countersignerId) {
    errors.push({ field: 'countersignerId', message: 'The second person is another one than the builder.' });
  }
  return errors;
}

function toStep(sheetId: string, definition: StepDefinition, position: number): Omit<StepEntity, 'shopId'> {
  const { code, stage, kind, title, hold, critical, secondCheck = null, restsOn } = definition;
  return {
    ...{ id: randomUUID(), sheetId, position, code, stage, kind, title, hold, critical, secondCheck },
    ...{ restsOn: [...restsOn], definition, uncriticalReason: null, round: 1, entriesFromRound: 1 },
    ...{ done: 0, of: slotsOf(definition).length, verdict: null, recorderIds: [], countersigned: false },
    ...{ openSnags: 0, awaiting: null, awaitingSince: null },
  };
}
