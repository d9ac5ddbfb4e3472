import type { Cylinder } from '../../contracts/calculations.js';
import { printNumber } from '../../quantities/print.js';
import { decimalsOf } from '../../drawing/words.js';

/** An angle to a tenth of a degree, without an idle zero: `12.5°`, `−3°`. */
export function printAngle(angle: number): string {
  return `${printNumber(angle, decimalsOf(angle, 1))}°`;
}

/** `No. 3`, or a cylinder's own name. */
export function cylinderName(cylinder: Cylinder): string {
  return typeof cylinder === 'number' ? `No. ${cylinder}` : cylinder;
}

export const stateWords = {
  shut: 'shut',
  opening: 'opening',
  full: 'fully open',
  closing: 'closing',
} as const;

export const assumedEven = (intervals: readonly number[] | undefined): readonly string[] =>
  intervals === undefined ? ['The engine fires evenly.'] : [];
