import type { CapDiagnosis, Cylinder } from '../contracts/calculations.js';
import type { EntryContent, WiringStep } from '../contracts/steps.js';
import type { Judgement } from '../contracts/verdict.js';
import { capDiagnosis } from '../ignition/cap-diagnosis.js';

/** What is fitted at each outlet against the map that the step requires. */
export function diagnoseWiring(
  definition: WiringStep,
  fitted: Readonly<Record<string, Cylinder>>,
): CapDiagnosis {
  return capDiagnosis({
    cap: definition.cap,
    fitted,
    fittedBy: 'outlet',
    valveTiming: definition.valveTiming,
    advance: definition.advance,
  });
}

/** Passes only when the leads stand as the required map has them. */
export function judgeWiring(
  definition: WiringStep,
  { fitted }: Extract<EntryContent, { kind: 'wiring' }>,
): Judgement {
  return diagnoseWiring(definition, fitted);
}
