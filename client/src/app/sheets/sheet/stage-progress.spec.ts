import { describe, expect, it } from 'vitest';
import type { StageLine, StepStatus } from '@second-spanner/shared/contracts/sheets';
import { checkStep, stepOf } from '../testing/steps';
import { stageOf, stageProgress, stepAfter, stepToOpen } from './stage-progress';

const stage = (number: number, statuses: readonly StepStatus[]): StageLine => ({
  stage: number,
  title: `Stage ${number}`,
  hold: false,
  cautions: [],
  steps: statuses.map((status, i) => stepOf({ ...checkStep, code: `${number}.${i + 1}` }, { status })),
});

describe('a stage’s progress', () => {
  it('is told by its steps', () => {
    expect(stageProgress(stage(1, ['done', 'done']))).toBe('done');
    expect(stageProgress(stage(1, ['done', 'waiting']))).toBe('in-hand');
    expect(stageProgress(stage(1, ['to-countersign', 'waiting']))).toBe('in-hand');
    expect(stageProgress(stage(1, ['open', 'waiting']))).toBe('to-come');
  });
});

describe('where a sheet goes on', () => {
  const stages = [stage(1, ['done', 'to-countersign']), stage(2, ['waiting', 'done', 'waiting'])];

  it('is the next step, else the first that is not done', () => {
    expect(stepToOpen('2.1', stages)).toBe('2.1');
    expect(stepToOpen(null, stages)).toBe('1.2');
    expect(stepToOpen(null, [stage(1, ['done'])])).toBeNull();
  });

  it('leaves done steps out after the one at hand', () => {
    expect(stepAfter('2.1', stages)?.code).toBe('2.3');
    expect(stepAfter('2.3', stages)).toBeNull();
    expect(stageOf('2.2', stages)?.stage).toBe(2);
  });
});
