import { beltLength } from '../../belt-drive/belt-length.js';
import { drawBeltSide } from '../../drawing/belt-side.js';
import { printNumber, printQuantity } from '../../quantities/print.js';
import { defineWorking } from '../define-working.js';
import { beltCase, pulleyErrors, pulleySection, pulleysOf } from './pulley-fields.js';

/** Length, ratio and wrap of an open belt. */
export const beltLengthWorking = defineWorking({
  key: 'belt-length',
  group: 'belt-drive',
  title: 'Belt length',
  asks: 'How long a belt goes round these two pulleys, and how fast does the driven one turn?',
  sections: [
    pulleySection,
    {
      heading: 'Speed',
      fields: [
        {
          kind: 'number',
          name: 'speed',
          label: 'Speed of the driver',
          counts: 'rev/min',
          optional: 'only the ratio is given',
        },
      ],
    },
  ],
  example: {
    typed: { driverDiameter: '1.6 m', drivenDiameter: '0.5 m', centres: '12 m' },
    from: 'textbook problem: pulleys of 1.6 m and 0.5 m, 12 m apart, 27.32 m of belt',
  },
  fromSpec: (document) => beltCase(document),
  basis: [
    '2·√(C² − ((D − d)/2)²) + π/2·(D + d) + α·(D − d), sin α = (D − d)/2C: the exact length of an open belt.',
    'Driven speed over driver speed: driver diameter over driven diameter.',
  ],
  fieldOf: pulleyErrors,
  answer: (read, options) => {
    const request = pulleysOf(read);
    const answer = beltLength(request);
    const speed = read.numberIf('speed');
    return {
      parts: [
        {
          kind: 'facts',
          facts: [
            { name: 'Length of the belt', value: printQuantity(answer.length), note: 'along its cords' },
            {
              name: 'Driven pulley turns',
              value: `${printNumber(answer.ratio, 3)} times as fast`,
              ...(speed === undefined ? {} : { note: `${printNumber(speed * answer.ratio, 0)} rev/min` }),
            },
            { name: 'Belt lies on the driver', value: `${printNumber(answer.wrap.driver, 1)}°` },
            { name: 'Belt lies on the driven pulley', value: `${printNumber(answer.wrap.driven, 1)}°` },
          ],
        },
        {
          kind: 'drawing',
          caption: 'From the side, to scale',
          drawing: drawBeltSide({ request, answer }, options),
        },
      ],
      assumed: [
        'An open belt over two pulleys: one crossed, or over three, is longer.',
        'The diameters are those on which the belt’s cords run; with outside diameters the belt worked out is too long.',
        'The belt neither slips nor stretches.',
      ],
    };
  },
});
