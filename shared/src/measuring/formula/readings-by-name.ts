import { InputError } from '../../contracts/input-error.js';
import type { Kind, Unit } from '../../contracts/quantity.js';
import { clip } from '../../quantities/clip.js';
import { kindOf } from '../../quantities/convert.js';

const name = /^[A-Za-z][A-Za-z0-9_]{0,39}$/;
/** Words that a parser takes for something else. */
const taken: ReadonlySet<string> = new Set(
  'mod to in and or xor not true false null undefined NaN Infinity end'.split(' '),
);

/** Throws `InputError` on `field` for a text that can't be a reading's name in a formula. */
export function refuseName(text: string, field: string): void {
  if (!name.test(text) || taken.has(text)) {
    throw new InputError(
      field,
      `“${clip(text)}” cannot be a reading's name: use letters, digits and _, such as bore_min.`,
    );
  }
}

/** The kind of a unit in a formula. Throws `InputError` on `field` for a temperature. */
export function kindInFormula(unit: Unit, field: string): Exclude<Kind, 'temperature'> {
  const kind = kindOf(unit);
  if (kind !== 'temperature') return kind;
  throw new InputError(
    field,
    'A temperature cannot stand in a formula: its scales begin at different points.',
  );
}
