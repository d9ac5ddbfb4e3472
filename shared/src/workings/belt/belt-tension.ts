import type { BeltTensionRequest } from '../../contracts/belt-drive.js';
import type { BeltSpec } from '../../contracts/spec.js';
import { InputError } from '../../contracts/input-error.js';
import { beltLength } from '../../belt-drive/belt-length.js';
import { beltTension } from '../../belt-drive/belt-tension.js';
import { drawBeltSide } from '../../drawing/belt-side.js';
import { defineWorking } from '../define-working.js';
import { printedLength } from '../fits/printed-length.js';
import { typedLimits } from '../fits/spec-limits.js';
import type { CaseReader } from '../read-case.js';
import type { QuantityField } from '../working.js';
import { beltCase, pulleyErrors, pulleySection, pulleysOf } from './pulley-fields.js';

const length = (name: string, label: string, more: Partial<QuantityField>): QuantityField => ({
  kind: 'quantity',
  name,
  label,
  of: 'length',
  unit: 'mm',
  ...more,
});

/** How far a belt should give, and whether it does. */
export const beltTensionWorking = defineWorking({
  key: 'belt-tension',
  group: 'belt-drive',
  title: 'Belt tension',
  asks: 'How far should this belt give when it is pressed, and does it?',
  sections: [
    pulleySection,
    {
      heading: 'What it should give',
      fields: [
        {
          kind: 'choice',
          name: 'by',
          label: 'The manual says',
          choices: [
            { value: 'span', words: 'nothing, or so much for its length' },
            { value: 'limits', words: 'a least and a most' },
          ],
          starts: 'span',
        },
        {
          kind: 'number',
          name: 'share',
          label: 'Of its free length',
          counts: 'of its free length',
          hint: '1/64',
          optional: '1/64, a belt maker’s figure',
          when: ({ by }) => by !== 'limits',
        },
        {
          kind: 'number',
          name: 'tolerance',
          label: 'Either way',
          counts: '%',
          optional: '10 %, common practice',
          when: ({ by }) => by !== 'limits',
        },
        length('low', 'At least', { when: ({ by }) => by === 'limits' }),
        length('high', 'At most', { when: ({ by }) => by === 'limits' }),
      ],
    },
    {
      heading: 'What it gives',
      fields: [length('measured', 'Measured at the middle of its longest run', { optional: 'not judged' })],
    },
  ],
  example: {
    typed: { driverDiameter: '8 in', drivenDiameter: '4 in', centres: '16 in', measured: '0.25 in' },
    from: 'a belt maker’s technical section: 1/64 in for each inch of free length, √(16² − 2²) in long',
  },
  fromSpec: (document) => beltCase(document, deflectionOf),
  basis: [
    'Free length √(C² − ((D − d)/2)²); 1/64 of it (0.4 mm in 25 mm) under the force that the belt’s maker states: a belt maker’s technical section.',
  ],
  fieldOf: [
    ...pulleyErrors,
    [/^deflectionPerSpan/, 'share'],
    [/^limits\.(low|high)/, '$1'],
    [/^measured/, 'measured'],
  ],
  answer: (read, options) => {
    const request = requestOf(read);
    const answer = beltTension(request);
    return {
      parts: [
        { kind: 'judgement', verdict: answer.verdict, reason: answer.reason },
        {
          kind: 'facts',
          facts: [
            { name: 'Free length', value: printedLength(answer.freeSpan) },
            { name: 'It should give', value: printedLength(answer.deflection) },
          ],
        },
        {
          kind: 'drawing',
          caption: 'From the side, to scale',
          drawing: drawBeltSide(
            { request, answer: beltLength(request), deflection: request.measured ?? answer.deflection },
            options,
          ),
        },
      ],
      assumed: [...answer.assumed, 'A new belt settles: it is measured again after its first run.'],
      cautions: [
        'Engine stopped and the battery’s {earth} {lead} off. An electric fan can start by itself.',
        'The force belongs to the figure: take both from the maker of the belt or the engine.',
      ],
    };
  },
});

function requestOf(read: CaseReader): BeltTensionRequest {
  const measured = read.quantityIf('measured');
  const pulleys = pulleysOf(read);
  if (read.choice('by') === 'limits') {
    return { ...pulleys, measured, limits: { low: read.quantity('low'), high: read.quantity('high') } };
  }
  const percent = read.numberIf('tolerance');
  if (percent !== undefined && percent > 100) {
    throw new InputError('tolerance', 'This must be at most 100 %.');
  }
  return {
    ...pulleys,
    measured,
    deflectionPerSpan: read.numberIf('share'),
    tolerance: percent === undefined ? undefined : percent / 100,
  };
}

const deflectionOf = ({ deflection }: BeltSpec): Record<string, string> => {
  const { low, high } = deflection.value;
  return low === undefined || high === undefined
    ? {}
    : { by: 'limits', ...typedLimits(deflection.value, 'low', 'high') };
};
