import type { Unit } from '../contracts/quantity.js';
import type { Judgement } from '../contracts/verdict.js';
import { printNumber } from '../quantities/print.js';
import type { LimitTaken } from './belt-limit.js';
import type { Misalignment } from './misalignment.js';
import { printLength } from './print-length.js';

/** Floating point alone moves a figure at its limit by less than this, degrees and shares alike. */
const noise = 1e-9;

/** Judges a driven pulley's line: `pass` where angle and offset per span are both within their limits. */
export function judgeLine(
  { offset, angle }: Misalignment,
  span: number,
  limit: LimitTaken,
  unit: Unit,
): Judgement {
  const isStraight = Math.abs(angle) <= limit.angle + noise;
  const isInPlane = Math.abs(offset) / span <= limit.offsetPerSpan + noise;
  const allowed = printLength(limit.offsetPerSpan * span, unit);
  const off = `The grooves are ${printLength(Math.abs(offset), unit)} out of one plane, ${isInPlane ? 'of' : 'and may be'} at most ${allowed} over this span`;
  const turned = `they are turned ${printNumber(Math.abs(angle), 2)}° to each other, ${isStraight ? 'of' : 'and may be'} at most ${printNumber(limit.angle, 2)}°`;
  return { verdict: isStraight && isInPlane ? 'pass' : 'fail', reason: `${off}; ${turned}.` };
}
