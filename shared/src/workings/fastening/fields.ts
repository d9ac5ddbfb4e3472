import type { ChoiceField, QuantityField, TextField } from '../working.js';

export const threadField: TextField = {
  kind: 'text',
  name: 'thread',
  label: 'Thread',
  hint: 'M10x1.5, M8, 3/8-16 UNC, 7/16 UNF, 5/16 BSF, 1/4 BSW',
  figures: true,
};

export const torqueField: QuantityField = {
  kind: 'quantity',
  name: 'torque',
  label: 'Torque',
  of: 'torque',
  unit: 'N·m',
};

/** How far below and above a torque a reading may be. */
export const toleranceFields = (below: string, above: string): readonly QuantityField[] => [
  {
    kind: 'quantity',
    name: 'below',
    label: 'May be less by',
    optional: below,
    of: 'torque',
    unit: 'N·m',
  },
  {
    kind: 'quantity',
    name: 'above',
    label: 'May be more by',
    optional: above,
    of: 'torque',
    unit: 'N·m',
  },
];

export const tappedChoices = [
  { value: 'steel', words: 'a tapped hole in steel' },
  { value: 'cast-iron', words: 'a tapped hole in cast iron' },
  { value: 'aluminium', words: 'a tapped hole in aluminium' },
  { value: 'brass', words: 'a tapped hole in brass' },
] as const;

export const intoField: ChoiceField = {
  kind: 'choice',
  name: 'into',
  label: 'It goes into',
  choices: [{ value: 'nut', words: 'a nut' }, ...tappedChoices],
  starts: 'nut',
};

export const isTapped = ({ into = 'nut' }: Readonly<Record<string, string>>): boolean =>
  into !== 'nut' && into !== '';
