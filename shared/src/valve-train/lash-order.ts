import type { LashOrder, LashOrderRequest } from '../contracts/valve-figures.js';
import { InputError } from '../contracts/input-error.js';
import { requireNumber, requireRecord } from '../quantities/require.js';
import { firingAngles } from './firing-angles.js';
import { fewestStops, type Arc } from './fewest-stops.js';
import { lashMates } from './lash-mates.js';
import { requireListedValves, type PlacedValve } from './listed-valves.js';
import { valveEvents } from './phase.js';
import { requireValveTiming } from './valve-timing.js';
import { cycle, wrapped } from './windows.js';

/** Crank degrees that clear the ramps of most cams: common practice, no source. */
const usualMargin = 15;

/**
 * The order in which valve clearances are set: the fewest crank stops at which every valve can be set once, each on
 * its base circle with the margin either side, and among those the least turning from the first stop to the last.
 * A valve that could be set at several is set where it is farthest from its ramps. And for each valve its mate: the
 * like valve of the companion cylinder (360° of crank apart), fully open when this one's lobe points away.
 *
 * `crank` counts crank degrees from the compression TDC of the first cylinder of the order, from stop to stop the
 * normal way; it may run past 720.
 *
 * @throws InputError on `firingOrder`, `intervals`, `valveTiming`, `valves` (1 to 64, each named once, of cylinders
 * of the order), `margin` (0 to 180), and on `margin` where it leaves no room on the base circle
 * Source: geometry of the cycle; the trade's rule of nine on a four and of thirteen on a six follows for valves
 * laid out as a mirror.
 * Example: 1-3-4-2 with valves E I I E E I I E: valve 1 when valve 8 is fully open.
 */
export function lashOrder(request: LashOrderRequest): LashOrder {
  const given = requireRecord(request, 'request');
  const firings = firingAngles(given['firingOrder'], given['intervals']);
  const timing = requireValveTiming(given['valveTiming']);
  const valves = requireListedValves(given['valves'], firings);
  const margin = requireNumber(given['margin'] ?? usualMargin, 'margin', { min: 0, max: 180 });

  const events = valveEvents(timing);
  const arcs = valves.map(({ type, firesAt }): Arc => {
    const { opens, closes } = events[type];
    return { from: wrapped(firesAt + closes + margin), length: cycle - (closes - opens) - 2 * margin };
  });
  if (arcs.some(({ length }) => length < 0)) {
    const room = Math.floor(Math.min(...arcs.map(({ length }) => length)) / 2 + margin);
    throw new InputError('margin', `The base circle leaves room for a margin of at most ${room}°.`);
  }
  const cranks = fewestStops(arcs);
  return { mates: lashMates(valves, firings), stops: stopsWithValves(cranks, valves, arcs) };
}

function stopsWithValves(
  cranks: readonly number[],
  valves: readonly PlacedValve[],
  arcs: readonly Arc[],
): LashOrder['stops'] {
  const stopOf = arcs.map((arc) => {
    const clear = cranks.map((crank) => clearance(arc, crank));
    return clear.indexOf(Math.max(...clear));
  });
  return cranks.map((crank, stop) => ({
    crank,
    set: valves.filter((_, i) => stopOf[i] === stop).map(({ valve }) => valve),
  }));
}

/** How far inside its arc a crank angle is, from the nearer end; negative outside. */
function clearance({ from, length }: Arc, crank: number): number {
  const into = wrapped(crank - from);
  const inside = Math.min(into, length - into);
  // The arc's own beginning, but for rounding noise, may come out as the cycle's end.
  return into > length ? Math.max(inside, into - cycle) : inside;
}
