import type { Unit } from '../contracts/quantity.js';
import type { Judgement } from '../contracts/verdict.js';
import { printNumber } from '../quantities/print.js';
import type { LimitTaken } from './belt-limit.js';
import type { Misalignment } from './misalignment.js';
import { printLength } from './print-length.js';

/** Floating point alone moves a figure at its limit by less than this, degrees and shares alike. */
const noise = 1e-9;

/** Which of the two is within its limit; a limit belongs to the good side. `span` in metres. */
export function withinLimit(
  { offset, angle }: Misalignment,
  span: number,
  limit: LimitTaken,
): { readonly isStraight: boolean; readonly isInPlane: boolean } {
  return {
    isStraight: Math.abs(angle) <= limit.angle + noise,
    isInPlane: Math.abs(offset) / span <= limit.offsetPerSpan + noise,
  };
}

/**
 * Judges a driven pulley's line: `pass` where angle and offset per span are both within their limits. `of` is what
 * lies in that line: the grooves, or the rims where nobody said how far behind them the grooves are.
 */
export function judgeLine(
  found: Misalignment,
  span: number,
  limit: LimitTaken,
  unit: Unit,
  of: 'grooves' | 'rims',
): Judgement {
  const { offset, angle } = found;
  const { isStraight, isInPlane } = withinLimit(found, span, limit);
  const out = lengths(Math.abs(offset), limit.offsetPerSpan * span, unit);
  const turned = `turned ${printNumber(Math.abs(angle), 2)}° to each other (at most ${printNumber(limit.angle, 2)}°)`;
  return {
    verdict: isStraight && isInPlane ? 'pass' : 'fail',
    reason: `The ${of} are ${out.found} out of one plane (at most ${out.allowed} over this span) and ${turned}.`,
  };
}

/** Both printed alike, with a digit more where they would look the same. */
function lengths(found: number, allowed: number, unit: Unit): { found: string; allowed: string } {
  const coarse = { found: printLength(found, unit), allowed: printLength(allowed, unit) };
  return coarse.found === coarse.allowed
    ? { found: printLength(found, unit, 4), allowed: printLength(allowed, unit, 4) }
    : coarse;
}
