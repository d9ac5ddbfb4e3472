import type { Quantity } from '../contracts/quantity.js';
import { agreementPossible } from '../measuring/agreement-possible.js';
import { limitDecision } from '../measuring/limit-decision.js';
import { twoReadings } from '../measuring/two-readings.js';
import { parseQuantity } from '../quantities/parse.js';
import { printNumber } from '../quantities/print.js';
import { defineWorking, type WorkedOut } from './define-working.js';
import { anyFigure } from './measuring/fields.js';
import { bandPart, figureIf } from './measuring/figures.js';
import { casesOfMeasurements } from './measuring/from-spec.js';
import type { AnswerPart } from './working.js';

/** Whether a second person's reading agrees with the first. */
export const twoReadingsWorking = defineWorking({
  key: 'two-readings',
  group: 'measuring',
  title: 'Two people’s readings',
  asks: 'Do two people’s readings of one thing agree, each with a tool of their own?',
  sections: [
    {
      heading: 'First reading',
      fields: [
        anyFigure('first', 'First reading with its unit', { hint: '0.045 mm, 1.8 thou, 55 N·m' }),
        anyFigure('firstOut', 'First tool may be out by', { hint: 'either way (k = 2)' }),
      ],
    },
    {
      heading: 'Second reading',
      fields: [
        anyFigure('second', 'Second reading', { hint: 'without a unit it is that of the first' }),
        anyFigure('secondOut', 'Second tool may be out by'),
      ],
    },
    {
      heading: 'The limits',
      fields: [
        anyFigure('low', 'Least', { optional: 'no least' }),
        anyFigure('high', 'Most', { optional: 'no most' }),
      ],
    },
  ],
  example: {
    typed: { first: '27 lbf·ft', firstOut: '1.08', second: '28.1', secondOut: '1.124' },
    from: 'En as ISO 13528 has it, 27.0 and 28.1 lbf·ft, each ± 4 %: En = −0.71',
  },
  basis: ['En = (x₁ − x₂)/√(U₁² + U₂²); up to 1 either way agrees: ISO 13528, En score.'],
  fieldOf: [
    [/^(first|second)\.uncertainty/, '$1Out'],
    [/^(first|second|low|high)\b/, '$1'],
  ],
  fromSpec: (document) => casesOfMeasurements(document, ({ critical }) => critical),
  answer: (read, options): WorkedOut => {
    const first = parseQuantity(read.text('first'), undefined, 'first');
    const typed = (name: string): Quantity => parseQuantity(read.text(name), first.unit, name);
    const [firstOut, second, secondOut] = [typed('firstOut'), typed('second'), typed('secondOut')];
    const limits = { low: figureIf(read, 'low', first.unit), high: figureIf(read, 'high', first.unit) };
    const { verdict, reason, en } = twoReadings({
      first: { value: first, uncertainty: firstOut },
      second: { value: second, uncertainty: secondOut },
    });
    const readings = [
      { value: first, uncertainty: firstOut, label: 'first' },
      { value: second, uncertainty: secondOut, label: 'second' },
    ] as const;
    const hasLimits = limits.low !== undefined || limits.high !== undefined;
    const judged = readings.map((one) => ({
      ...one,
      ...limitDecision({ value: one.value, ...limits, uncertainty: one.uncertainty }),
    }));
    return {
      parts: [
        { kind: 'judgement', of: 'The two together', verdict, reason },
        ...(hasLimits ? judged.map(judgedPart) : []),
        {
          kind: 'facts',
          facts: [{ name: 'En', value: printNumber(en, 2), note: 'up to 1 either way agrees' }],
        },
        ...bandPart('Both readings, each with what its tool may be out', limits, readings, options),
      ],
      assumed: ['Each used a tool of their own, and did not know the other’s figure.'],
      cautions: hasLimits ? coarse(readings, limits) : [],
    };
  },
});

const judgedPart = ({
  label,
  verdict,
  reason,
}: {
  readonly label: 'first' | 'second';
  readonly verdict: Extract<AnswerPart, { kind: 'judgement' }>['verdict'];
  readonly reason: string;
}): AnswerPart => ({
  kind: 'judgement',
  of: `${label === 'first' ? 'First' : 'Second'} at its limits`,
  verdict,
  reason,
});

function coarse(
  readings: readonly { readonly uncertainty: Quantity; readonly label: string }[],
  { low, high }: { readonly low?: Quantity; readonly high?: Quantity },
): readonly string[] {
  return readings
    .filter(({ uncertainty }) => !agreementPossible(uncertainty, low, high))
    .map(
      ({ label }) =>
        `The ${label} tool is out by more than a quarter of the tolerance: with tools as coarse, that two readings agree says little.`,
    );
}
