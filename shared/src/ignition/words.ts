import type { Cylinder } from '../contracts/calculations.js';
import { clip } from '../quantities/clip.js';
import { printNumber } from '../quantities/print.js';

/** A cylinder's, post's or outlet's name as it stands in a sentence: a very long one is cut. */
export function named(name: string | number): string {
  return clip(String(name));
}

/** `1`, `1 and 3`, `1, 3 and 4`. */
export function listed(names: readonly (string | number)[]): string {
  const all = names.map(named);
  const last = all.pop();
  if (last === undefined) return 'none';
  return all.length === 0 ? last : `${all.join(', ')} and ${last}`;
}

/** `cylinder 3` or `cylinders 1, 3 and 4`. */
export function cylindersNamed(cylinders: readonly Cylinder[]): string {
  return `${cylinders.length === 1 ? 'cylinder' : 'cylinders'} ${listed(cylinders)}`;
}

/** A firing order as the trade writes it: `1-3-4-2`. */
export function orderNamed(order: readonly Cylinder[]): string {
  return order.map(named).join('-');
}

/** `1 post`, `2 posts`. */
export function counted(count: number, one: string): string {
  return `${count} ${count === 1 ? one : `${one}s`}`;
}

/** Degrees for a sentence, to a tenth, with a real minus sign: `90°`, `102.9°`, `−7°`. */
export function degrees(angle: number): string {
  return `${printNumber(angle, 1).replace(/\.0$/, '')}°`;
}

/** Whether a spark is a full crank turn from its time, give or take what is lost in rounding. */
export function isWholeTurn(late: number): boolean {
  return Math.abs(late) > 359.9;
}

/** How far from its time a spark comes: `180° late`, `90° early`, `360° out`. */
export function lateness(late: number): string {
  if (isWholeTurn(late)) return '360° out';
  return `${degrees(Math.abs(late))} ${late < 0 ? 'early' : 'late'}`;
}

/** The sentence with a capital at its head. */
export function sentence(text: string): string {
  return text.charAt(0).toUpperCase() + text.slice(1);
}
