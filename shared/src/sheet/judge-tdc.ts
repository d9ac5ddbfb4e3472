import type { Sighting, WhichTdc } from '../contracts/calculations.js';
import type { ValveTimingStep } from '../contracts/steps.js';
import type { Judgement } from '../contracts/verdict.js';
import { whichTdc } from '../valve-train/which-tdc.js';

export interface Sightings {
  readonly sightings: readonly (readonly Sighting[])[];
  readonly about?: number;
}

/** Which TDC the sightings of a step tell. */
export function tellTdc(definition: ValveTimingStep, seen: Sightings): WhichTdc {
  return whichTdc({
    firingOrder: definition.firingOrder,
    valveTiming: definition.valveTiming,
    cylinder: definition.cylinder,
    sightings: seen.sightings,
    ...(seen.about !== undefined && { about: seen.about }),
  });
}

/** Passes only when the sightings tell the TDC that the step wants. */
export function judgeTdc(definition: ValveTimingStep, seen: Sightings): Judgement {
  const told = tellTdc(definition, seen);
  const reason = told.next ? `${told.reason} ${told.next}` : told.reason;
  if (told.answer === definition.wanted) return { verdict: 'pass', reason };
  const isOther = told.answer === 'compression-tdc' || told.answer === 'exhaust-tdc';
  return { verdict: isOther ? 'fail' : 'doubtful', reason };
}
