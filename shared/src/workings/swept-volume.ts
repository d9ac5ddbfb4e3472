import { sweptVolume } from '../measuring/swept-volume.js';
import { printNumber } from '../quantities/print.js';
import { defineWorking, type WorkedOut } from './define-working.js';
import { typed } from './fastening/figures.js';
import { printVolume } from './measuring/volumes.js';

/** What an engine's pistons sweep. */
export const sweptVolumeWorking = defineWorking({
  key: 'swept-volume',
  group: 'measuring',
  title: 'Swept volume',
  asks: 'How much do the pistons sweep?',
  sections: [
    {
      heading: 'The engine',
      fields: [
        { kind: 'quantity', name: 'bore', label: 'Bore', of: 'length', unit: 'mm' },
        { kind: 'quantity', name: 'stroke', label: 'Stroke', of: 'length', unit: 'mm' },
        { kind: 'number', name: 'cylinders', label: 'Cylinders', counts: 'cylinders' },
        {
          kind: 'quantity',
          name: 'clearanceVolume',
          label: 'Volume above the piston at TDC',
          of: 'volume',
          unit: 'cm3',
          optional: 'no compression ratio is worked out',
        },
      ],
    },
  ],
  example: {
    typed: { bore: '65.5 mm', stroke: '44.5 mm', cylinders: '4' },
    from: '599.78 cm³ for 65.5 × 44.5 mm and four cylinders: a training page on motorcycle engines',
  },
  basis: ['π/4·bore²·stroke for each cylinder; ratio = (swept + clearance)/clearance. By definition.'],
  fieldOf: [[/^(bore|stroke|cylinders|clearanceVolume)/, '$1']],
  fromSpec: ({ engine }) => [
    {
      name: engine.name.value,
      typed: {
        bore: typed(engine.bore.value),
        stroke: typed(engine.stroke.value),
        cylinders: String(engine.cylinders.value),
      },
    },
  ],
  answer: (read): WorkedOut => {
    const answer = sweptVolume({
      bore: read.quantity('bore'),
      stroke: read.quantity('stroke'),
      cylinders: read.number('cylinders'),
      clearanceVolume: read.quantityIf('clearanceVolume'),
    });
    const ratio = answer.compressionRatio;
    return {
      parts: [
        {
          kind: 'facts',
          facts: [
            { name: 'Each cylinder', value: printVolume(answer.each) },
            { name: 'Together', value: printVolume(answer.total) },
            ...(ratio === undefined
              ? []
              : [{ name: 'Compression ratio', value: `${printNumber(ratio, 2)} to 1` }]),
          ],
        },
      ],
      assumed: ['The crank’s middle is in line with the bore: an offset lengthens the travel a little.'],
    };
  },
});
