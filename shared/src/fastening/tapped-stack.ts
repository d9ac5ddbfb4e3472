import type { TappedMaterial } from '../contracts/fastening.js';
import type { Unit } from '../contracts/quantity.js';
import { fromSi } from '../quantities/convert.js';
import { engagementNeeded, judgeEngagement } from './engagement.js';
import { printLength } from './print-length.js';
import type { Thread } from './thread.js';
import type { StackFigures } from './stack-figures.js';

export interface TappedCase {
  readonly thread: Thread;
  readonly unit: Unit;
  /** Metres past what is clamped. */
  readonly reach: number;
  /** Grip and washers, metres. */
  readonly clamped: number;
  readonly material: TappedMaterial;
  /** Full thread from the mouth of the hole, metres. */
  readonly threadDepth: number;
  /** Of a blind hole, metres. */
  readonly holeDepth: number | undefined;
}

/** A bolt through a joint into a tapped hole: whether it holds there, and whether it can be pulled tight. */
export function tappedStack(joint: TappedCase): StackFigures {
  const { thread, unit, reach, clamped, material, threadDepth, holeDepth } = joint;
  const engagement = Math.max(0, Math.min(reach, threadDepth));
  const female = judgeEngagement(thread, material, fromSi(engagement, unit));
  const jams = holeDepth === undefined ? undefined : jamming(joint, holeDepth);
  const needed = engagementNeeded(thread, material);
  const print = (metres: number): string => printLength(fromSi(metres, unit));
  return {
    verdict:
      jams?.verdict === 'fail' ? 'fail' : female.verdict === 'fail' ? 'fail' : (jams?.verdict ?? 'pass'),
    reason: [
      reach <= 0 ? 'The bolt does not reach the hole.' : undefined,
      jams?.reason,
      reach <= 0 ? undefined : female.reason,
      needed > threadDepth ? `No bolt helps: only ${print(threadDepth)} of thread is there.` : undefined,
      needed <= threadDepth && female.verdict === 'fail'
        ? `It takes a bolt of at least ${print(clamped + needed)}.`
        : undefined,
    ]
      .filter((sentence) => sentence !== undefined)
      .join(' '),
    engagement,
    ...(holeDepth !== undefined && { spare: threadDepth - reach }),
    lengthNeeded: clamped + needed,
    assumed: [
      'Least engagement by material: common practice, no source.',
      ...(holeDepth === undefined ? ['A through hole: the bolt cannot bottom.'] : []),
    ],
  };
}

/** In a blind hole the end of the full thread stops the bolt before the bottom does. */
function jamming(
  { thread, unit, reach, threadDepth }: TappedCase,
  holeDepth: number,
): { readonly verdict: StackFigures['verdict']; readonly reason: string } | undefined {
  const print = (metres: number): string => printLength(fromSi(metres, unit));
  const spare = threadDepth - reach;
  if (reach > holeDepth + 1e-9) {
    return {
      verdict: 'fail',
      reason: `The bolt bottoms: it is ${print(reach - holeDepth)} longer than the hole is deep, and would be tight without clamping.`,
    };
  }
  if (spare < -1e-9) {
    return {
      verdict: 'fail',
      reason: `The bolt runs ${print(-spare)} past the end of the full thread and jams there before it clamps.`,
    };
  }
  if (spare < thread.pitch - 1e-9) {
    return {
      verdict: 'doubtful',
      reason: `Only ${print(spare)} of thread is left below the bolt, less than a pitch: measure the hole again.`,
    };
  }
  return undefined;
}
