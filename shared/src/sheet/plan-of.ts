import type { TighteningPlan, TighteningStep } from '../contracts/calculations.js';
import type { TighteningStepDefinition } from '../contracts/steps.js';
import { tighteningPlan } from '../fastening/tightening-plan.js';

const plans = new WeakMap<TighteningStepDefinition, TighteningPlan>();

/** The plan of a tightening step, worked out once for each definition. */
export function planOf(definition: TighteningStepDefinition): TighteningPlan {
  const known = plans.get(definition);
  if (known) return known;
  const plan = tighteningPlan(definition.plan);
  plans.set(definition, plan);
  return plan;
}

/** The number of the last pass. */
export function lastPass(definition: TighteningStepDefinition): number {
  return planOf(definition).steps.at(-1)?.pass ?? 0;
}

/** What one fastener is pulled to in one pass, if the plan has it. */
export function planStep(
  definition: TighteningStepDefinition,
  pass: number,
  fastener: string,
): TighteningStep | undefined {
  return planOf(definition).steps.find((step) => step.pass === pass && step.fastener === fastener);
}

/** The pass at which the fasteners reach their full torque, where the second person watches: the last one with a torque. */
export function finalPass(definition: TighteningStepDefinition): number {
  const torques = planOf(definition).steps.filter((step) => step.target !== undefined);
  return torques.at(-1)?.pass ?? lastPass(definition);
}
