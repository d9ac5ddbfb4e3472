import type { CellField, FieldSection, QuantityField } from '../working.js';

const size = (name: string, label: string, more: Partial<QuantityField> = {}): QuantityField => ({
  kind: 'quantity',
  name,
  label,
  of: 'length',
  unit: 'mm',
  ...more,
});
const unknown = { optional: 'not known: not judged' } as const;

export const dimensionColumns: readonly CellField[] = [
  { kind: 'text', name: 'dimension', label: 'Dimension', hint: 'bore, width of the slot' },
  size('originalLow', 'Original, least', unknown),
  size('originalHigh', 'Original, most', unknown),
  size('otherLow', 'Other, least', unknown),
  size('otherHigh', 'Other, most', unknown),
];

export const compareSections: readonly FieldSection[] = [
  {
    heading: 'The two parts',
    fields: [
      { kind: 'text', name: 'originalName', label: 'Part that it replaces' },
      { kind: 'text', name: 'otherName', label: 'Part at hand' },
      {
        kind: 'rows',
        name: 'dimensions',
        label: 'Dimensions',
        row: 'dimension',
        least: 1,
        most: 20,
        columns: dimensionColumns,
      },
    ],
  },
  {
    heading: 'What they fit with',
    fields: [
      {
        kind: 'rows',
        name: 'mates',
        label: 'Mates',
        hint: 'for each dimension whose play you know',
        row: 'mate',
        least: 0,
        most: 20,
        optional: 'the two parts are only held side by side',
        columns: [
          { kind: 'text', name: 'dimension', label: 'Dimension' },
          {
            kind: 'choice',
            name: 'is',
            label: 'The part is',
            choices: [
              { value: 'hole', words: 'the hole' },
              { value: 'shaft', words: 'the shaft' },
            ],
            starts: 'hole',
          },
          size('mateLow', 'Its mate, least'),
          size('mateHigh', 'Its mate, most'),
          size('playLow', 'Play wanted, least', { signed: true }),
          size('playHigh', 'Play wanted, most', { signed: true }),
        ],
      },
    ],
  },
];
