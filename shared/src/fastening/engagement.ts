import type { TappedMaterial } from '../contracts/fastening.js';
import type { Judgement } from '../contracts/verdict.js';
import type { Quantity } from '../contracts/quantity.js';
import { fromSi, toSi } from '../quantities/convert.js';
import { printNumber, printQuantity } from '../quantities/print.js';
import { printLength } from './print-length.js';
import { leastEngagement } from './tables/least-engagement.js';
import type { Thread } from './thread.js';

/** Length of engagement that a tapped material needs at least, in metres. Common practice, no source. */
export function engagementNeeded(thread: Thread, material: TappedMaterial): number {
  return leastEngagement[material].diameters * thread.diameter;
}

/**
 * Whether a bolt reaches far enough into a tapped hole, so that the female thread does not strip before the bolt
 * gives way: at least so many diameters by material. Without an engagement `not-judged`, asking for it.
 * Common practice, no source.
 */
export function judgeEngagement(
  thread: Thread,
  material: TappedMaterial,
  engagement: Quantity | undefined,
): Judgement {
  const { diameters, words } = leastEngagement[material];
  const needed = engagementNeeded(thread, material);
  const unit = engagement?.unit ?? thread.nominal.unit;
  const least = `${printLength(fromSi(needed, unit))} (${diameters} × the diameter, common practice)`;
  if (engagement === undefined) {
    return {
      verdict: 'not-judged',
      reason: `Into ${words} the female thread may strip first. Measure how far the bolt screws in: it needs at least ${least}.`,
    };
  }
  const got = toSi(engagement);
  const has = `${printQuantity(engagement)} of thread in ${words} is ${printNumber(got / thread.diameter, 2)} × the diameter`;
  return got >= needed * (1 - 1e-9)
    ? { verdict: 'pass', reason: `${has}; it needs at least ${least}.` }
    : {
        verdict: 'fail',
        reason: `${has}; it needs at least ${least}: the female thread may strip before the bolt is tight.`,
      };
}
