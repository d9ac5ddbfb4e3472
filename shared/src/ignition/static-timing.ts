import { InputError } from '../contracts/input-error.js';
import { requireNumber, requireRecord } from '../quantities/require.js';
import { crankFromTop } from '../valve-train/crank-from-top.js';
import { requireCrankThrow } from '../valve-train/piston-height.js';

/** What an advance may be, crank degrees before TDC. */
export const advanceRange = { min: -20, max: 90 };

/**
 * An unknown input as a static timing, crank degrees before TDC: given as degrees, or as how far the piston
 * stands below its top before TDC, which is turned into degrees by stroke and rod length.
 *
 * @throws InputError on `field` or the figure inside it that cannot be used; on `field.advance` where both ways
 * are given
 * Source: slider-crank without offset. Example: 1.011 mm before TDC, stroke 100 mm, rod 150 mm: 10°.
 */
export function requireStaticTiming(input: unknown, field: string): number {
  const given = requireRecord(input, field);
  const piston = given['pistonBeforeTdc'];
  if (piston === undefined) return requireNumber(given['advance'], `${field}.advance`, advanceRange);
  if (given['advance'] !== undefined) {
    throw new InputError(
      `${field}.advance`,
      'Give the timing in degrees or as the piston’s travel, not both.',
    );
  }
  const crankThrow = requireCrankThrow(given['stroke'], given['rodLength'], field);
  const advance = crankFromTop(crankThrow, piston, `${field}.pistonBeforeTdc`);
  if (advance <= advanceRange.max) return advance;
  throw new InputError(
    `${field}.pistonBeforeTdc`,
    `That is more than ${advanceRange.max}° before TDC, earlier than any engine is timed.`,
  );
}
