import type { TwoReadings, TwoReadingsRequest } from '../contracts/calculations.js';
import { InputError } from '../contracts/input-error.js';
import type { Quantity } from '../contracts/quantity.js';
import { convert, convertInterval } from '../quantities/convert.js';
import { digitsFor, printNumber, printQuantity } from '../quantities/print.js';
import { decimalsOf } from '../quantities/round.js';
import { requireRecord } from '../quantities/require.js';
import { floatNoise, requireLike, requireReading, requireUncertainty } from './reading-input.js';

/**
 * Whether two people's readings of one thing agree, by the normalised error
 * En = (x₁ − x₂)/√(U₁² + U₂²), U the expanded uncertainties (k = 2, half width) of independent tools.
 * |En| ≤ 1 agrees (`pass`), more is `fail`. Units may differ; a temperature's uncertainty is an interval.
 *
 * Throws `InputError` on `first` and `second` (`.value`, `.uncertainty` and their `.value`, `.unit`), and on
 * `first.uncertainty.value` when both uncertainties are zero or too small to divide by.
 * Source: ISO 13528, En score (as on the NIST Dataplot reference page). Example: 27.0 and 28.1 lbf·ft, each
 * ± 4 %, give En = −0.71 and agree.
 */
export function twoReadings(request: TwoReadingsRequest): TwoReadings {
  const input = requireRecord(request, 'request');
  const first = readReading(input['first'], 'first');
  const second = readReading(input['second'], 'second', first.value);
  const unit = first.value.unit;
  const x1 = first.value.value;
  const x2 = convert(second.value, unit).value;
  const together = Math.hypot(
    convertInterval(first.uncertainty, unit).value,
    convertInterval(second.uncertainty, unit).value,
  );
  const en = (x1 - x2) / together;
  if (!Number.isFinite(en)) {
    throw new InputError(
      'first.uncertainty.value',
      'Both uncertainties are nothing: at least one tool must say how far it may be out.',
    );
  }
  const agrees = Math.abs(x1 - x2) <= together + floatNoise(x1, x2);
  return {
    verdict: agrees ? 'pass' : 'fail',
    reason: reasonOf(first, second, { x1, x2, together, en }, agrees),
    en,
  };
}

interface Reading {
  readonly value: Quantity;
  readonly uncertainty: Quantity;
}

function readReading(input: unknown, field: string, like?: Quantity): Reading {
  const { value, uncertainty } = requireRecord(input, field);
  const path = `${field}.value`;
  const reading = like === undefined ? requireReading(value, path) : requireLike(value, like, path);
  return { value: reading, uncertainty: requireUncertainty(uncertainty, reading, `${field}.uncertainty`) };
}

interface Comparison {
  readonly x1: number;
  readonly x2: number;
  readonly together: number;
  readonly en: number;
}

function reasonOf(first: Reading, second: Reading, figures: Comparison, agrees: boolean): string {
  const { x1, x2, together, en } = figures;
  const unit = first.value.unit;
  const sameUnit = second.value.unit === unit;
  const most = digitsFor({ tolerance: together });
  const written = Math.max(decimalsOf(x1), decimalsOf(second.value.value));
  const digits = sameUnit ? Math.min(written, most) : most;
  const print = (value: number, places: number): string => printQuantity({ value, unit }, { digits: places });
  const names = [first.value, second.value].map((value) =>
    printQuantity(value, sameUnit ? { digits: Math.min(written, 9) } : {}),
  );
  const apart = `they are ${print(Math.abs(x1 - x2), digits)} apart`;
  const score = `En = ${printNumber(en, digitsOfScore(en, agrees))}; up to 1 either way agrees`;
  const may = print(together, most);
  return agrees
    ? `${names.join(' and ')} agree: ${apart}, and the two tools may differ by ${may} (${score}).`
    : `${names.join(' and ')} do not agree: ${apart}, but the two tools may differ only by ${may} (${score}).`;
}

/** Two decimals, and more where a score just over 1 would print as 1. */
function digitsOfScore(en: number, agrees: boolean): number {
  const over = Math.abs(en) - 1;
  return agrees || over > 0.005 ? 2 : Math.min(9, Math.ceil(-Math.log10(over)));
}
