import type { FastenerUse, TorqueDoubt, TorqueDoubtRequest } from '../contracts/fastening.js';
import { InputError } from '../contracts/input-error.js';
import type { FastenerGroup } from '../contracts/spec.js';
import { drawProofBand, type ProofBandPoint } from '../drawing/proof-band.js';
import { readThread } from '../fastening/read-thread.js';
import { leastShare } from '../fastening/read-as.js';
import { torqueDoubt } from '../fastening/torque-doubt.js';
import { mostShare } from '../fastening/torque-reasons.js';
import { usualSpread } from '../fastening/tables/nut-factors.js';
import { toSi } from '../quantities/convert.js';
import { printNumber, printQuantity } from '../quantities/print.js';
import { defineWorking } from './define-working.js';
import { percent, printInBoth, typed } from './fastening/figures.js';
import { printFigure } from '../fastening/print-figure.js';
import { casesByThread } from './fastening/groups-of-spec.js';
import { knownGrade, torqueDoubtSections } from './fastening/torque-doubt-fields.js';
import { gradesFor } from './fastening/grades-for.js';
import { conditionOf, threadLockFactor } from './fastening/condition.js';
import type { AnswerPart, WorkingCase } from './working.js';

/** Whether a printed torque can be right for its bolt. */
export const torqueDoubtWorking = defineWorking({
  key: 'torque-doubt',
  group: 'tightening',
  title: 'Doubt a torque',
  asks: 'Can this torque be right for this bolt, or has a figure or its unit slipped?',
  sections: torqueDoubtSections,
  example: {
    typed: { torque: '30.9 lbf·ft', thread: '3/8-16 UNC', grade: 'SAE 5', condition: 'dry' },
    from: 'a valve actuator’s manual of 2018, appendix A.7: 4941 lbf and 30.9 lbf·ft at 75 % of proof',
  },
  fieldOf: [
    [/^torque/, 'torque'],
    [/^alsoPrinted/, 'alsoPrinted'],
    [/^condition/, 'nutFactor'],
    [/^nutFactorSpread/, 'spread'],
    [/^tapped\.engagement/, 'engagement'],
    [/^tapped/, 'into'],
  ],
  basis: [
    'Clamp load F = T/(K·d); K is the nut factor: 0.20 dry, 0.15 oiled, 0.12 with moly paste, common practice, no source.',
    'Proof load = proof stress of ISO 898-1:2013, table 3, or SAE J429, times the stress area; partly from memory.',
    'Doubted under 25 % and over 90 % of the proof load, failed over it: common practice, no source.',
  ],
  fromSpec: (document) => casesByThread(document, caseOfGroup),
  answer: (read, options) => {
    const request: TorqueDoubtRequest = {
      torque: read.quantity('torque'),
      alsoPrinted: read.quantityIf('alsoPrinted'),
      thread: read.text('thread'),
      grade: read.choice('grade'),
      condition: conditionOf(read.choice('condition'), read.numberIf('nutFactor')),
      nutFactorSpread: spreadOf(read.numberIf('spread')),
      use: read.choice<FastenerUse>('use'),
      printedFor: read.choice('printedFor') === 'same' ? undefined : conditionOf(read.choice('printedFor')),
      tapped:
        read.choice('into') === 'nut'
          ? undefined
          : { material: read.choice('into'), engagement: read.quantityIf('engagement') },
    };
    const doubt = torqueDoubt(request);
    return {
      parts: [
        { kind: 'judgement', verdict: doubt.verdict, reason: doubt.reason },
        ...bandOf(request, doubt, options),
        ...figuresOf(request, doubt),
        ...gradesFor(request, doubt),
        ...(doubt.tapped === undefined
          ? []
          : [{ kind: 'judgement' as const, of: 'Female thread', ...doubt.tapped }]),
      ],
      assumed: [
        ...(request.nutFactorSpread === undefined && doubt.preload !== null
          ? [`The nut factor may be ${usualSpread * 100} % off either way: common practice, no source.`]
          : []),
        ...(read.choice('condition') === 'thread-lock'
          ? [
              `Sealant and thread-lock: a nut factor of ${printNumber(threadLockFactor, 2)}, as dry, no source.`,
            ]
          : []),
        'This catches gross slips only: N·m read for lbf·ft often leaves both believable.',
        'Bending, heat, a damaged thread and a washer that sinks in are left out.',
      ],
      cautions: ['The maker’s figure for this very fastener goes before anything worked out here.'],
    };
  },
});

function spreadOf(percentage: number | undefined): number | undefined {
  if (percentage !== undefined && percentage > 90)
    throw new InputError('spread', 'This must be at most 90 %.');
  return percentage === undefined ? undefined : percentage / 100;
}

function bandOf(
  { torque, alsoPrinted, thread, grade }: TorqueDoubtRequest,
  { preload, preloadRange, shareOfProof }: TorqueDoubt,
  options: { readonly dialect: 'british' | 'american' },
): readonly AnswerPart[] {
  if (shareOfProof === null || preload === null || preloadRange === null) return [];
  const point = (of: typeof torque): ProofBandPoint => {
    const share = (shareOfProof * toSi(of)) / toSi(torque);
    return {
      label: printFigure(of),
      share,
      low: (share * preloadRange.low.value) / preload.value,
      high: (share * preloadRange.high.value) / preload.value,
    };
  };
  const drawing = drawProofBand(
    {
      points: [point(torque), alsoPrinted && point(alsoPrinted)],
      of: `${grade} at ${readThread(thread).name}`,
      least: leastShare,
      most: mostShare,
    },
    options,
  );
  return [{ kind: 'drawing', caption: 'What the torque clamps with, of what the bolt bears', drawing }];
}

function figuresOf(request: TorqueDoubtRequest, doubt: TorqueDoubt): readonly AnswerPart[] {
  const { preload, preloadRange, shareOfProof, stressArea, clampChange, readAs } = doubt;
  const load = (newtons: number): string => printInBoth({ value: newtons / 1000, unit: 'kN' }, 'lbf');
  const facts = [
    ...(preload === null ? [] : [{ name: 'Clamp load, about', value: load(preload.value) }]),
    ...(preloadRange === null
      ? []
      : [
          {
            name: 'As the nut factor may be off',
            value: `${load(preloadRange.low.value)} to ${load(preloadRange.high.value)}`,
          },
        ]),
    ...(shareOfProof === null ? [] : [{ name: 'Of the proof load', value: percent(shareOfProof) }]),
    { name: 'Stress area', value: `${printNumber(stressArea.value, 1)}\u2009mm²` },
    ...(readAs === undefined
      ? []
      : [{ name: 'May have been meant', value: printQuantity({ ...request.torque, unit: readAs }) }]),
    ...(clampChange === undefined
      ? []
      : [{ name: 'Clamp load over what was meant', value: `${printNumber(clampChange, 2)} times` }]),
  ];
  return [{ kind: 'facts', heading: readThread(request.thread).name, facts }];
}

const covers: ReadonlySet<FastenerGroup['place']> = new Set([
  'rocker-cover',
  'valley-cover',
  'sump',
  'front-cover',
]);

function useOf({ noun, place, passes }: FastenerGroup): FastenerUse {
  if (noun.includes('plug')) return 'plug';
  if (passes.value.some((pass) => 'angle' in pass)) return 'by-angle';
  return covers.has(place) ? 'gasket-cover' : 'clamp';
}

function caseOfGroup(group: FastenerGroup): WorkingCase {
  const condition = group.condition.value;
  return {
    torque: typed(group.torque.value),
    ...(group.alsoPrinted && { alsoPrinted: typed(group.alsoPrinted.value) }),
    thread: group.thread.value,
    grade: knownGrade(group.grade.value),
    condition: condition === 'sealant' ? 'thread-lock' : condition,
    use: useOf(group),
  };
}
