import type { CapMapRow } from '../contracts/calculations.js';
import type { Judgement } from '../contracts/verdict.js';
import { nameOf } from '../valve-train/words.js';
import { crankPerDistributor, spacingDoubt } from './post-spacing.js';
import type { ResolvedCap } from './resolve-cap.js';
import { degrees, named } from './words.js';

/** A rotor as it was seen, and what that comes to; angles in distributor degrees. */
export interface RotorSeen {
  readonly cap: ResolvedCap;
  readonly wanted: CapMapRow;
  readonly nearest: CapMapRow;
  readonly companion: CapMapRow | undefined;
  /** Signed, positive the way the rotor turns. */
  readonly error: number;
  /** How far past its post the rotor is when it is right, the crank being where it stands. */
  readonly past: number;
  readonly crankAt: 'static-mark' | 'tdc';
  readonly tolerance: number;
  readonly halfATurnOut: boolean;
  /** Half a turn out, at the companion's post. */
  readonly atCompanion: boolean;
}

/** Verdict and reason of a rotor check. */
export function judgeRotor(seen: RotorSeen): Judgement {
  const { cap, error, tolerance, halfATurnOut } = seen;
  if (halfATurnOut) return { verdict: 'doubtful', reason: halfATurn(seen) };
  if (Math.abs(error) > tolerance) return { verdict: 'fail', reason: wrong(seen) };
  const right = `${where(seen)}, which is where it should point for ${nameOf(seen.wanted.cylinder)}: ${offBy(seen)}, and ${degrees(tolerance)} is allowed.`;
  const doubt = spacingDoubt(cap);
  return doubt === null
    ? { verdict: 'pass', reason: right }
    : { verdict: 'doubtful', reason: `${right} ${doubt}` };
}

/** What tells exhaust TDC from a distributor half a turn out. */
export function howToTell({ wanted, companion }: RotorSeen): string {
  const name = nameOf(wanted.cylinder);
  const compression =
    companion === undefined
      ? 'If both are shut, and stay so for some way either side'
      : `If both are shut and ${nameOf(companion.cylinder)}’s rock`;
  return (
    `Look at ${name}’s valves. If they rock (inlet opening while the exhaust closes), the crank is at its ` +
    'exhaust TDC: turn it one whole turn, the normal way, and look at the rotor again. ' +
    `${compression}, it is at compression TDC and the distributor is half a turn out.`
  );
}

function where({ nearest, past, crankAt }: RotorSeen): string {
  const outlet = nearest.outlet === nearest.post ? '' : `, outlet ${named(nearest.outlet)}`;
  const allowed =
    crankAt === 'tdc' && past !== 0
      ? `With the crank at TDC, where it is ${degrees(Math.abs(past))} ${past > 0 ? 'past' : 'short of'} its post when right, the`
      : 'The';
  return `${allowed} rotor points at post ${named(nearest.post)} (cylinder ${named(nearest.cylinder)}${outlet})`;
}

/** `it is 2° past it, the way the rotor turns (4° of crank)`. */
function offBy({ error, cap }: RotorSeen): string {
  const size = degrees(Math.abs(error));
  if (size === '0°') return 'it is not off at all';
  const crank = degrees(Math.abs(error) * crankPerDistributor(cap));
  return `it is ${size} ${error > 0 ? 'past' : 'short of'} it, the way the rotor turns (${crank} of crank)`;
}

function halfATurn(seen: RotorSeen): string {
  const { wanted, atCompanion } = seen;
  const name = nameOf(wanted.cylinder);
  const place = atCompanion
    ? `${where(seen)}: that is the companion of ${name}, whose own post is ${named(wanted.post)}`
    : `The rotor points half a turn from ${name}’s post, ${named(wanted.post)}`;
  return `${place}. Either ${name} is at exhaust TDC and not at compression, or the distributor is half a turn out.`;
}

function wrong(seen: RotorSeen): string {
  const { wanted, nearest, error } = seen;
  const [along, against] = ['the way the rotor turns', 'against the way the rotor turns'];
  const size = degrees(Math.abs(error));
  if (nearest === wanted) {
    return (
      `${where(seen)}, but ${offBy(seen)}; ${degrees(seen.tolerance)} is allowed. Turn the body ${size} ` +
      `${error > 0 ? along : against} to bring the post under it, or mesh the drive anew.`
    );
  }
  return (
    `${where(seen)}, and should point at post ${named(wanted.post)} for ${nameOf(wanted.cylinder)}: ` +
    `${offBy(seen)}. Check that the crank is at that cylinder’s mark and which way the rotor turns; ` +
    'if both are right, mesh the drive anew.'
  );
}
