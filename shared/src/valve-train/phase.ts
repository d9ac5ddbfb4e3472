import { strokes, type Stroke, type ValveState, type ValveTiming } from '../contracts/calculations.js';
import { wrapped } from './windows.js';

/** Half width of the part of a lobe called `full`, crank degrees either side of its centre. */
export const fullHalfWidth = 5;

/** One valve's open time as phases of its own cylinder: 0 is compression TDC, all in crank degrees. */
export interface ValveEvents {
  readonly opens: number;
  readonly centre: number;
  readonly closes: number;
}

/** Rounding noise of sums of firing angles. */
const noise = 1e-9;

/**
 * Where a cylinder stands in its own cycle, crank degrees in [0, 720): 0 is its compression TDC.
 *
 * @param crank crank degrees after the compression TDC of the first cylinder of the firing order
 * @param firesAt crank degrees at which this cylinder fires, counted alike
 */
export function phaseOf(crank: number, firesAt: number): number {
  return wrapped(crank - firesAt);
}

/**
 * The stroke at a phase: power 0–180, exhaust 180–360, inlet 360–540, compression 540–720. On a boundary the
 * later stroke is named.
 */
export function strokeAt(phase: number): Stroke {
  const quarter = Math.floor((wrapped(phase) + noise) / 180);
  return strokes[quarter] ?? 'power';
}

/**
 * When both valves open, stand at the middle of their duration, and close. The middle is the lobe centre only
 * of a symmetrical lobe: nothing more can be known from four figures.
 */
export function valveEvents(timing: ValveTiming): {
  readonly inlet: ValveEvents;
  readonly exhaust: ValveEvents;
} {
  return {
    inlet: events(360 - timing.ivo, 540 + timing.ivc),
    exhaust: events(180 - timing.evo, 360 + timing.evc),
  };
}

/** Whether the valve is off its seat at a phase; at the instant it closes it is shut. */
export function isOpen(valve: ValveEvents, phase: number): boolean {
  const at = wrapped(phase);
  return at >= valve.opens - noise && at < valve.closes - noise;
}

/** What the valve does at a phase: `full` within 5° of its lobe centre; on a boundary the later state is named. */
export function valveStateAt(valve: ValveEvents, phase: number): ValveState {
  const at = wrapped(phase);
  if (!isOpen(valve, at)) return 'shut';
  if (Math.abs(at - valve.centre) <= fullHalfWidth + noise) return 'full';
  return at < valve.centre ? 'opening' : 'closing';
}

function events(opens: number, closes: number): ValveEvents {
  return { opens, centre: (opens + closes) / 2, closes };
}
