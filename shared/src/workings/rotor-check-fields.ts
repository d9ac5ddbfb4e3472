import { firingFields } from './engine/engine-fields.js';
import type { ChoiceField, FieldSection, WorkingCase } from './working.js';

const choice = (name: string, label: string, choices: ChoiceField['choices']): ChoiceField => ({
  kind: 'choice',
  name,
  label,
  choices,
  starts: choices[0]?.value ?? '',
});
const byPiston = ({ timing }: WorkingCase): boolean => timing === 'piston';
const turns: ChoiceField['choices'] = [
  { value: 'clockwise', words: 'clockwise' },
  { value: 'anticlockwise', words: '{anticlockwise}' },
];
const sides: ChoiceField['choices'] = [
  { value: 'cap', words: 'on the cap, from outside' },
  { value: 'drive', words: 'from the drive' },
];

/** What a rotor check asks for. */
export const rotorSections: readonly FieldSection[] = [
  {
    heading: 'The engine and its cap',
    fields: [
      ...firingFields,
      choice('turns', 'It turns', turns),
      choice('from', 'Seen', sides),
      choice('readOn', 'That was read from', [
        { value: 'rotor', words: 'the rotor itself' },
        { value: 'armature', words: 'a magneto’s stamp: its armature' },
      ]),
      {
        ...choice('geared', 'The rotor is geared to turn', [
          { value: 'other-way', words: 'the other way' },
          { value: 'same-way', words: 'the same way' },
        ]),
        when: ({ readOn }) => readOn === 'armature',
      },
      {
        kind: 'text',
        name: 'posts',
        label: 'Posts, degrees clockwise from the mark',
        hint: '45, 135, 225, 315',
        optional: 'evenly spaced, one at the mark',
        figures: true,
      },
      {
        kind: 'text',
        name: 'first',
        label: 'Post of the first cylinder',
        hint: 'Its angle, such as 45',
        optional: 'the first of the posts',
        figures: true,
      },
    ],
  },
  {
    heading: 'What was seen',
    fields: [
      choice('crankAt', 'The crank stands at', [
        { value: 'static-mark', words: 'the static timing mark' },
        { value: 'tdc', words: 'TDC' },
      ]),
      {
        kind: 'text',
        name: 'cylinder',
        label: 'Of cylinder',
        optional: 'the first of the order',
        figures: true,
      },
      {
        kind: 'number',
        name: 'rotor',
        label: 'The rotor points at',
        counts: '°',
        hint: 'Degrees clockwise from the mark',
        signed: true,
      },
      choice('rotorFrom', 'Seen', sides),
      choice('timing', 'The static timing is known as', [
        { value: 'degrees', words: 'degrees of crank' },
        { value: 'piston', words: 'travel of the piston' },
      ]),
      {
        kind: 'number',
        name: 'advance',
        label: 'Static timing, before TDC',
        counts: '°',
        signed: true,
        when: (typed) => !byPiston(typed),
      },
      {
        kind: 'quantity',
        of: 'length',
        unit: 'mm',
        name: 'piston',
        label: 'The piston is below its top by',
        when: byPiston,
      },
      { kind: 'quantity', of: 'length', unit: 'mm', name: 'stroke', label: 'Stroke', when: byPiston },
      {
        kind: 'quantity',
        of: 'length',
        unit: 'mm',
        name: 'rod',
        label: 'Rod length, centre to centre',
        when: byPiston,
      },
      {
        kind: 'number',
        name: 'tolerance',
        label: 'The rotor may be off by',
        counts: '°',
        hint: 'Degrees of distributor',
        optional: '5°, common practice',
      },
    ],
  },
];
