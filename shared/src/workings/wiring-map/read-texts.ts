import type { Cylinder } from '../../contracts/calculations.js';

/** A typed number, with a point or a comma; null where it is none. */
export function readNumber(text: string): number | null {
  const trimmed = text.trim().replace(/°$/, '').replace(',', '.');
  return /^[+-]?\d+(\.\d+)?$/.test(trimmed) ? Number(trimmed) : null;
}

/**
 * A firing order as the trade writes it, `1-3-4-2`, also with commas or spaces. All whole numbers give cylinder
 * numbers, anything else names: `L1-R1-L2-R2`.
 */
export function readOrder(text: string): readonly Cylinder[] {
  const names = text.split(/[\s,;–-]+/).filter((name) => name !== '');
  return names.every((name) => /^\d+$/.test(name)) ? names.map(Number) : names;
}

/** Typed angles, `45, 135, 225, 315`; null where one of them is no number. */
export function readAngles(text: string): readonly number[] | null {
  return readAll(text.split(/[\s,;]+/));
}

/** Typed firing intervals, `90-150-90-150`; null where one of them is no number. */
export function readIntervals(text: string): readonly number[] | null {
  return readAll(text.split(/[\s,;–-]+/));
}

function readAll(texts: readonly string[]): readonly number[] | null {
  const numbers = texts.filter((text) => text !== '').map(readNumber);
  return numbers.some((number) => number === null) ? null : numbers.filter((number) => number !== null);
}
