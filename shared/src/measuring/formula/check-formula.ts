import { InputError } from '../../contracts/input-error.js';
import type { Kind } from '../../contracts/quantity.js';
import { areAlike, dimensionsOf, nameOf } from './dimensions.js';
import { namesIn, parseFormula } from './parse-formula.js';
import { refuseName } from './readings-by-name.js';
import { workOutTerm, type Figure } from './work-out-term.js';

type FormulaKind = Exclude<Kind, 'temperature'>;

/**
 * Checks a formula when a spec is approved, before there are readings: that it is arithmetic alone, names only
 * readings that there are (`kinds`, by name), never adds unlike to unlike, and gives a figure of `gives`. The
 * answer is the readings that it uses. Throws `InputError` on `formula`, or on `readings` for a bad name.
 * Source: as `formula`. Example: `bore_min − journal_max` of two lengths gives a length.
 */
export function checkFormula(
  formula: unknown,
  kinds: Readonly<Record<string, FormulaKind>>,
  gives: FormulaKind,
): readonly string[] {
  const term = parseFormula(formula);
  const figures = new Map<string, Figure>(
    Object.entries(kinds).map(([name, kind], i) => {
      refuseName(name, 'readings');
      return [name, stand(kind, i)];
    }),
  );
  const { dimensions } = workOutTerm(term, figures);
  if (!areAlike(dimensions, dimensionsOf(gives))) {
    throw new InputError('formula', `The formula gives ${nameOf(dimensions)}, not a figure of ${gives}.`);
  }
  return namesIn(term);
}

/** Stands for a reading; each is another number, so that a difference of two is not nothing to divide by. */
const stand = (kind: FormulaKind, i: number): Figure => {
  const value = 1 + Math.SQRT2 * i;
  return { value, dimensions: dimensionsOf(kind), size: value };
};
