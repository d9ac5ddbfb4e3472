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
  const [out, most] = [Math.abs(offset), limit.offsetPerSpan * span].map((metres) =>
    printLength(metres, unit),
  );
  const [turned, mostTurned] = [Math.abs(angle), limit.angle].map((degrees) => `${printNumber(degrees, 2)}°`);
  return {
    verdict: isStraight && isInPlane ? 'pass' : 'fail',
    reason: `The ${of} are ${out} out of one plane (${allowed(isInPlane, out, most)} over this span) and turned ${turned} to each other (${allowed(isStraight, turned, mostTurned)}).`,
  };
}

/** What is allowed; a figure over it by less than is printed of either is said to be just over. */
const allowed = (isWithin: boolean, found = '', most = ''): string =>
  !isWithin && found === most ? `just over the ${most} allowed` : `at most ${most}`;
