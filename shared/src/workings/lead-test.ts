import type { SpecDocument } from '../contracts/spec.js';
import { leadTest } from '../ignition/lead-test.js';
import { roundedLimits } from '../ignition/sound-lead.js';
import { printQuantity } from '../quantities/print.js';
import { defineWorking } from './define-working.js';
import type { CaseReader } from './read-case.js';
import { spoken } from './wiring-map/spoken.js';
import type { QuantityField, WorkingCase } from './working.js';

const isFigure = ({ shows = '' }: WorkingCase): boolean => shows === '' || shows === 'figure';
const ohms = { kind: 'quantity', of: 'resistance', unit: 'kΩ' } as const;

/** Whether an HT lead measures as it should. */
export const leadTestWorking = defineWorking({
  key: 'lead-test',
  group: 'wiring',
  title: '{Lead} test',
  asks: 'Is this {HT lead} sound, by what the ohmmeter shows?',
  sections: [
    {
      heading: 'The {lead}',
      fields: [
        {
          kind: 'choice',
          name: 'kind',
          label: 'Its core is',
          choices: [
            { value: 'resistive', words: 'resistive (carbon or wound)' },
            { value: 'wire-core', words: 'plain wire' },
          ],
          starts: 'resistive',
        },
        { kind: 'quantity', of: 'length', unit: 'mm', name: 'length', label: 'Length' },
        {
          kind: 'choice',
          name: 'shows',
          label: 'The ohmmeter shows',
          choices: [
            { value: 'figure', words: 'a figure' },
            { value: 'open', words: 'an open circuit' },
            { value: 'short', words: 'no resistance at all' },
          ],
          starts: 'figure',
        },
        {
          ...ohms,
          name: 'reading',
          label: 'Reading',
          when: isFigure,
        },
        {
          ...ohms,
          name: 'uncertainty',
          label: 'The meter may be off by',
          optional: 'nothing, the figure as read decides',
        },
        {
          kind: 'choice',
          name: 'disturbed',
          label: 'Pierced or clamped again since',
          choices: [
            { value: 'no', words: 'no' },
            { value: 'yes', words: 'yes' },
          ],
          starts: 'no',
        },
      ],
    },
    {
      heading: 'What the maker says',
      fields: (
        [
          { ...ohms, name: 'low', label: 'Least resistance for that length', optional: 'not known' },
          { ...ohms, name: 'high', label: 'Most resistance for that length', optional: 'not known' },
          {
            kind: 'quantity',
            of: 'length',
            unit: 'm',
            name: 'per',
            label: 'For each',
            hint: '1 ft, 1 m',
            optional: '1 m',
          },
          { ...ohms, name: 'wholeLow', label: 'Least for a whole {lead}', optional: 'none' },
          { ...ohms, name: 'wholeHigh', label: 'Most for a whole {lead}', optional: 'none' },
          { ...ohms, name: 'ends', label: 'Both end fittings together', optional: 'they have no resistance' },
        ] as const satisfies readonly QuantityField[]
      ).map((field) => ({ ...field, when: isFigure })),
    },
  ],
  example: {
    typed: {
      kind: 'resistive',
      length: '600 mm',
      reading: '15 kΩ',
      low: '7 kΩ',
      high: '10 kΩ',
      per: '1 ft',
      wholeHigh: '22 kΩ',
    },
    from: 'service data of 1991: about 7 to 10 kΩ a foot, not above 22 kΩ a lead',
  },
  fromSpec: (document) => [{ name: '{Leads} of the engine', typed: fromDocument(document) }],
  basis: [
    'Limits = maker’s resistance per length × length + end fittings, within the maker’s limits for a whole {lead}.',
    'A wire core at most 10 Ω where nothing else is known: common practice, no source.',
  ],
  fieldOf: [
    [/^nominal\.low/, 'low'],
    [/^nominal\.high/, 'high'],
    [/^nominal/, 'per'],
    [/^whole\.low/, 'wholeLow'],
    [/^whole/, 'wholeHigh'],
    [/^endFittings/, 'ends'],
    [/^(value|low|high)/, 'reading'],
  ],
  answer: (read) => {
    const { verdict, reason, limits, cautions, assumed } = leadTest(requestOf(read));
    return {
      parts: [
        { kind: 'judgement', verdict, reason: spoken(reason) },
        ...(limits === null
          ? []
          : [
              {
                kind: 'facts' as const,
                facts: [
                  { name: 'Least that is right', value: printQuantity(roundedLimits(limits).low) },
                  { name: 'Most that is right', value: printQuantity(roundedLimits(limits).high) },
                ],
              },
            ]),
      ],
      assumed: [
        ...assumed.map(spoken),
        ...(read.quantityIf('per') === undefined && read.quantityIf('high') !== undefined
          ? ['The maker’s figure is for each metre.']
          : []),
      ],
      cautions: cautions.map(spoken),
    };
  },
});

function requestOf(read: CaseReader): Parameters<typeof leadTest>[0] {
  const shows = read.choice<'figure' | 'open' | 'short'>('shows');
  const [low, high] = [read.quantityIf('low'), read.quantityIf('high')];
  const per = read.quantityIf('per') ?? { value: 1, unit: 'm' };
  const [wholeLow, wholeHigh] = [read.quantityIf('wholeLow'), read.quantityIf('wholeHigh')];
  const [ends, uncertainty] = [read.quantityIf('ends'), read.quantityIf('uncertainty')];
  return {
    reading: shows === 'figure' ? read.quantity('reading') : shows,
    kind: read.choice('kind'),
    length: read.quantity('length'),
    disturbed: read.choice('disturbed') === 'yes',
    ...(high === undefined ? {} : { nominal: { low: low ?? { value: 0, unit: high.unit }, high, per } }),
    ...(wholeHigh === undefined ? {} : { whole: { high: wholeHigh, ...(wholeLow && { low: wholeLow }) } }),
    ...(ends && { endFittings: ends }),
    ...(uncertainty && { uncertainty }),
  };
}

function fromDocument({ ignition }: SpecDocument): Record<string, string> {
  const { low, high } = ignition.leadResistance.value;
  return {
    kind: ignition.leadKind.value,
    ...(low === undefined ? {} : { wholeLow: printQuantity(low) }),
    ...(high === undefined ? {} : { wholeHigh: printQuantity(high) }),
  };
}
