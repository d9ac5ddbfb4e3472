import type { Unit } from '../contracts/quantity.js';
import { fromSi } from '../quantities/convert.js';
import { printNumber } from '../quantities/print.js';
import { printLength } from './print-length.js';
import type { Thread } from './thread.js';
import type { StackFigures } from './stack-figures.js';

export interface NutCase {
  readonly thread: Thread;
  readonly unit: Unit;
  /** Metres past what is clamped. */
  readonly reach: number;
  /** Grip and washers, metres. */
  readonly clamped: number;
  readonly nutHeight: number;
  /** The height is that of the table. */
  readonly isListed: boolean;
  readonly leastPitches: number;
  /** The least pitches are those of common practice. */
  readonly isUsual: boolean;
}

/** A bolt through a joint into a nut: how much of it comes through. */
export function nutStack(joint: NutCase): StackFigures {
  const { thread, unit, reach, clamped, nutHeight, isListed, leastPitches, isUsual } = joint;
  const protrusion = reach - nutHeight;
  const least = leastPitches * thread.pitch;
  const isEnough = protrusion >= least - 1e-9;
  const lengthNeeded = clamped + nutHeight + least;
  return {
    verdict: isEnough ? 'pass' : 'fail',
    reason: `${comesThrough(joint, protrusion)} ${
      isEnough
        ? `At least ${pitches(leastPitches)} must show.`
        : `At least ${pitches(leastPitches)} must show: it takes a bolt of ${printLength(fromSi(lengthNeeded, unit))}.`
    }`,
    engagement: Math.max(0, Math.min(nutHeight, reach)),
    protrusion,
    nutHeight,
    lengthNeeded,
    assumed: [
      ...(isListed ? [`Nut height ${printLength(fromSi(nutHeight, unit))}: the greatest of ISO 4032.`] : []),
      ...(isUsual ? ['At least 1 pitch past the nut: common practice, no source.'] : []),
      'The bolt has thread enough to be pulled tight before the nut reaches its shank.',
    ],
  };
}

function comesThrough({ thread, unit, reach }: NutCase, protrusion: number): string {
  const print = (metres: number): string => printLength(fromSi(Math.abs(metres), unit));
  if (reach <= 0) return `The bolt ends ${print(reach)} short of the nut's face: it does not reach the nut.`;
  if (protrusion < 0) return `The bolt ends ${print(protrusion)} inside the nut.`;
  const shown = printNumber(protrusion / thread.pitch, 1);
  return `${print(protrusion)} of the bolt comes past the nut, ${shown} pitches.`;
}

const pitches = (count: number): string => (count === 1 ? '1 pitch' : `${count} pitches`);
