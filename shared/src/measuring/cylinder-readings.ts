import type { Cylinder } from '../contracts/calculations.js';
import { InputError } from '../contracts/input-error.js';
import type { Unit } from '../contracts/quantity.js';
import { convert } from '../quantities/convert.js';
import {
  requireList,
  requireNumber,
  requireQuantity,
  requireRecord,
  requireText,
} from '../quantities/require.js';
import { mostCylinders } from './swept-volume.js';

export type CylinderTestKind = 'compression' | 'leak-down';

/** One cylinder's readings, in the unit of the first (compression) or in percent lost. */
export interface CylinderRead {
  readonly cylinder: Cylinder;
  readonly dry: number;
  readonly wet?: number;
  readonly bank?: string;
}

export interface CylindersRead {
  readonly cylinders: readonly CylinderRead[];
  /** Null for percent. */
  readonly unit: Unit | null;
}

/** Untrusted readings of a cylinder test, each cylinder once. Throws `InputError` on `readings` and below. */
export function readCylinders(input: unknown, test: CylinderTestKind): CylindersRead {
  const names = new Set<Cylinder>();
  let unit: Unit | null = null;
  const figure = (value: unknown, field: string): number => {
    if (test === 'leak-down') return requireNumber(value, field, { min: 0, max: 100 });
    const pressure = requireQuantity(value, 'pressure', field);
    unit ??= pressure.unit;
    return convert(pressure, unit).value;
  };
  const cylinders = requireList(input, 'readings', { min: 1, max: mostCylinders }).map((item, i) => {
    const path = `readings[${i}]`;
    const given = requireRecord(item, path);
    const cylinder = readCylinder(given['cylinder'], `${path}.cylinder`);
    if (names.has(cylinder)) throw new InputError(`${path}.cylinder`, `Cylinder ${cylinder} is there twice.`);
    names.add(cylinder);
    return {
      cylinder,
      dry: figure(given['dry'], `${path}.dry`),
      ...(given['wet'] === undefined ? {} : { wet: figure(given['wet'], `${path}.wet`) }),
      ...(given['bank'] === undefined
        ? {}
        : { bank: requireText(given['bank'], `${path}.bank`, { max: 20 }) }),
    };
  });
  return { cylinders, unit };
}

function readCylinder(input: unknown, field: string): Cylinder {
  return typeof input === 'number'
    ? requireNumber(input, field, { min: 1, max: 999, integer: true })
    : requireText(input, field, { max: 20 }).trim();
}
