import type { Cylinder } from '../contracts/calculations.js';
import { isOpen, phaseOf, valveEvents, type ValveEvents } from './phase.js';
import type { Engine } from './seen.js';
import { cycle } from './windows.js';

/** A valve that is open at one TDC of the cylinder asked about and shut at the other. */
export interface TellingValve {
  readonly cylinder: Cylinder;
  readonly valve: 'inlet' | 'exhaust';
  readonly openAt: 'compression' | 'exhaust';
}

/**
 * The valve of another cylinder that tells the two TDCs of the cylinder asked about apart most clearly: open at one
 * by more than the tolerance, and shut at the other by as much. None on a single cylinder.
 */
export function tellingValve({ firings, timing, asked, tolerance }: Engine): TellingValve | undefined {
  const valves = valveEvents(timing);
  let best: TellingValve | undefined;
  let clearest = tolerance;
  for (const { cylinder, firesAt } of firings) {
    if (cylinder === asked.cylinder) continue;
    for (const valve of ['inlet', 'exhaust'] as const) {
      const [compression, exhaust] = [0, cycle / 2].map((tdc) =>
        lift(valves[valve], phaseOf(tdc, firesAt - asked.firesAt)),
      ) as [number, number];
      const clear = Math.min(Math.abs(compression), Math.abs(exhaust));
      if (compression > 0 === exhaust > 0 || clear <= clearest) continue;
      clearest = clear;
      best = { cylinder, valve, openAt: compression > 0 ? 'compression' : 'exhaust' };
    }
  }
  return best;
}

/** Crank degrees to the nearer of the valve's two events: positive while it is open, negative while shut. */
function lift(valve: ValveEvents, phase: number): number {
  const apart = (event: number): number => {
    const round = Math.abs(phase - event) % cycle;
    return Math.min(round, cycle - round);
  };
  const nearest = Math.min(apart(valve.opens), apart(valve.closes));
  return isOpen(valve, phase) ? nearest : -nearest;
}
