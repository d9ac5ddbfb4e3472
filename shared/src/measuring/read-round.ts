import { InputError } from '../contracts/input-error.js';
import type { Quantity, Unit } from '../contracts/quantity.js';
import { convert } from '../quantities/convert.js';
import { requireList, requireQuantity, requireRecord, requireText } from '../quantities/require.js';

/** A reading of a bore or a journal, its value in the unit of the whole set. */
export interface RoundRead {
  readonly height: string;
  readonly axis: string;
  readonly value: number;
  readonly given: Quantity;
}

const most = 200;
const longestName = 60;

/**
 * Untrusted readings of a bore, a journal or a shell, no two at one place.
 * Throws `InputError` on `field`, `field[2]`, `field[2].height` and so on.
 */
export function readRound(input: unknown, field: string, unit?: Unit): readonly RoundRead[] {
  const places = new Set<string>();
  let common = unit;
  return requireList(input, field, { min: 1, max: most }).map((item, i) => {
    const path = `${field}[${i}]`;
    const { height, axis, value } = requireRecord(item, path);
    const place = {
      height: requireText(height, `${path}.height`, { max: longestName }).trim(),
      axis: requireText(axis, `${path}.axis`, { max: longestName }).trim(),
    };
    const key = JSON.stringify(place);
    if (places.has(key)) {
      throw new InputError(path, `There is already a reading ${place.height}, ${place.axis}: leave one out.`);
    }
    places.add(key);
    const given = requireQuantity(value, 'length', `${path}.value`, { zero: false });
    common ??= given.unit;
    return { ...place, value: convert(given, common).value, given };
  });
}

/** The axis named, as one of those read, or undefined where none was named. Throws `InputError` on `field`. */
export function requireAxis(
  input: unknown,
  readings: readonly RoundRead[],
  field: string,
): string | undefined {
  if (input === undefined) return undefined;
  const axis = requireText(input, field, { max: longestName }).trim();
  if (readings.some((reading) => reading.axis === axis)) return axis;
  const known = [...new Set(readings.map((reading) => reading.axis))].slice(0, 6);
  throw new InputError(field, `No reading was taken on this axis; there are: ${known.join(', ')}.`);
}
