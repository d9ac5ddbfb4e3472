import { expandingMaterials } from '../contracts/fits.js';
import { InputError } from '../contracts/input-error.js';
import { requireNumber, requireOneOf, requireRecord } from '../quantities/require.js';
import { expansions } from './tables/expansion.js';

/**
 * The coefficient of a material of the table, the least of its alloys there, or the one that was given;
 * 10⁻⁶ per kelvin.
 *
 * @throws InputError on `field` for a material that is not there, on `field.coefficient` outside 0.1 to 100
 */
export function coefficientOf(input: unknown, field: string): number {
  if (typeof input === 'object' && input !== null) {
    const path = `${field}.coefficient`;
    return requireNumber(requireRecord(input, field)['coefficient'], path, { min: 0.1, max: 100 });
  }
  if (typeof input !== 'string') {
    throw new InputError(field, 'This must be a material or a coefficient of expansion.');
  }
  const material = requireOneOf(input, expandingMaterials, field);
  const listed = expansions.filter((one) => one.material === material);
  return Math.min(...listed.map(({ coefficient }) => coefficient));
}
