import type { Quantity, Unit } from '../contracts/quantity.js';
import { convert, rescale, toSi } from './convert.js';
import { ceilTo, floorTo, roundTo } from './round.js';

const thinSpace = '\u2009';
const minus = '\u2212';
const mostDigits = 12;

/** A number with so many decimals, a point before them and a real minus sign, the same in every locale. */
export function printNumber(value: number, digits: number): string {
  if (!Number.isFinite(value)) return '–';
  const text = roundTo(Math.abs(value), digits).toFixed(digits);
  return value < 0 && Number(text) !== 0 ? minus + text : text;
}

/**
 * A quantity for people: value, thin space, unit. Without `digits` at most six significant digits are
 * printed and no idle zeros. Example: 36.607 084… N·m prints as 36.6071 N·m.
 */
export function printQuantity(quantity: Quantity, options: { digits?: number } = {}): string {
  const { value, unit } = quantity;
  const number = options.digits === undefined ? printShort(value) : printNumber(value, options.digits);
  return `${number}${thinSpace}${unit}`;
}

function printShort(value: number): string {
  const digits = Math.min(mostDigits, Math.max(0, 6 - leadingPlace(value)));
  const text = printNumber(value, digits);
  return text.includes('.') ? text.replace(/\.?0+$/, '') : text;
}

/**
 * How many decimals to print, all figures in the printed unit: as many as show the tool's resolution, or
 * two places past the tolerance's leading digit, and never more than were measured. The least of those
 * given counts; three when none is given. Common practice, no source.
 * Example: tolerance 0.02 → 4, resolution 0.01 → 2, measured to 1 decimal → 1.
 */
export function digitsFor(basis: { resolution?: number; tolerance?: number; measured?: number }): number {
  const places: number[] = [];
  if (basis.resolution !== undefined) places.push(1 - leadingPlace(basis.resolution));
  if (basis.tolerance !== undefined) places.push(3 - leadingPlace(basis.tolerance));
  if (basis.measured !== undefined) places.push(basis.measured);
  if (places.length === 0) return 3;
  return Math.min(mostDigits, Math.max(0, Math.min(...places)));
}

/** 1 for 1 to 9.9…, 2 for 10 to 99.9…, 0 for 0.1 to 0.99…; 1 for zero. */
function leadingPlace(value: number): number {
  if (value === 0 || !Number.isFinite(value)) return 1;
  return Number(value.toExponential().split('e')[1]) + 1;
}

/**
 * A limit in another unit, rounded to so many decimals into the good side: a low limit up, a high limit
 * down. A reading in that unit that passes the rounded limit passes the original one too.
 * Throws `InputError` as `convert`. Example: high 27 lbf·ft at one decimal is 36.6 N·m.
 */
export function roundInwards(limit: Quantity, to: Unit, places: number, side: 'low' | 'high'): Quantity {
  const exact = convert(limit, to).value;
  // A double holds no more than fifteen decimal digits.
  const digits = Math.min(places, 15 - leadingPlace(exact));
  const inwards = side === 'low' ? ceilTo : floorTo;
  const isGood = (value: number): boolean => {
    const beyond = toSi({ value, unit: to }) - toSi(limit);
    const beyondBack = rescale({ value, unit: to }, limit.unit).value - limit.value;
    return side === 'low' ? Math.min(beyond, beyondBack) >= 0 : Math.max(beyond, beyondBack) <= 0;
  };
  // A value that only floating point keeps off the grid is not pushed a whole step in.
  const nearest = roundTo(exact, digits);
  if (isGood(nearest) && Math.abs(nearest - exact) <= Math.abs(exact) * 1e-14) {
    return { value: nearest, unit: to };
  }
  const rounded = inwards(exact, digits);
  if (isGood(rounded)) return { value: rounded, unit: to };
  const step = 10 ** -digits;
  return { value: inwards(rounded + (side === 'low' ? step : -step) / 2, digits), unit: to };
}
