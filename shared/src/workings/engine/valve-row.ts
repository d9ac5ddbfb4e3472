import type { Cylinder } from '../../contracts/calculations.js';
import { InputError } from '../../contracts/input-error.js';
import type { ListedValve } from '../../contracts/valve-figures.js';
import type { TypedFiring } from './engine-fields.js';
import { cylinderOf } from './engine-fields.js';
import { readOrder } from '../wiring-map/read-texts.js';

const most = 64;

/**
 * Valves typed as letters from front to back, `E I I E E I I E`, as listed valves numbered from 1: as many to each
 * cylinder, the cylinders in the order typed or in that of their numbers. Throws `InputError` on `valves` or
 * `cylinders`.
 */
export function readValveRow(
  typed: string,
  cylinders: string | undefined,
  firing: TypedFiring,
): readonly ListedValve[] {
  const letters = [...typed.toUpperCase().replace(/[\s,;–-]+/g, '')];
  if (letters.some((letter) => letter !== 'E' && letter !== 'I')) {
    throw new InputError('valves', 'Write E for each exhaust valve and I for each inlet valve: E I I E.');
  }
  const inOrder = cylindersOf(cylinders, firing);
  const each = letters.length / inOrder.length;
  if (!Number.isInteger(each) || each === 0 || letters.length > most) {
    throw new InputError(
      'valves',
      `There must be as many valves for each of the ${inOrder.length} cylinders, ${most} in all at most; there are ${letters.length}.`,
    );
  }
  return letters.map((letter, i) => ({
    valve: String(i + 1),
    cylinder: inOrder[Math.floor(i / each)] ?? '',
    type: letter === 'I' ? 'inlet' : 'exhaust',
  }));
}

function cylindersOf(typed: string | undefined, firing: TypedFiring): readonly Cylinder[] {
  const { firingOrder } = firing;
  if (typed === undefined) {
    return [...firingOrder].sort((a, b) => (typeof a === 'number' && typeof b === 'number' ? a - b : 0));
  }
  const read = readOrder(typed).map((cylinder) => cylinderOf(String(cylinder), firing));
  const isWhole =
    read.length === firingOrder.length && firingOrder.every((cylinder) => read.includes(cylinder));
  if (isWhole) return read;
  throw new InputError('cylinders', 'Name every cylinder of the firing order once, from front to back.');
}
