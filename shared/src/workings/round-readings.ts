import type { RoundReadings, RoundReadingsRequest } from '../contracts/measuring.js';
import { drawRoundReadings } from '../drawing/round-readings.js';
import { roundReadings } from '../measuring/round-readings.js';
import { defineWorking, type WorkedOut } from './define-working.js';
import {
  limitFields,
  limitPaths,
  roundColumns,
  roundPaths,
  roundRows,
  uncertaintyField,
} from './measuring/fields.js';
import { limitsIf, printSize, roundOf } from './measuring/figures.js';
import { casesOfRounds } from './measuring/from-spec.js';
import type { CaseReader } from './read-case.js';
import { writeRows } from './rows.js';
import type { AnswerPart, WorkingCase } from './working.js';

const isShell = ({ part }: WorkingCase): boolean => part === 'shell';

/** Readings from the example's service manual: three heights on two axes. */
const exampleRows = ['top', 'middle', 'bottom'].flatMap((height, i) => [
  { height, axis: 'along', value: ['88.012 mm', '88.010 mm', '88.006 mm'][i] ?? '' },
  { height, axis: 'across', value: ['88.004 mm', '88.003 mm', '88.004 mm'][i] ?? '' },
]);

/** Size, ovality and taper of a bore, a journal or a bearing. */
export const roundReadingsWorking = defineWorking({
  key: 'round-readings',
  group: 'measuring',
  title: 'Bore, journal or bearing',
  asks: 'Is it in size, round and straight, from readings up and down it and across it?',
  sections: [
    {
      heading: 'What was measured',
      fields: [
        {
          kind: 'choice',
          name: 'part',
          label: 'It is',
          choices: [
            { value: 'bore', words: 'a bore' },
            { value: 'journal', words: 'a journal' },
            { value: 'shell', words: 'a bearing with its shells in' },
          ],
          starts: 'bore',
        },
        roundRows('readings', 'Readings'),
        {
          kind: 'text',
          name: 'splitAxis',
          label: 'Axis at the split',
          hint: 'as it is called in the readings',
          optional: 'not said; shells read on several axes are then not judged',
          when: isShell,
        },
        {
          kind: 'text',
          name: 'judgedAxis',
          label: 'Axis at 90° to the split',
          hint: 'then it alone is judged',
          optional: 'every axis but the one at the split',
          when: isShell,
        },
        {
          kind: 'choice',
          name: 'cap',
          label: 'The cap was',
          choices: [
            { value: 'torqued', words: 'torqued' },
            { value: 'slack', words: 'slack' },
          ],
          starts: 'torqued',
          when: isShell,
        },
        uncertaintyField('length', 'mm'),
      ],
    },
    {
      heading: 'The limits',
      fields: [
        ...limitFields({ of: 'length', unit: 'mm', low: 'Least size', high: 'Largest size' }),
        {
          kind: 'quantity',
          name: 'ovalityLimit',
          label: 'Most ovality',
          of: 'length',
          unit: 'mm',
          optional: 'ovality is not judged',
        },
        {
          kind: 'quantity',
          name: 'taperLimit',
          label: 'Most taper',
          of: 'length',
          unit: 'mm',
          optional: 'taper is not judged',
        },
      ],
    },
  ],
  example: {
    typed: {
      part: 'bore',
      readings: writeRows(exampleRows, roundColumns),
      ovalityLimit: '0.03 mm',
      taperLimit: '0.03 mm',
    },
    from: 'Roundness 0.008 mm and cylindricity 0.006 mm, limit 0.03 mm, of a bore: as a marine diesel’s service manual works them, page 198',
  },
  basis: [
    'Ovality: greatest difference between axes at one height. Taper: greatest difference between heights on one axis. As a marine diesel’s service manual has roundness and cylindricity.',
    'Ovality and taper each take two readings, and so √2 of what the tool may be out.',
  ],
  fieldOf: [
    ...roundPaths('readings', 'readings'),
    ...limitPaths,
    [/^(ovalityLimit|taperLimit|splitAxis|judgedAxis)/, '$1'],
    [/^of$/, 'part'],
  ],
  fromSpec: casesOfRounds,
  answer: (read, options): WorkedOut => {
    const request = requestOf(read);
    const answer = roundReadings(request);
    return {
      parts: [
        ...judgementsOf(answer),
        { kind: 'facts', heading: 'Worked out', facts: factsOf(answer) },
        {
          kind: 'drawing',
          caption: 'Along it and across it, differences drawn larger than they are',
          drawing: drawRoundReadings(request, answer, options),
        },
      ],
      assumed: [
        ...(request.uncertainty === undefined ? ['The tool is taken to be right.'] : []),
        'Part and tool were at one temperature, near 20 °C.',
      ],
      cautions: answer.cautions,
    };
  },
});

function requestOf(read: CaseReader): RoundReadingsRequest {
  const of = read.choice<RoundReadingsRequest['of']>('part');
  const optional = {
    splitAxis: read.textIf('splitAxis'),
    judgedAxis: read.textIf('judgedAxis'),
    ovalityLimit: read.quantityIf('ovalityLimit'),
    taperLimit: read.quantityIf('taperLimit'),
    uncertainty: read.quantityIf('uncertainty'),
  };
  return {
    of,
    readings: roundOf(read, 'readings'),
    ...limitsIf(read),
    ...optional,
    ...(of === 'shell' ? { capTorqued: read.choice('cap') === 'torqued' } : {}),
  };
}

/** Of several parts each by itself; its reason says which it is. */
function judgementsOf(answer: RoundReadings): readonly AnswerPart[] {
  const judgements = answer.parts.length > 1 ? answer.parts : [answer];
  return judgements.map(({ verdict, reason }) => ({ kind: 'judgement', verdict, reason }));
}

function factsOf(answer: RoundReadings): Extract<AnswerPart, { kind: 'facts' }>['facts'] {
  const { mean, least, most, ovality, taper, worstHeight, worstAxis } = answer;
  return [
    { name: 'Mean', value: printSize(mean) },
    { name: 'Least', value: printSize(least) },
    { name: 'Most', value: printSize(most) },
    { name: 'Ovality', value: ovality === null ? 'does not show' : printSize(ovality) },
    { name: 'Taper', value: taper === null ? 'does not show' : printSize(taper) },
    { name: 'Worst at', value: `${worstHeight}, ${worstAxis}` },
  ];
}
