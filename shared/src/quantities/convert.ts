import configureMeasurements from 'convert-units';
import { InputError } from '../contracts/input-error.js';
import type { Kind, Quantity, Unit } from '../contracts/quantity.js';
import { measures, siUnits, temperatureDegrees } from './definitions.js';
import { kindOfUnit, readUnit } from './unit-names.js';
import { clip } from './clip.js';

/** Beyond this no workshop figure lies, in whichever of our units. */
export const largestValue = 1e15;

const scale = configureMeasurements<Kind, 'SI', string>(measures);
const degrees = configureMeasurements<'temperature', 'SI', string>({ temperature: temperatureDegrees });

/** What kind of figure a unit measures. Throws `InputError` on `unit` for a text that is no canonical unit. */
export function kindOf(unit: Unit): Kind {
  const kind = kindOfUnit(unit);
  if (kind === undefined) throw new InputError('unit', `There is no unit “${clip(unit)}”.`);
  return kind;
}

/**
 * The same figure in another unit; a temperature with its zero point. `to` may be any spelling that
 * `readUnit` knows. Nothing is rounded.
 * Throws `InputError`: `quantity.value` (not finite, absurdly large, colder than absolute zero),
 * `quantity.unit` (unknown), `to` (unknown, or of another kind).
 * Source: NIST SP 811 (2008) App. B, by its exact definitions. Example: 27 lbf·ft is 36.607 084 6… N·m.
 */
export function convert(quantity: Quantity, to: string): Quantity {
  const { from, kind } = pair(quantity, to);
  if (kind === 'temperature') refuseBelowAbsoluteZero(quantity.value, from, 'quantity.value');
  return rescale(quantity, to);
}

/** As `convert`, of temperatures below absolute zero too: a rounded limit may step there. */
export function rescale(quantity: Quantity, to: string): Quantity {
  const { from, target } = pair(quantity, to);
  return { value: scale(quantity.value).from(from).to(target), unit: target };
}

/**
 * A difference, an uncertainty or a tolerance in another unit: as `convert`, but for a temperature only
 * the size of the degree counts. Example: 10 °C of difference are 18 °F.
 */
export function convertInterval(quantity: Quantity, to: string): Quantity {
  const { from, target, kind } = pair(quantity, to);
  const converter = kind === 'temperature' ? degrees : scale;
  return { value: converter(quantity.value).from(from).to(target), unit: target };
}

/** The figure in SI: N·m, m, m², N, Pa, m³, K, s, Ω, kg. Errors as `convert`. */
export function toSi(quantity: Quantity): number {
  const { from, kind } = pair(quantity, quantity.unit);
  return scale(quantity.value).from(from).to(siUnits[kind]);
}

/** A difference in SI: as `toSi`, but a difference of temperatures without the zero point. */
export function intervalToSi(quantity: Quantity): number {
  const { from, kind } = pair(quantity, quantity.unit);
  const converter = kind === 'temperature' ? degrees : scale;
  return converter(quantity.value).from(from).to(siUnits[kind]);
}

/** An SI figure (see `toSi`) in the unit asked for. Throws `InputError` on `value` or `unit`. */
export function fromSi(value: number, unit: Unit): Quantity {
  const kind = kindOf(unit);
  if (!Number.isFinite(value)) throw new InputError('value', 'This must be a finite number.');
  return { value: scale(value).from(siUnits[kind]).to(unit), unit };
}

/** Throws `InputError` on `field` for a temperature below 0 K. */
export function refuseBelowAbsoluteZero(value: number, unit: Unit, field: string): void {
  if (scale(value).from(unit).to('K') < 0) {
    throw new InputError(field, `${value} ${unit} is colder than absolute zero (−273.15 °C).`);
  }
}

function pair(quantity: Quantity, to: string): { from: Unit; target: Unit; kind: Kind } {
  const from = readUnit(quantity.unit);
  if (from === undefined) {
    throw new InputError('quantity.unit', `There is no unit “${clip(quantity.unit)}”.`);
  }
  if (!Number.isFinite(quantity.value) || Math.abs(quantity.value) > largestValue) {
    throw new InputError('quantity.value', 'This must be a finite number, at most 10¹⁵.');
  }
  const target = readUnit(to);
  if (target === undefined) throw new InputError('to', `There is no unit “${clip(to)}”.`);
  const kind = kindOf(from);
  if (kindOf(target) !== kind) {
    throw new InputError('to', `${from} measures ${kind} and cannot become ${target} (${kindOf(target)}).`);
  }
  return { from, target, kind };
}
