import { valveStates, type Cylinder, type ValveState, type ValveTiming } from '../contracts/calculations.js';
import { InputError } from '../contracts/input-error.js';
import { requireList, requireOneOf, requireRecord } from '../quantities/require.js';
import { firingOf, type Firing } from './firing-angles.js';
import { fullHalfWidth, valveEvents, type ValveEvents } from './phase.js';
import { cycle, intersection, shifted, stretched, union, windowFrom, type Windows } from './windows.js';
import { nameOf } from './words.js';

export type Aspect = 'inlet' | 'exhaust' | 'piston' | 'rocking' | 'pressure' | 'marks';

/** One thing seen at one position of the crank, and where the cylinder asked about may then stand. */
export interface Seen {
  readonly position: number;
  readonly cylinder: Cylinder;
  readonly aspect: Aspect;
  readonly state: string;
  /** For a sentence: `No. 4's valves rocking`. */
  readonly words: string;
  /** Phases of the cylinder asked about, the tolerance included. */
  readonly windows: Windows;
}

export interface Engine {
  readonly firings: readonly Firing[];
  readonly timing: ValveTiming;
  readonly asked: Firing;
  readonly tolerance: number;
}

const mostPositions = 50;
const mostSightings = 32;
const mostInAll = 300;

/** The crank positions of a request, as yet unread. Throws `InputError` on `sightings`. */
export function requirePositions(input: unknown): readonly unknown[] {
  return requireList(input, 'sightings', { min: 1, max: mostPositions });
}

/**
 * Everything seen, in the order of the positions, one entry for each thing.
 *
 * @throws InputError on paths such as `sightings[0][2].inlet`. A position may be left empty
 * only where `maybeEmpty` says that something else was seen there.
 */
export function requireSeen(
  positions: readonly unknown[],
  engine: Engine,
  maybeEmpty?: number,
): readonly Seen[] {
  const lists = positions.map((list, position) =>
    requireList(list, `sightings[${position}]`, { min: position === maybeEmpty ? 0 : 1, max: mostSightings }),
  );
  if (lists.reduce((sum, list) => sum + list.length, 0) > mostInAll) {
    throw new InputError('sightings', `At most ${mostInAll} sightings can be weighed together.`);
  }
  return lists.flatMap((list, position) =>
    list.flatMap((sighting, i) => thingsSeen(sighting, engine, position, `sightings[${position}][${i}]`)),
  );
}

/** The timing marks seen together, which then mean the TDC named. */
export function marksSeen(meaning: 'compression' | 'exhaust', engine: Engine, position: number): Seen {
  const at = meaning === 'compression' ? 0 : cycle / 2;
  return {
    position,
    cylinder: engine.asked.cylinder,
    aspect: 'marks',
    state: meaning,
    words: `the timing marks together for ${nameOf(engine.asked.cylinder)}'s ${meaning} TDC`,
    windows: stretched(windowFrom(at, at), engine.tolerance, engine.tolerance),
  };
}

function thingsSeen(input: unknown, engine: Engine, position: number, path: string): Seen[] {
  const { cylinder, inlet, exhaust, piston, rocking, pressure } = requireRecord(input, path);
  const firing = firingOf(engine.firings, cylinder, `${path}.cylinder`);
  const things: Seen[] = [];
  const add = (aspect: Aspect, state: string): void => {
    things.push(seen(engine, firing, position, aspect, state));
  };
  if (inlet !== undefined) add('inlet', requireOneOf(inlet, valveStates, `${path}.inlet`));
  if (exhaust !== undefined) add('exhaust', requireOneOf(exhaust, valveStates, `${path}.exhaust`));
  if (piston !== undefined) add('piston', requireOneOf(piston, ['top', 'bottom'], `${path}.piston`));
  if (wasSeen(rocking, `${path}.rocking`)) add('rocking', 'rocking');
  if (wasSeen(pressure, `${path}.pressure`)) add('pressure', 'felt');
  if (things.length === 0) {
    throw new InputError(path, 'Say what was seen: inlet, exhaust, piston, rocking or pressure.');
  }
  return things;
}

function wasSeen(input: unknown, field: string): boolean {
  if (input !== undefined && input !== true) {
    throw new InputError(field, 'This must be true, or be left out where it was not seen.');
  }
  return input === true;
}

function seen(engine: Engine, firing: Firing, position: number, aspect: Aspect, state: string): Seen {
  const own = ownWindows(engine, aspect, state);
  return {
    position,
    cylinder: firing.cylinder,
    aspect,
    state,
    words: wordsFor(nameOf(firing.cylinder), aspect, state),
    windows: shifted(own, firing.firesAt - engine.asked.firesAt),
  };
}

/** Where the cylinder that was looked at may stand in its own cycle. */
function ownWindows({ timing, tolerance }: Engine, aspect: Aspect, state: string): Windows {
  const valves = valveEvents(timing);
  const widened = (windows: Windows): Windows => stretched(windows, tolerance, tolerance);
  switch (aspect) {
    case 'inlet':
    case 'exhaust':
      return widened(whileValve(valves[aspect], state));
    case 'rocking':
      return intersection(
        widened(whileValve(valves.inlet, 'opening')),
        widened(whileValve(valves.exhaust, 'closing')),
      );
    case 'pressure':
      return widened(windowFrom(Math.max(540, valves.inlet.closes), cycle));
    default:
      return widened(state === 'top' ? twice(0) : twice(180));
  }
}

function whileValve({ opens, centre, closes }: ValveEvents, state: ValveState | string): Windows {
  switch (state) {
    case 'opening':
      return windowFrom(opens, centre);
    case 'full':
      return windowFrom(Math.max(opens, centre - fullHalfWidth), Math.min(closes, centre + fullHalfWidth));
    case 'closing':
      return windowFrom(centre, closes);
    default:
      return windowFrom(closes, opens + cycle);
  }
}

function twice(phase: number): Windows {
  return union(windowFrom(phase, phase), windowFrom(phase + cycle / 2, phase + cycle / 2));
}

function wordsFor(name: string, aspect: Aspect, state: string): string {
  switch (aspect) {
    case 'rocking':
      return `${name}'s valves rocking`;
    case 'pressure':
      return `pressure at ${name}'s plug hole`;
    case 'piston':
      return `${name}'s piston at the ${state}`;
    default:
      return `${name}'s ${aspect} valve ${state === 'full' ? 'fully open' : state}`;
  }
}
