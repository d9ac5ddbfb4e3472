import { timingMarks } from '../ignition/timing-marks.js';
import { defineWorking } from './define-working.js';
import { printAngle, printLength } from './engine/engine-words.js';
import type { WorkingCase } from './working.js';

const byArc = ({ from }: WorkingCase): boolean => from === 'arc';

/** Where a timing mark goes on a pulley, or what angle a mark stands for. */
export const timingMarksWorking = defineWorking({
  key: 'timing-marks',
  group: 'wiring',
  title: 'Timing marks',
  asks: 'How far along the pulley’s rim is a mark for this many degrees?',
  sections: [
    {
      heading: 'The pulley or damper',
      fields: [
        {
          kind: 'quantity',
          of: 'length',
          unit: 'mm',
          name: 'diameter',
          label: 'Diameter where the marks are',
        },
        {
          kind: 'choice',
          name: 'from',
          label: 'What is known',
          choices: [
            { value: 'angle', words: 'the angle' },
            { value: 'arc', words: 'the distance along the rim' },
          ],
          starts: 'angle',
        },
        {
          kind: 'number',
          name: 'angle',
          label: 'Angle',
          counts: '°',
          hint: 'Degrees of crank from TDC',
          when: (typed) => !byArc(typed),
        },
        {
          kind: 'quantity',
          of: 'length',
          unit: 'mm',
          name: 'arc',
          label: 'Distance along the rim from TDC',
          when: byArc,
        },
      ],
    },
  ],
  example: {
    typed: { diameter: '6.6875 in', angle: '6' },
    from: 'worked example of damper marks: 0.3501 in',
  },
  fromSpec: ({ ignition }) => [
    { name: 'Static timing mark', typed: { angle: String(ignition.staticTiming.value) } },
  ],
  basis: ['Arc = π · diameter · angle ÷ 360: definition of the arc.'],
  answer: (read) => {
    const asked =
      read.choice('from') === 'arc' ? { arc: read.quantity('arc') } : { angle: read.number('angle') };
    const { angle, arc, arcPerDegree } = timingMarks({ diameter: read.quantity('diameter'), ...asked });
    return {
      parts: [
        {
          kind: 'facts',
          facts: [
            { name: 'Angle', value: printAngle(angle), note: 'of crank' },
            {
              name: 'Distance along the rim',
              value: printLength(arc),
              note: 'measured round it, not across',
            },
            { name: 'One degree', value: printLength(arcPerDegree, 1) },
          ],
        },
        {
          kind: 'steps',
          heading: 'How to set it out',
          steps: [
            'Find true TDC by a stop in the plug hole, not by the old mark: a damper’s ring can creep.',
            'Lay a strip of thin tape round the rim and mark the distance on it, against the way the crank turns for a mark before TDC.',
          ],
        },
      ],
      assumed: ['The diameter was measured where the marks are, and the rim is round.'],
    };
  },
});
