import type { TappedMaterial, ThreadStack, ThreadStackRequest } from '../contracts/fastening.js';
import type { Quantity } from '../contracts/quantity.js';
import { drawThreadStack } from '../drawing/thread-stack.js';
import { printLength } from '../fastening/print-length.js';
import { threadStack } from '../fastening/thread-stack.js';
import { printNumber } from '../quantities/print.js';
import { defineWorking } from './define-working.js';
import { intoField, isTapped, threadField } from './fastening/fields.js';
import { casesByThread } from './fastening/groups-of-spec.js';
import type { CaseReader } from './read-case.js';
import type { WorkingCase } from './working.js';

const isNut = (typed: WorkingCase): boolean => !isTapped(typed);

/** Whether a bolt or stud is as long as its joint needs. */
export const threadStackWorking = defineWorking({
  key: 'thread-stack',
  group: 'tightening',
  title: 'Is the bolt long enough',
  asks: 'Does this bolt come through its nut, or reach far enough into its hole without bottoming?',
  sections: [
    {
      heading: 'Bolt and joint',
      fields: [
        threadField,
        {
          kind: 'quantity',
          name: 'boltLength',
          label: 'Bolt, under its head to its end',
          hint: 'A stud from the face it stands on',
          of: 'length',
          unit: 'mm',
        },
        { kind: 'quantity', name: 'grip', label: 'What is clamped', of: 'length', unit: 'mm' },
        {
          kind: 'quantity',
          name: 'washers',
          label: 'All washers together',
          optional: 'no washers',
          of: 'length',
          unit: 'mm',
        },
      ],
    },
    {
      heading: 'What it goes into',
      fields: [
        intoField,
        {
          kind: 'quantity',
          name: 'nutHeight',
          label: 'Height of the nut',
          optional: 'the greatest of ISO 4032; measure the nut of an inch thread',
          of: 'length',
          unit: 'mm',
          when: isNut,
        },
        {
          kind: 'number',
          name: 'leastPitches',
          label: 'At least past the nut',
          optional: '1 pitch, common practice',
          counts: 'pitches',
          when: isNut,
        },
        {
          kind: 'quantity',
          name: 'threadDepth',
          label: 'Full thread in the hole, from its mouth',
          of: 'length',
          unit: 'mm',
          when: isTapped,
        },
        {
          kind: 'quantity',
          name: 'holeDepth',
          label: 'Depth of the drilled hole',
          optional: 'a through hole',
          of: 'length',
          unit: 'mm',
          when: isTapped,
        },
      ],
    },
  ],
  example: {
    typed: { thread: 'M10x1.5', boltLength: '50 mm', grip: '35 mm', washers: '2 mm', into: 'nut' },
    from: 'a nut of ISO 4032, 8.4 mm high: 50 − 35 − 2 − 8.4 leaves 4.6 mm',
  },
  fieldOf: [
    [/^boltLength/, 'boltLength'],
    [/^grip/, 'grip'],
    [/^washers/, 'washers'],
    [/^into\.(nutHeight|leastPitches|threadDepth|holeDepth)/, '$1'],
  ],
  basis: [
    'Past the nut = bolt − clamped − washers − nut. Into a hole: engagement = bolt − clamped − washers, as far as there is thread.',
    'Nut heights: ISO 4032:2012, table 1, from memory.',
    'Least engagement 1 × the diameter in steel, 1.5 in cast iron and brass, 2 in aluminium: common practice, no source.',
  ],
  fromSpec: (document) => casesByThread(document, (group) => ({ thread: group.thread.value })),
  answer: (read, options) => {
    const request: ThreadStackRequest = {
      thread: read.text('thread'),
      boltLength: read.quantity('boltLength'),
      grip: read.quantity('grip'),
      washers: read.quantityIf('washers'),
      into: intoOf(read),
    };
    const answer = threadStack(request);
    return {
      parts: [
        { kind: 'judgement', verdict: answer.verdict, reason: answer.reason },
        {
          kind: 'drawing',
          caption: 'Bolt, joint and thread, cut along the bolt',
          drawing: drawThreadStack({ request, answer }, options),
        },
        { kind: 'facts', heading: 'Lengths', facts: factsOf(answer) },
      ],
      assumed: answer.assumed,
      cautions:
        answer.verdict === 'fail'
          ? ['A bolt that bottoms, or holds by a few threads, feels tight and clamps nothing.']
          : [],
    };
  },
});

function intoOf(read: CaseReader): ThreadStackRequest['into'] {
  const into = read.choice<'nut' | TappedMaterial>('into');
  if (into === 'nut') {
    return { nutHeight: read.quantityIf('nutHeight'), leastPitches: read.numberIf('leastPitches') };
  }
  return {
    material: into,
    threadDepth: read.quantity('threadDepth'),
    holeDepth: read.quantityIf('holeDepth'),
  };
}

function factsOf(answer: ThreadStack): readonly { readonly name: string; readonly value: string }[] {
  const { protrusion, spare, engagement, engagementInDiameters, lengthNeeded } = answer;
  return [
    ...(protrusion === undefined
      ? []
      : [
          {
            name: 'Past the nut',
            value: `${printLength(protrusion.length)}, ${printNumber(protrusion.pitches, 1)} pitches`,
          },
        ]),
    {
      name: 'Engaged',
      value: `${printLength(engagement)}, ${printNumber(engagementInDiameters, 2)} × the diameter`,
    },
    ...(spare === undefined ? [] : [spareFact(spare)]),
    { name: 'Bolt needed, at least', value: printLength(lengthNeeded) },
  ];
}

const spareFact = (spare: Quantity): { readonly name: string; readonly value: string } =>
  spare.value < 0
    ? { name: 'Bolt past the full thread', value: printLength({ ...spare, value: -spare.value }) }
    : { name: 'Thread left below the bolt', value: printLength(spare) };
