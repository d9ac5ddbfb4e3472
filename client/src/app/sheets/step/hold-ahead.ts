import type { Sheet, StepLine } from '@second-spanner/shared/contracts/sheets';
import { finalPass, planOf } from '@second-spanner/shared/sheet/plan-of';
import { printQuantity } from '@second-spanner/shared/quantities/print';
import { secondCheckWords } from '@second-spanner/shared/sheet/words';
import type { ShownStep } from '../shown-step';

export interface HoldWords {
  readonly heading: string;
  readonly sentence: string;
}

/** The plate of a step that a second person must check, or of the hold point that comes after it in its stage. */
export function holdAhead(step: ShownStep, sheet: Sheet): HoldWords | null {
  if (step.critical && step.secondCheck !== null) {
    return step.status === 'done' ? null : { heading: headingOf(step), sentence: ownSentence(step, sheet) };
  }
  const steps = sheet.stages.find(({ stage }) => stage === step.stage)?.steps ?? [];
  const at = steps.findIndex(({ code }) => code === step.code);
  const hold = steps.slice(at + 1).find((line) => line.hold && line.status !== 'done');
  return hold === undefined
    ? null
    : { heading: headingOf(hold, 'ahead'), sentence: laterSentence(hold, sheet) };
}

function headingOf({ hold, code }: Pick<StepLine, 'hold' | 'code'>, where?: 'ahead'): string {
  if (where === 'ahead') return `Hold point ahead, step ${code}`;
  return hold ? `Hold point, step ${code}` : 'Second check ahead';
}

function ownSentence(step: ShownStep, { countersigner }: Sheet): string {
  const { definition, secondCheck } = step;
  if (definition.kind === 'tightening' && secondCheck === 'setting-and-pull-witnessed') {
    const pass = finalPass(definition);
    const target = planOf(definition).steps.find((each) => each.pass === pass)?.target;
    const to = target === undefined ? '' : `, to ${printQuantity(target)},`;
    return `Pass ${pass}${to} is pulled with ${countersigner.name} watching, who reads the wrench first.`;
  }
  const kind = secondCheck === null ? '' : secondCheckWords[secondCheck];
  const blind = secondCheck === 'inspected' ? '' : ', without seeing the first reading';
  return `To be ${kind} by ${countersigner.name}${blind}.`;
}

function laterSentence({ title }: StepLine, { countersigner }: Sheet): string {
  return `${title}: nothing after it starts until ${countersigner.name} has countersigned it.`;
}
