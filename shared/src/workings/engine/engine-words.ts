import type { Quantity, Unit } from '../../contracts/quantity.js';
import { printNumber, printQuantity } from '../../quantities/print.js';
import { decimalsOf } from '../../drawing/words.js';

/** An angle to a tenth of a degree or as finely as is said, without idle zeros: `12.5°`, `−3°`. */
export function printAngle(angle: number, most = 1): string {
  return `${printNumber(angle, decimalsOf(angle, most))}°`;
}

/** Decimals of a length that somebody measures or marks off: a hundredth of a millimetre, a thousandth of an inch. */
const lengthDigits: Readonly<Partial<Record<Unit, number>>> = {
  m: 5,
  cm: 3,
  mm: 2,
  µm: 0,
  in: 3,
  thou: 0,
  ft: 4,
};

/** A length as finely as it can be measured, or by `finer` decimals more. */
export function printLength(length: Quantity, finer = 0): string {
  return printQuantity(length, { digits: (lengthDigits[length.unit] ?? 3) + finer });
}

/** The sentences of an advice, each a step. */
export function sentencesOf(text: string): readonly string[] {
  return text.split(/(?<=\.) (?=[A-Z])/).filter((one) => one !== '');
}

export const stateWords = {
  shut: 'shut',
  opening: 'opening',
  full: 'fully open',
  closing: 'closing',
} as const;

export const assumedEven = (intervals: readonly number[] | undefined): readonly string[] =>
  intervals === undefined ? ['The engine fires evenly.'] : [];
