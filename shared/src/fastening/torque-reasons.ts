import type { FastenerUse } from '../contracts/fastening.js';
import type { Quantity, Unit } from '../contracts/quantity.js';
import type { Judgement } from '../contracts/verdict.js';
import { toSi } from '../quantities/convert.js';
import { printNumber, printQuantity } from '../quantities/print.js';
import type { Grade } from './grade.js';
import type { NutFactor } from './nut-factor.js';
import { isUnder, leastShare } from './read-as.js';
import type { Thread } from './thread.js';

export interface ClampCase {
  readonly torque: Quantity;
  readonly thread: Thread;
  readonly nut: NutFactor;
  /** Share that the nut factor may be off, either way. */
  readonly spread: number;
}

/** Over this share of the proof load a printed torque is doubted: common practice, no source. */
export const mostShare = 0.9;

const load = (preload: Quantity): string =>
  printQuantity({ value: preload.value / 1000, unit: 'kN' }, { digits: 1 });

/** Why no clamp load can judge a torque. */
export const cannotJudge = {
  plug: 'A plug is sealed by its taper or washer and clamps nothing: no clamp load can judge its torque.',
  union:
    'A union nut presses its cone or olive together and stretches no bolt: no clamp load can judge its torque.',
  'gasket-cover':
    'A cover screw is held by what its gasket bears, not by the bolt: no clamp load can judge its torque.',
  'to-yield':
    'This bolt is tightened to yield: the bolt giving way sets its clamp load, and the torque alone tells nothing of it.',
  'by-angle':
    'This bolt is turned on by an angle, which sets its clamp load: the torque before it is only the start.',
  grade: (why: string, preload: Quantity): string =>
    `This torque clamps with about ${load(preload)}, but ${why}: what the bolt bears can't be judged.`,
} as const satisfies Record<Exclude<FastenerUse, 'clamp'>, string> & { grade: unknown };

/** What the clamp load says of the torque, with the share of the proof load (N). */
export function judgeShare(
  { torque, thread, nut, spread }: ClampCase,
  grade: Extract<Grade, { name: string }>,
  proofLoad: number,
  better: { readonly unit: Unit; readonly share: number } | undefined,
): Judgement {
  const preload = toSi(torque) / (nut.factor * thread.diameter);
  const share = preload / proofLoad;
  const range =
    spread === 0
      ? ''
      : `, from ${percent(share / (1 + spread))} to ${percent(share / (1 - spread))} ` +
        `as the nut factor may be ${printNumber(spread * 100, 0)} % off`;
  const { verdict, words } = finding(share);
  const top =
    share <= 1 && isUnder(1, share / (1 - spread)) ? 'At the top of that range it is past proof.' : '';
  const slip =
    better === undefined
      ? ''
      : `Read in ${better.unit}, the same number would be ${percent(better.share)}: was ${better.unit} meant?`;
  return {
    verdict,
    reason: [
      `${printQuantity(torque)} on ${thread.name}, ${nut.words}, clamps with about ` +
        `${load({ value: preload, unit: 'N' })}: ${percent(share)} of the proof load of ${grade.name}${range}.`,
      top,
      words,
      slip,
      grade.note ?? '',
    ]
      .filter((sentence) => sentence !== '')
      .join(' '),
  };
}

function finding(share: number): { readonly verdict: Judgement['verdict']; readonly words: string } {
  if (isUnder(1, share)) {
    return {
      verdict: 'fail',
      words: 'That is over the proof load: the bolt would stretch and stay stretched.',
    };
  }
  if (isUnder(mostShare, share)) {
    return {
      verdict: 'doubtful',
      words:
        'That is over 90 %. Published maxima reach 92 to 94 % of proof, so it may be meant: ' +
        'read the figure again, and the condition that it is printed for.',
    };
  }
  if (isUnder(share, leastShare)) {
    return {
      verdict: 'doubtful',
      words: 'That is under 25 %, too little to hold most joints: read the figure and its unit again.',
    };
  }
  return { verdict: 'pass', words: '' };
}

/** A share as `65 %`; with decimals where rounding would hide on which side of a bound it lies. */
function percent(share: number): string {
  const value = share * 100;
  const isNearBound = [leastShare, mostShare, 1].some((bound) => Math.abs(value - bound * 100) < 0.5);
  return `${printNumber(value, value < 10 ? 1 : isNearBound ? 2 : 0)} %`;
}

/** What becomes of the clamp load where a torque for one condition is used in another. */
export function changeInWords(printedFor: NutFactor, used: NutFactor): string {
  const change = printedFor.factor / used.factor;
  const condition = `The figure is printed for use ${printedFor.words}`;
  if (Math.abs(change - 1) < 1e-9) return `${condition}, as it is used.`;
  return `${condition}; used ${used.words} it clamps ${printNumber(change, 2)} times as hard as was meant.`;
}
