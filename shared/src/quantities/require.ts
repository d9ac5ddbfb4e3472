import { InputError } from '../contracts/input-error.js';
import { units, type Kind, type Quantity, type Unit } from '../contracts/quantity.js';
import { clip } from './clip.js';
import { kindOf, largestValue, refuseBelowAbsoluteZero } from './convert.js';
import { readUnit } from './unit-names.js';

export interface QuantityOptions {
  /** Negative figures are taken. Temperatures always are, down to absolute zero. */
  readonly negative?: boolean;
  /** Zero is taken; it is unless this is false, and then next to nothing isn't either: it is divided by. */
  readonly zero?: boolean;
  /** A difference, uncertainty or tolerance: a temperature then has no zero point and is not negative. */
  readonly interval?: boolean;
}

/** Nearer to zero than this no workshop figure lies, in whichever of our units. */
const smallestValue = 1e-12;

/**
 * An unknown input as a quantity of one kind, its unit made canonical.
 * Throws `InputError` on `field`, `field.value` or `field.unit`.
 */
export function requireQuantity(
  input: unknown,
  kind: Kind,
  field: string,
  options: QuantityOptions = {},
): Quantity {
  const quantity = readQuantity(input, field, kind);
  const actual = kindOf(quantity.unit);
  if (actual !== kind) {
    throw new InputError(
      `${field}.unit`,
      `${quantity.unit} measures ${actual}; ${kind} is needed: ${units[kind].join(', ')}.`,
    );
  }
  return within(quantity, kind, field, options);
}

/** As `requireQuantity`, of whatever kind the unit says. */
export function requireAnyQuantity(input: unknown, field: string, options: QuantityOptions = {}): Quantity {
  const quantity = readQuantity(input, field);
  return within(quantity, kindOf(quantity.unit), field, options);
}

/** An unknown input as a finite number within bounds. Throws `InputError` on `field`. */
export function requireNumber(
  input: unknown,
  field: string,
  options: { min?: number; max?: number; integer?: boolean } = {},
): number {
  const { min = -largestValue, max = largestValue, integer = false } = options;
  const what = integer ? 'a whole number' : 'a number';
  const right = typeof input === 'number' && input >= min && input <= max;
  if (!right || (integer && !Number.isInteger(input))) {
    throw new InputError(field, `This must be ${what}${bounds(options.min, options.max)}.`);
  }
  return input;
}

/** An unknown input as a text that is not blank, at most `max` (200) characters. Throws `InputError`. */
export function requireText(input: unknown, field: string, options: { max?: number } = {}): string {
  const max = options.max ?? 200;
  if (typeof input !== 'string') throw new InputError(field, 'This must be a text.');
  if (input.length > max) throw new InputError(field, `This must have at most ${max} characters.`);
  if (input.trim() === '') throw new InputError(field, 'This must not be empty.');
  return input;
}

/** An unknown input as a list of `min` to `max` items, a copy without holes. Throws `InputError` on `field`. */
export function requireList(
  input: unknown,
  field: string,
  options: { min?: number; max: number },
): readonly unknown[] {
  const min = options.min ?? 0;
  if (!Array.isArray(input)) throw new InputError(field, 'This must be a list.');
  if (input.length < min || input.length > options.max) {
    throw new InputError(field, `This must have ${min} to ${options.max} items; it has ${input.length}.`);
  }
  return Array.from<unknown>(input);
}

const dangerousKeys: ReadonlySet<string> = new Set(['__proto__', 'constructor', 'prototype']);

/**
 * An unknown input as a plain object of at most `max` (64) own keys. The answer is a copy without a
 * prototype, so that no key of it can mean anything but what was sent. Throws `InputError` on `field`.
 */
export function requireRecord(
  input: unknown,
  field: string,
  options: { max?: number } = {},
): Readonly<Record<string, unknown>> {
  const max = options.max ?? 64;
  if (typeof input !== 'object' || input === null || Array.isArray(input)) {
    throw new InputError(field, 'This must be an object of named values.');
  }
  const keys = Object.keys(input);
  if (keys.length > max) throw new InputError(field, `This must have at most ${max} names.`);
  const copy: Record<string, unknown> = Object.create(null) as Record<string, unknown>;
  for (const key of keys) {
    if (dangerousKeys.has(key) || key.length > 200) {
      throw new InputError(field, `“${clip(key)}” cannot be a name here.`);
    }
    copy[key] = (input as Record<string, unknown>)[key];
  }
  return copy;
}

/** An unknown input as one of a list of words or numbers. Throws `InputError` on `field`. */
export function requireOneOf<T extends string | number>(
  input: unknown,
  list: readonly T[],
  field: string,
): T {
  const found = list.find((one) => one === input);
  if (found === undefined) throw new InputError(field, `This must be one of ${list.join(', ')}.`);
  return found;
}

/** An unknown input as true or false. Throws `InputError` on `field`. */
export function requireYesOrNo(input: unknown, field: string): boolean {
  if (typeof input === 'boolean') return input;
  throw new InputError(field, 'This must be true or false.');
}

function readQuantity(input: unknown, field: string, kind?: Kind): Quantity {
  const example = `a value with its unit, such as { "value": 1, "unit": "${units[kind ?? 'torque'][0]}" }`;
  if (typeof input !== 'object' || input === null || Array.isArray(input)) {
    throw new InputError(field, `This must be ${example}.`);
  }
  const { value, unit } = input as { value?: unknown; unit?: unknown };
  if (typeof unit !== 'string') throw new InputError(`${field}.unit`, `This must be ${example}.`);
  const canonical = readUnit(unit);
  if (canonical === undefined) {
    const known: readonly Unit[] = kind === undefined ? Object.values(units).flat() : units[kind];
    throw new InputError(
      `${field}.unit`,
      `There is no unit “${clip(unit)}”; it must be one of ${known.join(', ')}.`,
    );
  }
  return { value: requireNumber(value, `${field}.value`), unit: canonical };
}

function within(quantity: Quantity, kind: Kind, field: string, options: QuantityOptions): Quantity {
  const { value, unit } = quantity;
  const path = `${field}.value`;
  if (kind === 'temperature' && options.interval !== true) {
    refuseBelowAbsoluteZero(value, unit, path);
    return quantity;
  }
  if (value < 0 && options.negative !== true) throw new InputError(path, 'This cannot be negative.');
  if (Math.abs(value) < smallestValue && options.zero === false) {
    throw new InputError(path, 'This must be more than zero.');
  }
  return quantity;
}

function bounds(min?: number, max?: number): string {
  if (min !== undefined && max !== undefined) return ` from ${min} to ${max}`;
  if (min !== undefined) return ` of at least ${min}`;
  return max === undefined ? ' no larger than 10¹⁵' : ` of at most ${max}`;
}
