import { printQuantity } from '../quantities/print.js';
import { shim } from '../valve-train/shim.js';
import { defineWorking } from './define-working.js';
import { limitsCases } from './engine/limits-cases.js';
import { spoken } from './wiring-map/spoken.js';
import type { QuantityField } from './working.js';

const length = (name: string, label: string, more: Partial<QuantityField> = {}): QuantityField => ({
  kind: 'quantity',
  of: 'length',
  unit: 'mm',
  name,
  label,
  ...more,
});

/** Which shim gives the clearance wanted. */
export const shimWorking = defineWorking({
  key: 'shim',
  group: 'valve-timing',
  title: 'Shim',
  asks: 'Which shim gives this valve its {clearance}?',
  sections: [
    {
      heading: 'The valve',
      fields: [
        length('fitted', 'Shim fitted'),
        length('measured', '{Clearance} measured with it'),
        length('low', 'Least {clearance} wanted'),
        length('high', 'Most {clearance} wanted'),
      ],
    },
    {
      heading: 'Shims at hand',
      fields: [
        {
          kind: 'rows',
          name: 'sizes',
          label: 'Shims at hand',
          optional: 'any thickness can be had',
          row: 'shim',
          columns: [length('size', 'Thickness')],
          least: 1,
          most: 100,
        },
      ],
    },
  ],
  example: {
    typed: {
      fitted: '2.50 mm',
      measured: '0.15 mm',
      low: '0.20 mm',
      high: '0.30 mm',
      sizes: '2.35 mm;2.40 mm;2.45 mm',
    },
    from: 'common practice, no printed source: 2.50 + 0.15 − 0.25 = 2.40 mm',
  },
  fromSpec: (document) => limitsCases(document, 'lash'),
  basis: [
    'Shim = shim fitted + {clearance} measured − middle of what is wanted: definition of the {clearance}.',
  ],
  fieldOf: [
    [/^wanted\.low/, 'low'],
    [/^wanted\.high/, 'high'],
    [/^value/, 'measured'],
    [/^sizes/, 'sizes'],
  ],
  answer: (read) => {
    const sizes = read.rows('sizes').map((row) => row.quantity('size'));
    const answer = shim({
      fitted: read.quantity('fitted'),
      measured: read.quantity('measured'),
      wanted: { low: read.quantity('low'), high: read.quantity('high') },
      ...(sizes.length === 0 ? {} : { sizes }),
    });
    const { choice } = answer;
    return {
      parts: [
        { kind: 'judgement', verdict: answer.verdict, reason: spoken(answer.reason) },
        {
          kind: 'facts',
          facts: [
            { name: 'Shim for the middle', value: printQuantity(answer.shim) },
            ...(choice === undefined
              ? []
              : [
                  { name: 'Nearest at hand', value: printQuantity(choice.shim) },
                  { name: 'It leaves', value: printQuantity(choice.lash) },
                ]),
          ],
        },
      ],
      assumed: [
        'A thicker shim leaves less {clearance}, by as much: there is no lever between shim and valve.',
        'The feeler read true: no uncertainty is taken.',
      ],
      cautions: [
        'Measure again after the engine has been turned over with the new shim in: oil under a shim falsifies the first reading.',
      ],
    };
  },
});
