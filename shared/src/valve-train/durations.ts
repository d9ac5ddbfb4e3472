import type { ValveClock, ValveTiming } from '../contracts/calculations.js';

/**
 * What follows from the four figures of a valve timing alone: durations, overlap (negative where both valves are
 * shut between the two) and lobe centres in crank degrees, lobe centres from TDC (inlet after, exhaust before);
 * lobe separation in cam degrees. The middle of a duration is the lobe's own centre only if it is symmetrical.
 *
 * Source: durations ivo + 180 + ivc and evo + 180 + evc, overlap ivo + evc, centres duration/2 − ivo and
 * duration/2 − evc, separation their mean; by definition of the four figures.
 * Example: 7/39 and 51/3 give 226°, 234°, overlap 10°, centres 106° and 114°, separation 110°.
 */
export function durationsOf({ ivo, ivc, evo, evc }: ValveTiming): Omit<ValveClock, 'cylinders'> {
  const duration = { inlet: ivo + 180 + ivc, exhaust: evo + 180 + evc };
  const lobeCentre = { inlet: duration.inlet / 2 - ivo, exhaust: duration.exhaust / 2 - evc };
  return {
    duration,
    overlap: ivo + evc,
    lobeCentre,
    lobeSeparation: (lobeCentre.inlet + lobeCentre.exhaust) / 2,
  };
}
