import type { Quantity, Unit } from '../../contracts/quantity.js';
import type { RoundReading } from '../../contracts/measuring.js';
import { decimalsOfUnit } from '../../drawing/unit-decimals.js';
import { drawToleranceBand, type BandReading } from '../../drawing/tolerance-band.js';
import { limitDecision } from '../../measuring/limit-decision.js';
import { convert, convertInterval } from '../../quantities/convert.js';
import { parseQuantity } from '../../quantities/parse.js';
import { printQuantity } from '../../quantities/print.js';
import type { CaseReader } from '../read-case.js';
import type { AnswerPart, WorkingOptions } from '../working.js';

/** A length that was measured or worked out from measured ones: to a micrometre or a tenth of a thou. */
export function printSize(quantity: Quantity): string {
  return printQuantity(quantity, { digits: decimalsOfUnit(quantity.unit) });
}

/** The limits that were typed, each only if it was. */
export function limitsOf(read: CaseReader): { readonly low?: Quantity; readonly high?: Quantity } {
  const [low, high] = [read.quantityIf('low'), read.quantityIf('high')];
  return { ...(low && { low }), ...(high && { high }) };
}

/** Limits as a calculation's request has them, or nothing where none was typed. */
export function limitsIf(read: CaseReader): { readonly limits?: ReturnType<typeof limitsOf> } {
  const limits = limitsOf(read);
  return limits.low === undefined && limits.high === undefined ? {} : { limits };
}

/** A figure typed with its unit, or in the unit of another; undefined where it was left open. */
export function figureIf(read: CaseReader, name: string, unit?: Unit): Quantity | undefined {
  const text = read.textIf(name);
  return text === undefined ? undefined : parseQuantity(text, unit, name);
}

/** What a reading's place is called while nobody says where it was taken. */
export const onePlace = 'one place';

export function roundOf(read: CaseReader, name: string): readonly RoundReading[] {
  return read.rows(name).map((row) => ({
    height: row.textIf('height') ?? onePlace,
    axis: row.textIf('axis') ?? onePlace,
    value: row.quantity('value'),
  }));
}

interface Shown {
  readonly value: Quantity;
  readonly uncertainty?: Quantity;
  readonly label: string;
}

/** Readings on their band, all in the unit of the first; nothing where there is no limit. */
export function bandPart(
  caption: string,
  limits: { readonly low?: Quantity; readonly high?: Quantity },
  shown: readonly Shown[],
  options: WorkingOptions,
): readonly AnswerPart[] {
  const unit = shown[0]?.value.unit;
  if (unit === undefined || (limits.low === undefined && limits.high === undefined)) return [];
  const at = (limit: Quantity | undefined): number | undefined => limit && convert(limit, unit).value;
  const readings = shown.map(({ value, uncertainty, label }, i): BandReading => ({
    value: convert(value, unit).value,
    uncertainty: uncertainty === undefined ? 0 : convertInterval(uncertainty, unit).value,
    role: i === 0 ? 'first' : 'second',
    label,
    failed: limitDecision({ value, ...limits, uncertainty }).verdict === 'fail',
  }));
  const drawing = drawToleranceBand({ low: at(limits.low), high: at(limits.high), unit, readings }, options);
  return [{ kind: 'drawing', caption, drawing }];
}
