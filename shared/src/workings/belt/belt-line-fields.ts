import type { FieldSection, QuantityField, WorkingCase, WorkingField } from '../working.js';

const length = (name: string, label: string, more: Partial<QuantityField> = {}): QuantityField => ({
  kind: 'quantity',
  name,
  label,
  of: 'length',
  unit: 'mm',
  ...more,
});

/** The four rims in the order in which they are measured along the straight edge. */
export const rims = ['driverFar', 'driverNear', 'drivenNear', 'drivenFar'] as const;
const rimWords: Record<(typeof rims)[number], string> = {
  driverFar: 'driver, far rim',
  driverNear: 'driver, near rim',
  drivenNear: 'driven, near rim',
  drivenFar: 'driven, far rim',
};

/** What the driver and the driven pulleys are called while nobody names them. */
export const usualNames = ['crank pulley', 'driven pulley', 'second driven pulley'] as const;

const isThree = ({ pulleys }: WorkingCase): boolean => pulleys === 'three';

/** The fields of the first or second driven pulley, whose names end in 1 or 2. */
function drivenSection(n: 1 | 2): FieldSection {
  const there = n === 1 ? () => true : isThree;
  const turned = (typed: WorkingCase): boolean => there(typed) && typed[`sets${n}`] === 'two';
  const gaps = (
    prefix: string,
    words: string,
    when: (typed: WorkingCase) => boolean,
  ): readonly WorkingField[] =>
    rims.map((rim) =>
      length(`${prefix}${n}${rim}`, `${words}, ${rimWords[rim]}`, {
        signed: true,
        when,
        ...(rim === 'driverFar'
          ? { hint: 'from the straight edge back to the rim; minus where the rim stands in front of it' }
          : {}),
      }),
    );
  const optional = (name: string, label: string, words: string): QuantityField =>
    length(`${name}${n}`, label, { optional: words, when: there });
  return {
    heading: n === 1 ? 'The driven pulley' : 'The second driven pulley',
    fields: [
      { kind: 'text', name: `name${n}`, label: 'What it is', optional: usualNames[n], when: there },
      length(`diameter${n}`, 'Its diameter over the rims', { when: there }),
      length(`span${n}`, 'Between its centre and the driver’s', { when: there }),
      ...gaps('gap', 'Gap', there),
      {
        kind: 'choice',
        name: `sets${n}`,
        label: 'Measured again with both turned a quarter',
        choices: [
          { value: 'one', words: 'no' },
          { value: 'two', words: 'yes' },
        ],
        starts: 'one',
        when: there,
      },
      ...gaps('turned', 'A quarter on', turned),
      optional('groove', 'From its rim to the middle of its groove', 'the rims are taken for the grooves'),
      optional('shim', 'One shim behind it is', 'no shims are counted'),
      optional('front', 'Free room in front of it', 'not asked whether it clears'),
      optional('behind', 'Free room behind it', 'not asked whether it clears'),
    ],
  };
}

export const beltLineSections: readonly FieldSection[] = [
  {
    heading: 'The driver',
    fields: [
      { kind: 'text', name: 'driver', label: 'What drives', optional: usualNames[0] },
      length('driverDiameter', 'Diameter of the driver over the rims'),
      length('driverGroove', 'From the driver’s rim to the middle of its groove', {
        optional: 'the rims are taken for the grooves',
      }),
      {
        kind: 'choice',
        name: 'pulleys',
        label: 'The belt runs over',
        choices: [
          { value: 'two', words: 'two pulleys' },
          { value: 'three', words: 'three pulleys' },
        ],
        starts: 'two',
      },
    ],
  },
  drivenSection(1),
  drivenSection(2),
  {
    heading: 'What is allowed',
    fields: [
      {
        kind: 'number',
        name: 'angleLimit',
        label: 'Most that they may be turned to each other',
        counts: '°',
        optional: '0.5°, usual for V-belts',
      },
      length('offsetLimit', 'Most that they may be out of one plane', {
        optional: '0.87 mm for each 100 mm of span, usual for V-belts',
        hint: 'over the first driven pulley’s span',
      }),
    ],
  },
];
