import type {
  Sheet,
  SheetSummary,
  SignatureMeaning,
  StepLine,
} from '@second-spanner/shared/contracts/sheets';
import type { Person } from '@second-spanner/shared/contracts/people';
import { may, type Permission } from '@second-spanner/shared/contracts/permissions';
import { stepStatuses } from '@second-spanner/shared/sheet/gates';
import { signing } from '@second-spanner/shared/sheet/sheet-states';
import type { SheetRow, WholeSheetRow } from './sheet.entity.js';
import { toGateStep } from './step-at-hand.js';
import type { StepRow } from './step.entity.js';

export function toSheetSummary(row: SheetRow): SheetSummary {
  const { id, code, state, carId, carName, engineCode, specEdition, builder, countersigner } = row;
  const { stepsDone, stepsTotal, openSnags, changedAt } = row;
  return {
    ...{ id, code, state, carId, carName, engineCode, specEdition, builder, countersigner },
    ...{ stepsDone, stepsTotal, openSnags, changedAt: changedAt.toISOString() },
  };
}

/** The lines of all steps, in the sheet's order. */
export function toStepLines(steps: readonly StepRow[]): StepLine[] {
  const statuses = stepStatuses(steps.map(toGateStep));
  return steps.map((step, at) => {
    const { code, stage, kind, title, hold, critical, secondCheck, done, of, openSnags } = step;
    return {
      ...{ code, stage, kind, title, hold, critical, done, of, openSnags },
      secondCheck: critical ? secondCheck : null,
      status: statuses[at] ?? 'waiting',
    };
  });
}

export function toSheet(row: WholeSheetRow, steps: readonly StepRow[], person: Person): Sheet {
  const { engineNumber, ownerName, specId, specTitle, specEditionId, version } = row;
  const { contentHash, verificationCode, nextStep } = row;
  const lines = toStepLines(steps);
  return {
    ...toSheetSummary(row),
    ...{ engineNumber, ownerName, specId, specTitle, specEditionId, version },
    stages: row.stages.map(({ stage, title, hold, cautions }) => ({
      ...{ stage, title, hold, cautions },
      steps: lines.filter((line) => line.stage === stage),
    })),
    signatures: row.signatures.map(({ at, ...signature }) => ({
      ...signature,
      at: new Date(at).toISOString(),
    })),
    ...{ contentHash, verificationCode, nextStep },
    canSign: signatureAtHand(row, person),
  };
}

export const signingPermission: Record<SignatureMeaning, Permission> = {
  built: 'sheets.sign-built',
  countersigned: 'sheets.sign-countersigned',
  released: 'sheets.release',
};

function signatureAtHand(row: WholeSheetRow, person: Person): SignatureMeaning | null {
  const meaning = (['built', 'countersigned', 'released'] as const).find(
    (each) => signing[each].from === row.state,
  );
  if (!meaning || !may(person.role, signingPermission[meaning])) return null;
  if (meaning === 'built') {
    const ready = row.stepsDone === row.stepsTotal && row.openSnags === 0;
    return ready && row.builder.id === person.id ? meaning : null;
  }
  if (meaning === 'countersigned') {
    const built = row.signatures.find((signature) => signature.meaning === 'built');
    return built?.person.id === person.id ? null : meaning;
  }
  return meaning;
}
