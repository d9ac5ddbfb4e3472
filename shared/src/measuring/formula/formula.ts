import { InputError } from '../../contracts/input-error.js';
import type { FormulaAnswer, FormulaRequest } from '../../contracts/measuring.js';
import type { Quantity, Unit } from '../../contracts/quantity.js';
import { fromSi, toSi } from '../../quantities/convert.js';
import { requireAnyQuantity, requireRecord, requireText } from '../../quantities/require.js';
import { readUnit } from '../../quantities/unit-names.js';
import { limitDecision } from '../limit-decision.js';
import { quantityIfGiven, requireLimits, withoutNoise } from '../limits-input.js';
import { areAlike, dimensionsOf, nameOf, type Dimensions } from './dimensions.js';
import { namesIn, parseFormula } from './parse-formula.js';
import { kindInFormula, refuseName } from './readings-by-name.js';
import { workOutTerm, type Figure } from './work-out-term.js';

/**
 * Works out a formula over named readings, such as `bore_min − journal_max`: arithmetic only (+ − × ÷,
 * brackets, a minus, plain numbers), at most 200 characters and 64 readings, over SI figures that carry their
 * kind, so that a length is never added to a torque or to a plain number. The answer is in `unit`, judged at
 * the limits with the uncertainty given for the answer; without limits `not-judged`. Temperatures are refused.
 *
 * @throws InputError on `formula` (anything but arithmetic, an unknown name, kinds that do not go together,
 * division by zero), `readings.<name>`, `unit`, `limits`, `uncertainty`
 * Source: arithmetic. Example: bore_min 50.040 mm, journal_max 50.000 mm: 0.040 mm.
 */
export function formula(request: FormulaRequest): FormulaAnswer {
  const given = requireRecord(request, 'request');
  const term = parseFormula(given['formula']);
  const readings = readReadings(given['readings']);
  const unit = requireUnit(given['unit']);
  const kind = kindInFormula(unit, 'unit');
  const figure = workOutTerm(term, readings);
  requireKind(figure.dimensions, dimensionsOf(kind), unit);
  const value = fromSi(figure.value, unit);
  const size = Math.abs(fromSi(figure.size, unit).value);
  const limits = requireLimits(given['limits'], kind, 'limits', { negative: kind === 'length' });
  const uncertainty = quantityIfGiven(given['uncertainty'], kind, 'uncertainty');
  return {
    ...limitDecision({ value: judgeable(value, size, kind !== 'length'), ...limits, uncertainty }),
    value,
    uses: namesIn(term),
  };
}

/** Without what rounding left behind. Throws `InputError` on `formula` for a figure that is never negative. */
function judgeable({ value, unit }: Quantity, size: number, isUnsigned: boolean): Quantity {
  const plain = withoutNoise(value, size);
  if (isUnsigned && plain < 0) throw new InputError('formula', 'This comes to less than nothing.');
  return { value: plain, unit };
}

function readReadings(input: unknown): ReadonlyMap<string, Figure> {
  const record = requireRecord(input, 'readings');
  return new Map(
    Object.entries(record).map(([name, reading]) => {
      refuseName(name, 'readings');
      const field = `readings.${name}`;
      const quantity = requireAnyQuantity(reading, field, { negative: true });
      const kind = kindInFormula(quantity.unit, `${field}.unit`);
      const value = toSi(quantity);
      return [name, { value, dimensions: dimensionsOf(kind), size: Math.abs(value) }];
    }),
  );
}

function requireUnit(input: unknown): Unit {
  const unit = readUnit(requireText(input, 'unit', { max: 40 }));
  if (unit === undefined) throw new InputError('unit', 'Write the unit of the answer, such as mm.');
  return unit;
}

function requireKind(is: Dimensions, wanted: Dimensions, unit: Unit): void {
  if (areAlike(is, wanted)) return;
  throw new InputError('unit', `The formula gives ${nameOf(is)}, which ${unit} does not measure.`);
}
