import { units, type Kind } from '../contracts/quantity.js';
import { convertInterval, kindOf } from '../quantities/convert.js';
import { convertRequest } from '../quantities/convert-request.js';
import { parseQuantity } from '../quantities/parse.js';
import { printQuantity } from '../quantities/print.js';
import { defineWorking } from './define-working.js';

/** One figure in every unit of its kind. */
export const convertWorking = defineWorking({
  key: 'convert',
  group: 'convert',
  title: 'Convert a figure',
  asks: 'What is this figure in the other units?',
  sections: [
    {
      heading: 'The figure',
      fields: [
        {
          kind: 'text',
          name: 'figure',
          label: 'Figure with its unit',
          hint: '27 lbf·ft, 0.0015", 1.5 thou, 60 psi, 82 °C',
          figures: true,
        },
        {
          kind: 'choice',
          name: 'temperature',
          label: 'A temperature is',
          choices: [
            { value: 'shown', words: 'what a thermometer shows' },
            { value: 'difference', words: 'a difference between two' },
          ],
          starts: 'shown',
          when: ({ figure = '' }) => kindTyped(figure) === 'temperature',
        },
      ],
    },
  ],
  example: { typed: { figure: '27 lbf·ft' }, from: 'NIST SP 811 (2008), appendix B.8' },
  basis: ['Exact definitions of NIST SP 811 (2008), appendix B; nothing is rounded before it is printed.'],
  fieldOf: [[/^quantity/, 'figure']],
  answer: (read) => {
    const quantity = parseQuantity(read.text('figure'));
    const kind = kindOf(quantity.unit);
    const isDifference = kind === 'temperature' && read.choice('temperature') === 'difference';
    const facts = units[kind].map((unit) => {
      const answer = isDifference
        ? convertInterval(quantity, unit)
        : convertRequest({ quantity, to: unit }).quantity;
      return { name: unit, value: printQuantity(answer) };
    });
    return {
      parts: [{ kind: 'facts', heading: `The same ${kind}`, facts }],
      assumed: isDifference
        ? ['A difference of temperatures: the zero points of the scales do not count.']
        : [],
    };
  },
});

function kindTyped(figure: string): Kind | undefined {
  try {
    return kindOf(parseQuantity(figure).unit);
  } catch {
    return undefined;
  }
}
