import { InputError } from '../contracts/input-error.js';
import { valveTypes, type ListedValve } from '../contracts/valve-figures.js';
import { requireName } from '../ignition/firing-order.js';
import { named } from '../ignition/words.js';
import { requireList, requireOneOf, requireRecord } from '../quantities/require.js';
import { firingOf, type Firing } from './firing-angles.js';

const mostValves = 64;

/** A listed valve, and when its cylinder fires, crank degrees after the first of the order. */
export interface PlacedValve extends ListedValve {
  readonly firesAt: number;
}

/**
 * An unknown input as the valves of an engine, front to back: 1 to 64, each named once, of a cylinder of the order.
 * Throws `InputError` on `valves` or `valves[i].valve`, `.cylinder`, `.type`.
 */
export function requireListedValves(input: unknown, firings: readonly Firing[]): readonly PlacedValve[] {
  const items = requireList(input, 'valves', { min: 1, max: mostValves });
  const valves = items.map((item, i): PlacedValve => {
    const at = `valves[${i}]`;
    const given = requireRecord(item, at);
    const { cylinder, firesAt } = firingOf(firings, given['cylinder'], `${at}.cylinder`);
    const type = requireOneOf(given['type'], valveTypes, `${at}.type`);
    return { valve: requireName(given['valve'], `${at}.valve`), cylinder, type, firesAt };
  });
  valves.forEach(({ valve }, i) => {
    if (valves.findIndex((other) => other.valve === valve) === i) return;
    throw new InputError(`valves[${i}].valve`, `Valve ${named(valve)} is already in the list.`);
  });
  return valves;
}
