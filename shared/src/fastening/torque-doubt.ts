import {
  fastenerUses,
  tappedMaterials,
  type FastenerUse,
  type TappedMaterial,
  type TorqueDoubt,
  type TorqueDoubtRequest,
} from '../contracts/fastening.js';
import type { Quantity } from '../contracts/quantity.js';
import type { Judgement } from '../contracts/verdict.js';
import { fromSi, toSi } from '../quantities/convert.js';
import { requireNumber, requireOneOf, requireQuantity, requireRecord } from '../quantities/require.js';
import { judgeEngagement } from './engagement.js';
import { gradeAt, type Grade } from './grade.js';
import { requireNutFactor, type NutFactor } from './nut-factor.js';
import { comparePrinted } from './printed-figures.js';
import { readAs } from './read-as.js';
import { readThread } from './read-thread.js';
import { usualSpread } from './tables/nut-factors.js';
import type { Thread } from './thread.js';
import { changeInWords, cannotJudge, judgeShare, type ClampCase } from './torque-reasons.js';

interface Given extends ClampCase {
  readonly grade: Grade;
  readonly use: FastenerUse;
  readonly alsoPrinted: Quantity | undefined;
  readonly printedFor: NutFactor | undefined;
  readonly tapped:
    { readonly material: TappedMaterial; readonly engagement: Quantity | undefined } | undefined;
}

/**
 * Doubts a printed torque: the clamp load F = T/(K·d) against the proof load of the bolt, as a range over the
 * spread of the nut factor. Over the proof load `fail`; over 90 % or under 25 % of it `doubtful`, as are two
 * printed figures that disagree, and a female thread that is too short. `not-judged` for a grade or a use that no
 * clamp load tells anything of. A pass catches gross slips only: N·m read for lbf·ft often leaves both believable.
 *
 * Clamp load in N, stress area in mm², `shareOfProof` and `clampChange` plain. Nut factors are those of plain
 * steel; on plated bolts sources differ twofold, so there it must be given, with its spread.
 *
 * @throws InputError on `torque`, `alsoPrinted`, `thread`, `grade`, `condition`, `condition.nutFactor`,
 * `nutFactorSpread`, `use`, `printedFor`, `tapped.material`, `tapped.engagement`
 * Source: T = K·d·F with F = 75 % of proof, reference TQ-E; proof stress ISO 898-1:2013 and SAE J429; the bounds of
 * 25 and 90 % and the nut factors common practice, no source.
 * Example: 30.88 lbf·ft, 3/8-16 UNC, SAE 5, dry: 4941 lbf, 75 % of proof.
 */
export function torqueDoubt(request: TorqueDoubtRequest): TorqueDoubt {
  const given = requireGiven(request);
  const { thread, torque, alsoPrinted, tapped, printedFor, nut } = given;
  const printed = alsoPrinted && comparePrinted(torque, alsoPrinted);
  const female = tapped && judgeEngagement(thread, tapped.material, tapped.engagement);
  const bolt = judgeBolt(given);
  const change = printedFor && printedFor.factor / nut.factor;
  const isDoubted = printed?.agree === false || female?.verdict === 'fail';
  return {
    ...bolt.figures,
    verdict: isDoubted && bolt.judgement.verdict !== 'fail' ? 'doubtful' : bolt.judgement.verdict,
    reason: [
      bolt.judgement.reason,
      printed?.reason,
      printedFor && changeInWords(printedFor, nut),
      female && female.verdict !== 'pass' ? female.reason : undefined,
    ]
      .filter((sentence) => sentence !== undefined)
      .join(' '),
    stressArea: fromSi(thread.stressArea, 'mm2'),
    ...(change !== undefined && { clampChange: change }),
    ...(female && { tapped: female }),
  };
}

interface Bolt {
  readonly judgement: Judgement;
  readonly figures: Pick<TorqueDoubt, 'preload' | 'preloadRange' | 'shareOfProof' | 'readAs'>;
}

function judgeBolt(given: Given): Bolt {
  const { thread, torque, nut, spread, grade, use } = given;
  if (use !== 'clamp') {
    return {
      judgement: { verdict: 'not-judged', reason: cannotJudge[use] },
      figures: { preload: null, preloadRange: null, shareOfProof: null },
    };
  }
  const clamp = (factor: number): number => toSi(torque) / (factor * thread.diameter);
  const force = (value: number): Quantity => ({ value, unit: 'N' });
  const loads = {
    preload: force(clamp(nut.factor)),
    preloadRange: {
      low: force(clamp(nut.factor * (1 + spread))),
      high: force(clamp(nut.factor * (1 - spread))),
    },
  };
  if ('why' in grade) {
    return {
      judgement: { verdict: 'not-judged', reason: cannotJudge.grade(grade.why, loads.preload) },
      figures: { ...loads, shareOfProof: null },
    };
  }
  const proofLoad = grade.proof * thread.stressArea;
  const shareIn = (other: Quantity): number => toSi(other) / (nut.factor * thread.diameter) / proofLoad;
  const unit = readAs(torque, shareIn);
  return {
    judgement: judgeShare(given, grade, proofLoad, unit && { unit, share: shareIn({ ...torque, unit }) }),
    figures: { ...loads, shareOfProof: shareIn(torque), ...(unit && { readAs: unit }) },
  };
}

function requireGiven(request: unknown): Given {
  const given = requireRecord(request, 'request');
  const optional = <T>(name: string, read: (value: unknown) => T): T | undefined =>
    given[name] === undefined ? undefined : read(given[name]);
  const thread: Thread = readThread(given['thread']);
  return {
    torque: requireQuantity(given['torque'], 'torque', 'torque', { zero: false }),
    thread,
    grade: gradeAt(given['grade'], thread),
    nut: requireNutFactor(given['condition'], 'condition'),
    spread:
      optional('nutFactorSpread', (value) => requireNumber(value, 'nutFactorSpread', { min: 0, max: 0.9 })) ??
      usualSpread,
    use: optional('use', (value) => requireOneOf(value, fastenerUses, 'use')) ?? 'clamp',
    alsoPrinted: optional('alsoPrinted', (value) =>
      requireQuantity(value, 'torque', 'alsoPrinted', { zero: false }),
    ),
    printedFor: optional('printedFor', (value) => requireNutFactor(value, 'printedFor')),
    tapped: optional('tapped', requireTapped),
  };
}

function requireTapped(input: unknown): Given['tapped'] {
  const { material, engagement } = requireRecord(input, 'tapped');
  return {
    material: requireOneOf(material, tappedMaterials, 'tapped.material'),
    engagement:
      engagement === undefined ? undefined : requireQuantity(engagement, 'length', 'tapped.engagement'),
  };
}
