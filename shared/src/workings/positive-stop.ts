import { positiveStop } from '../valve-train/positive-stop.js';
import { defineWorking } from './define-working.js';
import { printAngle } from './engine/engine-words.js';

/** True TDC from the two places where a stop catches the piston. */
export const positiveStopWorking = defineWorking({
  key: 'positive-stop',
  group: 'valve-timing',
  title: 'TDC by a stop',
  asks: 'Where is true TDC, by a stop in the plug hole?',
  sections: [
    {
      heading: 'The degree wheel, counted 0° to 360° the way the crank turns',
      fields: [
        { kind: 'number', name: 'forward', label: 'At the stop, turned the normal way', counts: '°' },
        { kind: 'number', name: 'back', label: 'At the stop, turned back', counts: '°' },
      ],
    },
  ],
  example: {
    typed: { forward: '323.25', back: '35.25' },
    from: 'degree-wheel article: 36.75° before and 35.25° after, 36° each when right',
  },
  basis: [
    'TDC lies half way between the two stops: symmetry of the piston’s travel; common practice with a degree wheel.',
  ],
  answer: (read) => {
    const { tdc, correction, half } = positiveStop({
      forward: read.number('forward'),
      back: read.number('back'),
    });
    const move =
      correction === 0
        ? []
        : [
            `Move the pointer, or the wheel under it, until it shows 0° there: by ${printAngle(Math.abs(correction), 2)}.`,
          ];
    return {
      parts: [
        {
          kind: 'facts',
          facts: [
            { name: 'True TDC is where the wheel shows', value: printAngle(tdc, 2) },
            {
              name: 'Pointer to be moved by',
              value: printAngle(correction, 2),
              note: correction === 0 ? 'it is right' : 'added to what the wheel shows',
            },
            { name: 'The stop is from TDC', value: printAngle(half, 2), note: 'either side' },
          ],
        },
        {
          kind: 'steps',
          heading: 'To finish',
          steps: [
            `Take the stop out and turn the crank the normal way until the wheel shows ${printAngle(tdc, 2)}.`,
            ...move,
            `Check: with the stop in again the two readings must be ${printAngle(360 - half, 2)} and ${printAngle(half, 2)}.`,
          ],
        },
      ],
      assumed: [
        'The stop did not move between the two readings, and the crank was brought to it gently both times.',
      ],
      cautions: ['Turn by hand only, with the plugs out: a starter will break the stop or the piston.'],
    };
  },
});
