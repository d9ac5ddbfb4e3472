import type { SecondCheckKind } from '../contracts/steps.js';

export interface CoverCase {
  readonly critical: boolean;
  readonly secondCheck: SecondCheckKind | undefined;
  readonly countersigned: boolean;
  readonly recorders: readonly string[];
  /** People whose second reading of the step's present round is in. */
  readonly secondReaders: readonly string[];
}

/**
 * Whether the first figures of a step are kept from a person: everybody but those who recorded them, until the
 * step is countersigned or the person's own second reading is in. What is only inspected has no figure to cover.
 */
export function isCovered(step: CoverCase, personId: string): boolean {
  if (!step.critical || !step.secondCheck || step.secondCheck === 'inspected') return false;
  if (step.countersigned || step.recorders.length === 0) return false;
  return !step.recorders.includes(personId) && !step.secondReaders.includes(personId);
}
