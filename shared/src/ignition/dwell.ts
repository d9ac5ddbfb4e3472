import type { Dwell, DwellRequest } from '../contracts/ignition-checks.js';
import { InputError } from '../contracts/input-error.js';
import { requireNumber, requireOneOf, requireRecord } from '../quantities/require.js';
import { mostCylinders } from './firing-order.js';
import { degrees } from './words.js';

/** Nothing with contact points turns slower or faster than this, crank revolutions a minute. */
const speeds = { min: 1, max: 30_000 };

/**
 * Contact-breaker dwell: of the distributor degrees from one spark to the next (360 over the cylinders, for a
 * distributor that turns once a cycle), how many the points stay open, what share they are closed, and with a
 * crank speed the seconds that is.
 *
 * @throws InputError on `cylinders` (1 to 16), `dwell` (more than 0° and less than the interval), `crankSpeed`
 * (1 to 30 000 revolutions a minute) or `strokesPerCycle`
 * Source: definition of the dwell angle; common practice on contact breakers.
 * Example: 60° on a four at 5000 rev/min: open 30°, a spark every 6 ms, closed for 4 ms of it.
 */
export function dwell(request: DwellRequest): Dwell {
  const given = requireRecord(request, 'request');
  const cylinders = requireNumber(given['cylinders'], 'cylinders', {
    min: 1,
    max: mostCylinders,
    integer: true,
  });
  const strokes = requireOneOf(given['strokesPerCycle'] ?? 4, [4, 2] as const, 'strokesPerCycle');
  const interval = 360 / cylinders;
  const closed = requireNumber(given['dwell'], 'dwell', { min: 0, max: 360 });
  if (closed === 0 || closed >= interval) {
    const room = degrees(interval);
    throw new InputError('dwell', `With ${room} from spark to spark the dwell lies between 0° and ${room}.`);
  }
  const angles = { interval, openAngle: interval - closed, share: closed / interval };
  if (given['crankSpeed'] === undefined) return angles;
  const speed = requireNumber(given['crankSpeed'], 'crankSpeed', speeds);
  const cycleTime = (60 / speed) * (strokes / 2);
  const between = cycleTime / cylinders;
  return {
    ...angles,
    betweenSparks: { value: between, unit: 's' },
    closedFor: { value: between * angles.share, unit: 's' },
  };
}
