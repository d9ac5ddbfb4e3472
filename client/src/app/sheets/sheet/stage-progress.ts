import type { StageLine, StepLine } from '@second-spanner/shared/contracts/sheets';

export type Progress = 'done' | 'in-hand' | 'to-come';

const begun: readonly StepLine['status'][] = ['in-hand', 'to-countersign', 'snag', 'done'];

/** Where a stage is, by its steps. */
export function stageProgress({ steps }: StageLine): Progress {
  if (steps.every(({ status }) => status === 'done')) return 'done';
  return steps.some(({ status }) => begun.includes(status)) ? 'in-hand' : 'to-come';
}

/** The step that a sheet opens with: the next one, else the first that is not done, else none. */
export function stepToOpen(nextStep: string | null, stages: readonly StageLine[]): string | null {
  const steps = stages.flatMap((stage) => stage.steps);
  return nextStep ?? steps.find(({ status }) => status !== 'done')?.code ?? null;
}

/** The step after this one in the sheet's order, done ones left out; null at the end. */
export function stepAfter(code: string, stages: readonly StageLine[]): StepLine | null {
  const steps = stages.flatMap((stage) => stage.steps);
  const at = steps.findIndex((step) => step.code === code);
  return steps.slice(at + 1).find(({ status }) => status !== 'done') ?? null;
}

/** The stage that has a step. */
export function stageOf(code: string | null, stages: readonly StageLine[]): StageLine | undefined {
  return stages.find(({ steps }) => steps.some((step) => step.code === code));
}
