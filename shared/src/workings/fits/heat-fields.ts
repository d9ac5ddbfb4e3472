import { expandingMaterials, type ExpandingMaterial } from '../../contracts/fits.js';
import type { FieldSection, QuantityField, WorkingField } from '../working.js';

const materialWords: Record<ExpandingMaterial, string> = {
  steel: 'steel',
  'grey-iron': 'grey cast iron',
  'ductile-iron': 'ductile iron',
  aluminium: 'aluminium',
  bronze: 'bronze',
  brass: 'brass',
};

const materials = (part: 'hub' | 'shaft', label: string): readonly WorkingField[] => [
  {
    kind: 'choice',
    name: part,
    label,
    choices: [
      ...expandingMaterials.map((material) => ({ value: material, words: materialWords[material] })),
      { value: 'other', words: 'another, by its coefficient' },
    ],
    starts: 'steel',
  },
  {
    kind: 'number',
    name: `${part}Coefficient`,
    label: `Expansion of the ${part}`,
    hint: 'steel has 11.7',
    counts: 'millionths per kelvin',
    when: (typed) => typed[part] === 'other',
  },
];

const temperature = (name: string, label: string, more: Partial<QuantityField> = {}): QuantityField => ({
  kind: 'quantity',
  name,
  label,
  of: 'temperature',
  unit: '°C',
  ...more,
});

export const heatSections: readonly FieldSection[] = [
  {
    heading: 'The joint',
    fields: [
      { kind: 'quantity', name: 'diameter', label: 'Diameter', of: 'length', unit: 'mm' },
      { kind: 'quantity', name: 'interference', label: 'Most interference', of: 'length', unit: 'µm' },
      {
        kind: 'quantity',
        name: 'clearance',
        label: 'Clearance wanted while it goes together',
        optional: 'a thousandth of the diameter, which is easy by hand',
        of: 'length',
        unit: 'µm',
      },
      ...materials('hub', 'The outer part is of'),
      ...materials('shaft', 'The inner part is of'),
    ],
  },
  {
    heading: 'Heat and cold',
    fields: [
      {
        kind: 'choice',
        name: 'by',
        label: 'It is put together by',
        choices: [
          { value: 'heating-hub', words: 'heating the outer part' },
          { value: 'cooling-shaft', words: 'cooling the inner part' },
          { value: 'both', words: 'cooling the inner part, then heating the outer one' },
        ],
        starts: 'heating-hub',
      },
      temperature('room', 'The room is at', { optional: '20 °C' }),
      temperature('coldest', 'The inner part is cooled to', { when: ({ by }) => by === 'both' }),
      temperature('hottestAllowed', 'Hottest that the outer part and its neighbours stand', {
        optional: 'not judged',
        when: ({ by }) => by !== 'cooling-shaft',
      }),
      temperature('coldestAllowed', 'Coldest that the inner part stands', {
        optional: 'not judged',
        when: ({ by }) => by === 'cooling-shaft' || by === 'both',
      }),
    ],
  },
];
