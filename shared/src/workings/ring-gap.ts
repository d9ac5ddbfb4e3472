import type { RingGapRequest } from '../contracts/measuring.js';
import type { SpecDocument } from '../contracts/spec.js';
import { ringGap } from '../measuring/ring-gap.js';
import { defineWorking, type WorkedOut } from './define-working.js';
import { typed } from './fastening/figures.js';
import { limitFields, limitPaths, uncertaintyField } from './measuring/fields.js';
import { bandPart, limitsIf, printSize } from './measuring/figures.js';
import { casesOfMeasurements } from './measuring/from-spec.js';
import type { CaseReader } from './read-case.js';

const byBore = ({ by = 'limits' }: Readonly<Record<string, string>>): boolean => by === 'bore';

/** A piston ring's end gap, cold by its limits and hot by what it closes. */
export const ringGapWorking = defineWorking({
  key: 'ring-gap',
  group: 'measuring',
  title: 'Ring gap',
  asks: 'Is the gap between the ring’s ends wide enough, and does it close when hot?',
  sections: [
    {
      heading: 'The ring in its bore',
      fields: [
        { kind: 'quantity', name: 'bore', label: 'Bore', of: 'length', unit: 'mm' },
        { kind: 'quantity', name: 'gap', label: 'Gap measured', of: 'length', unit: 'mm' },
        uncertaintyField('length', 'mm'),
      ],
    },
    {
      heading: 'What it should be',
      fields: [
        {
          kind: 'choice',
          name: 'by',
          label: 'The maker states',
          choices: [
            { value: 'limits', words: 'limits' },
            { value: 'bore', words: 'so much for each inch or mm of bore' },
          ],
          starts: 'limits',
        },
        ...limitFields({ of: 'length', unit: 'mm', low: 'Least gap', high: 'Most gap' }).map((field) => ({
          ...field,
          when: (typed: Readonly<Record<string, string>>) => !byBore(typed),
        })),
        {
          kind: 'number',
          name: 'perLow',
          label: 'At least',
          hint: '0.0045 is 0.0045 in for each inch',
          counts: 'of the bore',
          when: byBore,
        },
        {
          kind: 'number',
          name: 'perHigh',
          label: 'At most',
          counts: 'of the bore',
          optional: 'no most',
          when: byBore,
        },
      ],
    },
    {
      heading: 'Hot',
      fields: [
        {
          kind: 'quantity',
          name: 'hotter',
          label: 'The ring runs hotter than the bore by',
          hint: 'a difference of temperatures',
          of: 'temperature',
          unit: '°C',
          interval: true,
          optional: 'not known: closing when hot is left out',
        },
        {
          kind: 'number',
          name: 'coefficient',
          label: 'The ring grows by',
          counts: '10⁻⁶ for each °C',
          optional: '11.4, grey iron',
        },
      ],
    },
  ],
  example: {
    typed: { bore: '4.030 in', gap: '0.019 in', by: 'bore', perLow: '0.0045', perHigh: '0.0050' },
    from: '0.0181 to 0.0202 in for a bore of 4.030 in: a trade magazine, January 2019, page 63',
  },
  basis: [
    'Gap = bore × the maker’s figure: a trade magazine, January 2019, page 63.',
    'Hot it closes by π·D·α·ΔT: linear expansion; α of grey iron from a handbook’s table.',
  ],
  fieldOf: [
    ...limitPaths,
    [/^perBore\.high/, 'perHigh'],
    [/^perBore/, 'perLow'],
    [/^ringHotterBy/, 'hotter'],
    [/^(bore|gap|coefficient)/, '$1'],
  ],
  fromSpec: ringCases,
  answer: (read, options): WorkedOut => {
    const request = requestOf(read);
    const { verdict, reason, wanted, closesBy, assumed } = ringGap(request);
    const facts = [
      ...(wanted.low === undefined ? [] : [{ name: 'Least gap', value: printSize(wanted.low) }]),
      ...(wanted.high === undefined ? [] : [{ name: 'Most gap', value: printSize(wanted.high) }]),
      ...(closesBy === null ? [] : [{ name: 'Closes when hot by', value: printSize(closesBy) }]),
    ];
    return {
      parts: [
        { kind: 'judgement', verdict, reason },
        ...(facts.length === 0 ? [] : [{ kind: 'facts', facts } as const]),
        ...bandPart(
          'The gap on its band',
          wanted,
          [{ value: request.gap, uncertainty: request.uncertainty, label: 'gap' }],
          options,
        ),
      ],
      assumed,
      cautions: ['Fuel, boost and piston change the gap that is right: the ring maker’s sheet comes first.'],
    };
  },
});

function requestOf(read: CaseReader): RingGapRequest {
  const perLow = read.numberIf('perLow');
  return {
    bore: read.quantity('bore'),
    gap: read.quantity('gap'),
    ...(perLow === undefined ? limitsIf(read) : { perBore: { low: perLow, high: read.numberIf('perHigh') } }),
    ringHotterBy: read.quantityIf('hotter'),
    coefficient: read.numberIf('coefficient'),
    uncertainty: read.quantityIf('uncertainty'),
  };
}

function ringCases(document: SpecDocument): ReturnType<typeof casesOfMeasurements> {
  const bore = typed(document.engine.bore.value);
  const isGap = ({ place, name }: { place: string; name: string }): boolean =>
    place === 'rings' && /gap/i.test(name);
  return casesOfMeasurements(document, isGap, () => ({ bore }));
}
