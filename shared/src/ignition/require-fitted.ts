import type { Cylinder } from '../contracts/calculations.js';
import { InputError } from '../contracts/input-error.js';
import { requireRecord } from '../quantities/require.js';
import type { ResolvedCap } from './resolve-cap.js';
import { listed, named } from './words.js';

/**
 * An unknown input as what is fitted: every post, or every outlet, with its cylinder, one to one.
 * Throws `InputError` on `field` or `field.<name>`.
 *
 * @returns the cylinder on each post
 */
export function requireFitted(
  input: unknown,
  cap: ResolvedCap,
  fittedBy: 'post' | 'outlet',
  field: string,
): ReadonlyMap<string, Cylinder> {
  const given = requireRecord(input, field);
  const places = cap.rows.map((row) => row[fittedBy]);
  const stranger = Object.keys(given).find((name) => !places.includes(name));
  if (stranger !== undefined) {
    throw new InputError(
      field,
      `The cap has no ${fittedBy} “${named(stranger)}”; its ${fittedBy}s are ${listed(places)}.`,
    );
  }
  const empty = places.filter((name) => given[name] === undefined);
  if (empty.length > 0) {
    throw new InputError(field, `Say which cylinder is on every ${fittedBy}; ${listed(empty)} is missing.`);
  }
  const fitted = new Map<string, Cylinder>();
  for (const row of cap.rows) {
    const name = row[fittedBy];
    const path = `${field}.${name}`;
    const cylinder = requireCylinder(given[name], cap.order, path);
    const other = cap.rows.find(({ post }) => fitted.get(post) === cylinder)?.[fittedBy];
    if (other !== undefined) {
      const both = `${fittedBy} ${named(other)} and ${fittedBy} ${named(name)}`;
      throw new InputError(path, `A cylinder has one lead; ${named(cylinder)} is on ${both}.`);
    }
    fitted.set(row.post, cylinder);
  }
  return fitted;
}

function requireCylinder(input: unknown, order: readonly Cylinder[], field: string): Cylinder {
  const cylinder = order.find((one) => one === input);
  if (cylinder !== undefined) return cylinder;
  const form = typeof order[0] === 'number' ? 'a number, one' : 'one';
  throw new InputError(field, `This must be ${form} of the cylinders of the order: ${listed(order)}.`);
}
