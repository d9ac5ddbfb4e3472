import type { SpecDocument } from '../contracts/spec.js';
import { printNumber, printQuantity } from '../quantities/print.js';
import { pistonHeight } from '../valve-train/piston-position.js';
import { defineWorking } from './define-working.js';
import { printAngle, printLength } from './engine/engine-words.js';
import type { WorkingCase } from './working.js';

const byHeight = ({ from }: WorkingCase): boolean => from === 'height';

/** How far a piston is below its top at a crank angle, or the other way round. */
export const pistonHeightWorking = defineWorking({
  key: 'piston-height',
  group: 'valve-timing',
  title: 'Piston height',
  asks: 'How far below its top is the piston at this crank angle, or at which angle is it there?',
  sections: [
    {
      heading: 'The crank',
      fields: [
        { kind: 'quantity', of: 'length', unit: 'mm', name: 'stroke', label: 'Stroke' },
        { kind: 'quantity', of: 'length', unit: 'mm', name: 'rod', label: 'Rod length, centre to centre' },
        {
          kind: 'choice',
          name: 'from',
          label: 'What is known',
          choices: [
            { value: 'angle', words: 'the crank angle' },
            { value: 'height', words: 'how far down the piston is' },
          ],
          starts: 'angle',
        },
        {
          kind: 'number',
          name: 'crank',
          label: 'Crank, before or after TDC',
          counts: '°',
          signed: true,
          when: (typed) => !byHeight(typed),
        },
        {
          kind: 'quantity',
          of: 'length',
          unit: 'mm',
          name: 'down',
          label: 'The piston is below its top by',
          when: byHeight,
        },
        {
          kind: 'number',
          name: 'speed',
          label: 'Crank speed',
          counts: 'rev/min',
          optional: 'no speeds are given',
        },
      ],
    },
  ],
  example: {
    typed: { stroke: '3.307 in', rod: '6.024 in', crank: '0', speed: '6000' },
    from: 'worked example of piston motion: pin height 7.68 in at TDC, greatest speed 1078 in/s',
  },
  fromSpec: (document) => [{ name: 'At the static timing', typed: fromDocument(document) }],
  basis: [
    'Pin height = r cos θ + √(l² − r² sin² θ), r half the stroke, l the rod: piston motion equations of any text on engine kinematics.',
    'Mean speed = 2 × stroke × revolutions; the greatest is where the acceleration is nothing.',
  ],
  fieldOf: [
    [/^rodLength/, 'rod'],
    [/^fromTop/, 'down'],
    [/^crankSpeed/, 'speed'],
  ],
  answer: (read) => {
    const speed = read.numberIf('speed');
    const known =
      read.choice('from') === 'height' ? { fromTop: read.quantity('down') } : { crank: read.number('crank') };
    const answer = pistonHeight({
      stroke: read.quantity('stroke'),
      rodLength: read.quantity('rod'),
      ...known,
      ...(speed === undefined ? {} : { crankSpeed: speed }),
    });
    const { meanSpeed, greatestSpeed, greatestSpeedAt } = answer;
    return {
      parts: [
        {
          kind: 'facts',
          facts: [
            {
              name: 'Crank',
              value: `${printNumber(answer.crank, 2)}°`,
              note: 'from TDC, the same before and after',
            },
            { name: 'Piston below its top', value: printLength(answer.fromTop, 1) },
            {
              name: 'Pin height',
              value: printLength(answer.pinHeight, 1),
              note: 'from the crank’s centre to the {gudgeon pin}’s',
            },
          ],
        },
        ...(meanSpeed === undefined || greatestSpeed === undefined
          ? []
          : [
              {
                kind: 'facts' as const,
                heading: 'Speed of the piston',
                facts: [
                  { name: 'Mean', value: `${printNumber(meanSpeed, 2)}\u2009m/s` },
                  {
                    name: 'Greatest',
                    value: `${printNumber(greatestSpeed, 2)}\u2009m/s`,
                    note: `at ${printAngle(greatestSpeedAt)} from TDC`,
                  },
                ],
              },
            ]),
      ],
      assumed: [
        'The cylinder is in line with the crank: no offset of bore or {gudgeon pin}.',
        'Nothing stretches and nothing has play.',
      ],
    };
  },
});

function fromDocument({ engine, ignition }: SpecDocument): Record<string, string> {
  return {
    stroke: printQuantity(engine.stroke.value),
    rod: printQuantity(engine.rodLength.value),
    crank: String(ignition.staticTiming.value),
  };
}
