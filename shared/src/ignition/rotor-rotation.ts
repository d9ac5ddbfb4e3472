import { InputError } from '../contracts/input-error.js';
import { requireOneOf } from '../quantities/require.js';
import { resolveCap, reversed, type ResolvedCap } from './resolve-cap.js';

/**
 * The cap of a rotor check, turned the way the distributor rotor turns. A magneto's stamped rotation is its
 * armature's, and the rotor geared to it may turn the other way, which is asked for.
 *
 * @throws InputError on the cap's fields under `cap`, `rotationOf`, and `gearedRotor` where an armature's is
 * missing or a rotor's is given
 */
export function requireCapByRotor(given: Readonly<Record<string, unknown>>): ResolvedCap {
  const of = requireOneOf(given['rotationOf'] ?? 'rotor', ['rotor', 'armature'] as const, 'rotationOf');
  const geared = given['gearedRotor'];
  const cap = resolveCap(given['cap'], 'cap');
  if (of === 'rotor') {
    if (geared === undefined) return cap;
    throw new InputError('gearedRotor', 'This is asked only where the rotation was read from the armature.');
  }
  const way = requireOneOf(geared, ['same-way', 'other-way'] as const, 'gearedRotor');
  if (way === 'same-way') return cap;
  const rotation = reversed(cap.rotationSeenFrom === 'cap' ? cap.rotation : reversed(cap.rotation));
  return resolveCap({ ...(given['cap'] as object), rotation }, 'cap');
}
