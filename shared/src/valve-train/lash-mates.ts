import type { LashOrder } from '../contracts/valve-figures.js';
import { companionOf, type Firing } from './firing-angles.js';
import type { PlacedValve } from './listed-valves.js';

/**
 * For each valve the one that is fully open when this one's lobe points straight away: the like valve of the
 * companion cylinder, found by the firing angle. Of several like valves in a cylinder the first goes with the first
 * from the front, and so on. Mates are mutual; null without a companion.
 */
export function lashMates(valves: readonly PlacedValve[], firings: readonly Firing[]): LashOrder['mates'] {
  return valves.map((valve) => {
    const companion = companionOf(firings, { cylinder: valve.cylinder, firesAt: valve.firesAt });
    const own = likeValves(valves, valve.cylinder, valve);
    const others = companion === undefined ? [] : likeValves(valves, companion, valve);
    return { set: valve.valve, whenFullyOpen: others[own.indexOf(valve)]?.valve ?? null };
  });
}

function likeValves(
  valves: readonly PlacedValve[],
  cylinder: PlacedValve['cylinder'],
  { type }: PlacedValve,
): readonly PlacedValve[] {
  return valves.filter((one) => one.cylinder === cylinder && one.type === type);
}
