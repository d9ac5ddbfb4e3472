import type { Kind, Unit } from '../../contracts/quantity.js';
import type { QuantityField, RowsField, TextField } from '../working.js';

interface LimitWords {
  readonly of: Kind;
  readonly unit: Unit;
  readonly low?: string;
  readonly high?: string;
}

/** Least and most, either of which may stay empty. */
export const limitFields = ({
  of,
  unit,
  low = 'Least',
  high = 'Most',
}: LimitWords): readonly QuantityField[] => [
  { kind: 'quantity', name: 'low', label: low, of, unit, optional: 'no least' },
  { kind: 'quantity', name: 'high', label: high, of, unit, optional: 'no most' },
];

/** The tool's expanded uncertainty. */
export const uncertaintyField = (of: Kind, unit: Unit): QuantityField => ({
  kind: 'quantity',
  name: 'uncertainty',
  label: 'The tool may be out by',
  hint: 'either way, from its certificate (k = 2)',
  of,
  unit,
  optional: 'nothing: the figure as read decides',
});

/** A figure of any kind, with its unit. */
export const anyFigure = (name: string, label: string, more: Partial<TextField> = {}): TextField => ({
  kind: 'text',
  name,
  label,
  figures: true,
  ...more,
});

/** Two-point readings by height and axis, each of which `optional` lets stay empty. */
export const roundRows = (name: string, label: string, optional?: string): RowsField => ({
  kind: 'rows',
  name,
  label,
  row: 'reading',
  least: 1,
  most: 60,
  columns: [
    {
      kind: 'text',
      name: 'height',
      label: 'Where along it',
      hint: 'top, middle, front',
      ...(optional && { optional }),
    },
    {
      kind: 'text',
      name: 'axis',
      label: 'Across which way',
      hint: 'along, across, at the split',
      ...(optional && { optional }),
    },
    { kind: 'quantity', name: 'value', label: 'Reading', of: 'length', unit: 'mm' },
  ],
});

export const roundColumns = ['height', 'axis', 'value'] as const;

/** Where an error of one of the readings' lists is said. */
export const roundPaths = (request: string, field: string): readonly (readonly [RegExp, string])[] => [
  [new RegExp(`^${request}\\[(\\d+)\\]\\.(height|axis|value)`), `${field}.$1.$2`],
  [new RegExp(`^${request}\\[(\\d+)\\]`), `${field}.$1.height`],
];

export const limitPaths: readonly (readonly [RegExp, string])[] = [
  [/^limits\.low/, 'low'],
  [/^limits\.high/, 'high'],
  [/^limits/, 'low'],
  [/^uncertainty/, 'uncertainty'],
];
