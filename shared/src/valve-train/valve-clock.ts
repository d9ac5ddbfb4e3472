import type { CylinderClock, ValveClock, ValveClockRequest } from '../contracts/calculations.js';
import { requireNumber, requireRecord } from '../quantities/require.js';
import { durationsOf } from './durations.js';
import { firingAngles } from './firing-angles.js';
import { phaseOf, strokeAt, valveEvents, valveStateAt } from './phase.js';
import { knownCrankThrow, pistonFromTop } from './piston-height.js';
import { requireValveTiming } from './valve-timing.js';

/** A crank may be counted on over many turns, but a figure beyond this has lost its degrees. */
const mostCrank = 1e6;

/**
 * What every cylinder of a four-stroke does at one crank angle: its phase, its stroke, what each valve does,
 * and where its piston stands if stroke and rod length are both known; and the figures that follow from the
 * valve timing alone. Angles are crank degrees, but `lobeSeparation` is cam degrees; `lobeCentre` counts from
 * TDC, inlet after and exhaust before. `overlap` is negative where both valves are shut between the two.
 * The lobe centres are the middle of each duration, which is the lobe's own centre only if it is symmetrical.
 *
 * @throws InputError on the request's fields
 * Source: durations ivo + 180 + ivc and evo + 180 + evc, overlap ivo + evc, centres duration/2 − ivo and
 * duration/2 − evc, separation their mean; by definition of the four figures.
 * Example: 7/39 and 51/3 give 226°, 234°, overlap 10°, centres 106° and 114°, separation 110°.
 */
export function valveClock(request: ValveClockRequest): ValveClock {
  const given = requireRecord(request, 'request');
  const firings = firingAngles(given['firingOrder'], given['intervals']);
  const timing = requireValveTiming(given['valveTiming']);
  const crank = requireNumber(given['crank'], 'crank', { min: -mostCrank, max: mostCrank });
  const crankThrow = knownCrankThrow(given['stroke'], given['rodLength']);
  const valves = valveEvents(timing);

  const cylinders = firings.map(({ cylinder, firesAt }): CylinderClock => {
    const phase = phaseOf(crank, firesAt);
    return {
      cylinder,
      phase,
      stroke: strokeAt(phase),
      inlet: valveStateAt(valves.inlet, phase),
      exhaust: valveStateAt(valves.exhaust, phase),
      ...(crankThrow && { pistonFromTop: pistonFromTop(crankThrow, phase) }),
    };
  });
  return { cylinders, ...durationsOf(timing) };
}
