import { InputError } from '../contracts/input-error.js';
import { units, type Quantity, type Unit } from '../contracts/quantity.js';
import { clip } from './clip.js';
import { kindOf, largestValue } from './convert.js';
import { readUnit } from './unit-names.js';

const longestText = 60;

const fraction = /^([+-]?)(?:(\d{1,6})[ -])?(\d{1,6}) ?\/ ?(\d{1,6})(?!\d)/;
const decimal = /^([+-]?)(\d[\d.,]*(?: \d{3}(?!\d))*(?:[.,]\d+)?|[.,]\d+)(?:[eE]([+-]?\d{1,3})(?!\d))?/;

/**
 * Reads a figure with its unit as a workshop writes it: `27 lbf·ft`, `0.0015"`, `1.5 thou`, `36,6 Nm`,
 * `3/8"`, `1 1/2 in`, `1½ in`. A single comma or point is the decimal sign (`1,500` is one and a half);
 * thousands are told by a space, a repeated sign, or the other sign (`1,234.5`).
 * `fallback` is the unit where none is written; without it the unit must be.
 * Throws `InputError` on `field` (default `quantity`).
 */
export function parseQuantity(text: string, fallback?: Unit, field = 'quantity'): Quantity {
  if (typeof text !== 'string' || text.length > longestText) {
    throw new InputError(
      field,
      `Write a number and a unit, such as 27 lbf·ft, in ${longestText} characters.`,
    );
  }
  const plain = tidy(text);
  const { value, rest } = readFraction(plain, field) ?? readDecimal(plain, field, fallback);
  if (!Number.isFinite(value) || Math.abs(value) > largestValue) {
    throw new InputError(field, 'This number is larger than any workshop figure.');
  }
  const name = rest.trim();
  const unit = name === '' ? fallback : readUnit(name);
  if (unit !== undefined) return { value, unit };
  if (name === '') throw new InputError(field, 'Write the unit too, such as 27 lbf·ft.');
  throw new InputError(field, `There is no unit “${clip(name)}”. ${unitsLike(fallback)}`);
}

/** Units that a figure may have: those of the field's own kind, where it has one. */
function unitsLike(fallback: Unit | undefined): string {
  if (fallback === undefined) return 'Write it like lbf·ft, N·m, mm, in or thou.';
  const names: readonly string[] = units[kindOf(fallback)];
  return `Write it in ${names.slice(0, -1).join(', ')} or ${names.at(-1) ?? fallback}.`;
}

/** Vulgar fractions are spelled out, every kind of space is one space, every kind of minus a hyphen. */
function tidy(text: string): string {
  return text
    .replace(/[¼-¾⅐-⅞]/g, (sign) => ` ${sign.normalize('NFKC')}`)
    .replace(/[⁄∕]/g, '/')
    .replace(/[−–‒﹣－]/g, '-')
    .replace(/\s+/g, ' ')
    .trim()
    .replace(/^([+-]) /, '$1');
}

interface NumberRead {
  readonly value: number;
  readonly rest: string;
}

function readFraction(text: string, field: string): NumberRead | undefined {
  const match = fraction.exec(text);
  if (match === null) return undefined;
  const [all, sign, whole = '0', over, under] = match;
  if (Number(under) === 0) throw new InputError(field, 'A fraction cannot have 0 below the line.');
  const size = Number(whole) + Number(over) / Number(under);
  return { value: sign === '-' ? -size : size, rest: text.slice(all.length) };
}

function readDecimal(text: string, field: string, unit: Unit = 'lbf·ft'): NumberRead {
  const match = decimal.exec(text);
  const digits = match?.[2] === undefined ? undefined : plainDecimal(match[2]);
  if (match === null || digits === undefined) {
    throw new InputError(field, `“${clip(text)}” does not begin with a number. Write it like 27 ${unit}.`);
  }
  const value = Number(`${match[1] === '-' ? '-' : ''}${digits}e${match[3] ?? '0'}`);
  return { value, rest: text.slice(match[0].length) };
}

/** Digits with a decimal point only, or undefined where the signs in it make no number. */
function plainDecimal(written: string): string | undefined {
  const signs = written.replace(/[\d ]/g, '');
  const last = signs.at(-1);
  const isGrouped = signs.length > 1 && new Set(signs).size === 1;
  const cut = last === undefined || isGrouped ? written.length : written.lastIndexOf(last);
  const whole = written.slice(0, cut);
  const part = written.slice(cut + 1);
  if (/[.,]/.test(whole) && !/^\d{1,3}([.,])\d{3}(?:\1\d{3})*$/.test(whole)) return undefined;
  if (whole.includes(' ') && !/^\d{1,3}(?: \d{3})+$/.test(whole)) return undefined;
  if (/\D/.test(part)) return undefined;
  return `${whole.replace(/\D/g, '') || '0'}.${part || '0'}`;
}
