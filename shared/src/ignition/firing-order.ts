import type { Cylinder } from '../contracts/calculations.js';
import { InputError } from '../contracts/input-error.js';
import { requireList, requireText } from '../quantities/require.js';

export const mostCylinders = 16;
const longestName = 40;

/** An unknown input as the name of a cylinder, a post or an outlet. Throws `InputError` on `field`. */
export function requireName(input: unknown, field: string): string {
  return requireText(input, field, { max: longestName });
}

/**
 * An unknown input as a firing order: 1 to 16 cylinders, each once, numbered 1…n or all with text labels.
 * Throws `InputError` on `field` or on the item that is wrong, such as `firingOrder[2]`.
 */
export function requireFiringOrder(input: unknown, field: string): readonly Cylinder[] {
  const items = requireList(input, field, { min: 1, max: mostCylinders });
  const labelled = typeof items[0] === 'string';
  const order = items.map((item, i): Cylinder => {
    const at = `${field}[${i}]`;
    return labelled ? requireLabel(item, at) : requireCylinderNumber(item, at, items.length);
  });
  order.forEach((cylinder, i) => {
    const first = order.indexOf(cylinder);
    if (first === i) return;
    const where = `at place ${first + 1} and at place ${i + 1}`;
    throw new InputError(
      `${field}[${i}]`,
      `Each cylinder fires once; this one stands ${where} of the order.`,
    );
  });
  return order;
}

function requireLabel(item: unknown, field: string): string {
  if (typeof item === 'number') {
    throw new InputError(field, 'The cylinders must all be numbers or all be text labels.');
  }
  return requireName(item, field);
}

function requireCylinderNumber(item: unknown, field: string, count: number): number {
  if (typeof item === 'string') {
    throw new InputError(field, 'The cylinders must all be numbers or all be text labels.');
  }
  if (typeof item !== 'number' || !Number.isInteger(item) || item < 1 || item > count) {
    const all = count === 1 ? 'the number 1' : `a whole number from 1 to ${count}`;
    throw new InputError(field, `With ${count} in the order, each cylinder must be ${all}.`);
  }
  return item;
}
