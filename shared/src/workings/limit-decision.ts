import type { Quantity } from '../contracts/quantity.js';
import { limitDecision } from '../measuring/limit-decision.js';
import { convert, convertInterval } from '../quantities/convert.js';
import { parseQuantity } from '../quantities/parse.js';
import { printQuantity } from '../quantities/print.js';
import { roundTo } from '../quantities/round.js';
import { defineWorking, type WorkedOut } from './define-working.js';
import { anyFigure } from './measuring/fields.js';
import { bandPart, figureIf } from './measuring/figures.js';
import { casesOfMeasurements } from './measuring/from-spec.js';
import type { AnswerPart } from './working.js';

/** A reading at its limits, with what the tool may be out. */
export const limitDecisionWorking = defineWorking({
  key: 'limit-decision',
  group: 'measuring',
  title: 'Reading at its limits',
  asks: 'Is this reading good, with what the tool may be out?',
  sections: [
    {
      heading: 'The reading',
      fields: [
        anyFigure('value', 'Reading with its unit', { hint: '0.045 mm, 1.8 thou, 55 N·m, 60 psi' }),
        anyFigure('uncertainty', 'The tool may be out by', {
          hint: 'either way, from its certificate (k = 2)',
          optional: 'nothing: the figure as read decides',
        }),
      ],
    },
    {
      heading: 'The limits',
      fields: [
        anyFigure('low', 'Least', { optional: 'no least', hint: 'without a unit it is that of the reading' }),
        anyFigure('high', 'Most', { optional: 'no most' }),
      ],
    },
  ],
  example: {
    typed: { value: '10.8 mm', low: '9 mm', high: '11 mm', uncertainty: '0.2 mm' },
    from: '10 ± 1 with an uncertainty of 0.2 is good from 9.2 to 10.8: a note on guard bands, 2024',
  },
  basis: [
    'Good when inside every limit by the whole uncertainty, bad when beyond one by more, doubtful between: guard band w = U, ILAC-G8:09/2019, section 4.2 (from memory), with the same band beyond the limit.',
  ],
  fieldOf: [[/^(value|low|high|uncertainty)\b/, '$1']],
  fromSpec: (document) =>
    casesOfMeasurements(document, ({ limits }) => Object.values(limits.value).length > 0),
  answer: (read, options): WorkedOut => {
    const value = parseQuantity(read.text('value'), undefined, 'value');
    const [low, high] = [figureIf(read, 'low', value.unit), figureIf(read, 'high', value.unit)];
    const uncertainty = figureIf(read, 'uncertainty', value.unit);
    const { verdict, reason } = limitDecision({ value, low, high, uncertainty });
    return {
      parts: [
        { kind: 'judgement', verdict, reason },
        ...goodFrom(value, low, high, uncertainty),
        ...bandPart(
          'The reading on its band; the hatched zone is where it does not pass for certain',
          { low, high },
          [{ value, uncertainty, label: 'reading' }],
          options,
        ),
      ],
      assumed: [
        ...(uncertainty === undefined ? ['The tool is taken to be right.'] : []),
        'The limits themselves are good.',
      ],
    };
  },
});

/** What the tool leaves of the band. */
function goodFrom(
  { unit }: Quantity,
  low: Quantity | undefined,
  high: Quantity | undefined,
  uncertainty: Quantity | undefined,
): readonly AnswerPart[] {
  const half = uncertainty === undefined ? 0 : convertInterval(uncertainty, unit).value;
  const at = (limit: Quantity | undefined, step: number): string | undefined =>
    limit && printQuantity({ value: roundTo(convert(limit, unit).value + step, 9), unit });
  const [least, most] = [at(low, half), at(high, -half)];
  const facts = [
    ...(least === undefined ? [] : [{ name: 'Good from', value: least }]),
    ...(most === undefined ? [] : [{ name: least === undefined ? 'Good up to' : 'to', value: most }]),
  ];
  const [l, h] = [low, high].map((limit) => limit && convert(limit, unit).value);
  const isShut = l !== undefined && h !== undefined && h - l < 2 * half * (1 - 1e-12);
  if (facts.length === 0 || isShut) return [];
  return [{ kind: 'facts', heading: 'With this tool', facts }];
}
