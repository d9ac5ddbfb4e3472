import type { Stroke, ValveTiming } from '../contracts/calculations.js';
import { isOpen, strokeAt, valveEvents } from '../valve-train/phase.js';
import { cycle, wrapped } from '../valve-train/windows.js';

/** Rounding noise of sums of firing angles. */
const noise = 1e-9;

/**
 * How late a spark is in its cylinder's own four-stroke cycle.
 *
 * @param given crank degrees at which the spark comes
 * @param due crank degrees at which the cylinder fires, counted alike
 * @returns crank degrees in (−360, 360]; positive is late
 */
export function lateBy(given: number, due: number): number {
  const late = wrapped(given - due);
  return late > cycle / 2 + noise ? late - cycle : Math.min(late, cycle / 2);
}

export interface SparkPosition {
  /** Crank degrees after compression TDC, in [0, 720), at the spark itself. */
  readonly phase: number;
  readonly stroke: Stroke;
  /** Null where no valve timing is known. */
  readonly inletOpen: boolean | null;
  readonly exhaustOpen: boolean | null;
}

/**
 * Where in its cylinder's cycle a spark falls, taken at the spark itself: TDC minus the advance.
 *
 * @param late crank degrees; positive is late
 * @param advance crank degrees before TDC
 * @param timing without it nothing is said of the valves
 */
export function sparkPosition(late: number, advance: number, timing?: ValveTiming): SparkPosition {
  const phase = wrapped(late - advance);
  const stroke = strokeAt(phase);
  if (timing === undefined) return { phase, stroke, inletOpen: null, exhaustOpen: null };
  const valves = valveEvents(timing);
  return {
    phase,
    stroke,
    inletOpen: isOpen(valves.inlet, phase),
    exhaustOpen: isOpen(valves.exhaust, phase),
  };
}
