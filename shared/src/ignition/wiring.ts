import type { Cylinder, CapMapRow } from '../contracts/calculations.js';
import { lateBy } from './spark-position.js';
import type { ResolvedCap } from './resolve-cap.js';

/** A lead as it is fitted: where it belongs, where it is, and what comes of it. */
export interface FittedLead {
  readonly cylinder: Cylinder;
  readonly own: CapMapRow;
  readonly on: CapMapRow;
  /** Crank degrees in (−360, 360]; positive is late. */
  readonly late: number;
}

/** A cap and the leads fitted to it, by the places that the rotor meets one after the other. */
export interface Wiring {
  readonly cap: ResolvedCap;
  /** At each place, the number of the place (from 0) where the lead there belongs. */
  readonly belongs: readonly number[];
  /** In firing order. */
  readonly leads: readonly FittedLead[];
}

/** Puts a cap and what is fitted on each of its posts together; every cylinder must be fitted once. */
export function wiringOf(cap: ResolvedCap, fitted: ReadonlyMap<string, Cylinder>): Wiring {
  const belongs = cap.rows.map(({ post }) =>
    cap.rows.findIndex(({ cylinder }) => cylinder === fitted.get(post)),
  );
  const leads = cap.rows.flatMap((own, place): readonly FittedLead[] => {
    const on = cap.rows[belongs.indexOf(place)];
    return on === undefined
      ? []
      : [{ cylinder: own.cylinder, own, on, late: lateBy(on.firesAt, own.firesAt) }];
  });
  return { cap, belongs, leads };
}

/** The leads that are not on their own post. */
export function misplaced(wiring: Wiring): readonly FittedLead[] {
  return wiring.leads.filter(({ own, on }) => own !== on);
}

/** The cylinders as the rotor meets them, beginning with the first of the order. */
export function sequenceOf(wiring: Wiring): readonly Cylinder[] {
  const { cap, belongs } = wiring;
  const start = belongs.indexOf(0);
  return belongs.flatMap((_, i) => {
    const row = cap.rows[belongs[(start + i) % belongs.length] ?? -1];
    return row === undefined ? [] : [row.cylinder];
  });
}
