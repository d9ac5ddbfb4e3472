import type { KeyForm } from '../../contracts/fits.js';
import type { Quantity } from '../../contracts/quantity.js';
import type { KeySpec } from '../../contracts/spec.js';
import { drawKeyway } from '../../drawing/keyway.js';
import { keyFit } from '../../fits/key-fit.js';
import { standardKeys } from '../../fits/standard-keys.js';
import { defineWorking } from '../define-working.js';
import type { AnswerPart, QuantityField } from '../working.js';
import { printedLength } from './printed-length.js';
import { typedMiddle } from './spec-limits.js';

const length = (name: string, label: string, more: Partial<QuantityField> = {}): QuantityField => ({
  kind: 'quantity',
  name,
  label,
  of: 'length',
  unit: 'mm',
  ...more,
});

/** A key in the slots of its shaft and hub. */
export const keyFitWorking = defineWorking({
  key: 'key-fit',
  group: 'fits-and-keys',
  title: 'Key in its keyway',
  asks: 'Does this key fit the slots of its shaft and its hub?',
  sections: [
    {
      heading: 'The key',
      fields: [
        {
          kind: 'choice',
          name: 'form',
          label: 'Form',
          choices: [
            { value: 'parallel', words: 'parallel' },
            { value: 'taper', words: 'taper' },
            { value: 'woodruff', words: 'half-moon' },
          ],
          starts: 'parallel',
        },
        length('width', 'Width of the key'),
        length('height', 'Height of the key', { hint: 'a half-moon key at its highest' }),
      ],
    },
    {
      heading: 'The shaft',
      fields: [
        length('shaftSlot', 'Width of the shaft’s slot'),
        length('shaftDepth', 'Depth of the shaft’s slot'),
        {
          kind: 'choice',
          name: 'depthFrom',
          label: 'That depth is from',
          choices: [
            { value: 'centre', words: 'the shaft’s top, at the slot’s centre line' },
            { value: 'edge', words: 'the slot’s edge' },
          ],
          starts: 'centre',
        },
        length('diameter', 'Diameter of the shaft', {
          optional: 'not needed for a depth at the centre line; no standard key is named',
        }),
      ],
    },
    {
      heading: 'The hub',
      fields: [
        length('hubSlot', 'Width of the hub’s slot'),
        length('hubDepth', 'Depth of the hub’s slot', {
          hint: 'from the top of the bore, at the centre line',
        }),
      ],
    },
  ],
  example: {
    typed: {
      width: '6 mm',
      height: '6 mm',
      shaftSlot: '6 mm',
      shaftDepth: '3.5 mm',
      diameter: '20 mm',
      hubSlot: '6 mm',
      hubDepth: '2.8 mm',
    },
    from: 'DIN 6885-1, 6 × 6 key on a 20 mm shaft: 0.3 mm free over the key',
  },
  fromSpec: ({ keys }) => keys.map((key) => ({ name: key.name, typed: typedKey(key) })),
  basis: [
    'Play: slot less key. Over the key: both depths less its height; a depth from the slot’s edge is short by R − √(R² − (b/2)²).',
    'Loosest: key h9 in H9 in the shaft and D10 in the hub, a taper key in D10 in both: DIN 6885-1 and 6886, ISO 286-2.',
    'Tightest: 0.045 mm as P9 slots are, 0.08 mm at the very most: ISO 286-2 and common practice.',
  ],
  fieldOf: [
    [/^key\.(width|height)/, '$1'],
    [/^shaftKeyway\.width/, 'shaftSlot'],
    [/^shaftKeyway\.depth/, 'shaftDepth'],
    [/^hubKeyway\.width/, 'hubSlot'],
    [/^hubKeyway\.depth/, 'hubDepth'],
    [/^shaftDiameter/, 'diameter'],
  ],
  answer: (read, options) => {
    const form = read.choice<KeyForm>('form');
    const shaftDiameter = read.quantityIf('diameter');
    const request = {
      key: { width: read.quantity('width'), height: read.quantity('height') },
      shaftKeyway: { width: read.quantity('shaftSlot'), depth: read.quantity('shaftDepth') },
      hubKeyway: { width: read.quantity('hubSlot'), depth: read.quantity('hubDepth') },
      form,
      depthFrom: read.choice<'centre' | 'edge'>('depthFrom'),
      ...(shaftDiameter === undefined ? {} : { shaftDiameter }),
    };
    const answer = keyFit(request);
    return {
      parts: [
        { kind: 'judgement', verdict: answer.verdict, reason: answer.reason },
        {
          kind: 'drawing',
          caption: 'Section across the shaft',
          drawing: drawKeyway({ request, answer }, options),
        },
        {
          kind: 'facts',
          facts: [
            { name: 'In the shaft', value: playWords(answer.play.shaft) },
            { name: 'In the hub', value: playWords(answer.play.hub) },
            { name: 'Over the key', value: printedLength(answer.play.top), note: topNote(form) },
          ],
        },
        ...standardParts(shaftDiameter),
      ],
      assumed: [
        'Slots and key are straight and square; the figures are single readings, and wear is seldom even.',
        'The hub’s depth is from the top of its bore, and the bore has the shaft’s size.',
      ],
      cautions: [
        'Wear eye protection where a key is driven: hard steel splinters. Where the maker gives sizes of key and slots, they come first.',
      ],
    };
  },
});

const topNote = (form: KeyForm): string =>
  form === 'taper' ? 'a taper key bears here: nothing may be free' : 'must be free';

function playWords({ value, unit }: Quantity): string {
  if (value === 0) return 'no play';
  return `${printedLength({ value: Math.abs(value), unit })} ${value < 0 ? 'tight' : 'of play'}`;
}

function standardParts(diameter: Quantity | undefined): readonly AnswerPart[] {
  const keys = diameter === undefined ? [] : standardKeys(diameter);
  if (keys.length === 0) return [];
  const depth = (quantity: Quantity | null): string =>
    quantity === null ? 'half the key, at the slot’s edge' : printedLength(quantity);
  return [
    {
      kind: 'table',
      heading: 'Standard parallel keys for this shaft',
      columns: [
        { name: 'Standard' },
        { name: 'Key', figures: true },
        { name: 'Deep in the shaft', figures: true },
        { name: 'Deep in the hub', figures: true },
      ],
      rows: keys.map(({ standard, width, height, shaftDepth, hubDepth }) => [
        standard,
        `${printedLength(width)} × ${printedLength(height)}`,
        depth(shaftDepth),
        hubDepth === null ? '–' : printedLength(hubDepth),
      ]),
    },
  ];
}

/** The middle of each pair of limits stands for the part until it is measured. */
function typedKey(key: KeySpec): Record<string, string> {
  return {
    width: typedMiddle(key.keyWidth.value),
    height: typedMiddle(key.keyHeight.value),
    shaftSlot: typedMiddle(key.shaftKeywayWidth.value),
    shaftDepth: typedMiddle(key.shaftKeywayDepth.value),
    depthFrom: 'centre',
    diameter: typedMiddle(key.shaftDiameter.value),
    hubSlot: typedMiddle(key.hubKeywayWidth.value),
    hubDepth: typedMiddle(key.hubKeywayDepth.value),
  };
}
