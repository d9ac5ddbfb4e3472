import { compressionRatio } from '../measuring/compression-ratio.js';
import { printNumber } from '../quantities/print.js';
import { defineWorking, type WorkedOut } from './define-working.js';
import { typed } from './fastening/figures.js';
import { printSize } from './measuring/figures.js';
import { printVolume } from './measuring/volumes.js';

/** The compression ratio from what was measured, and the chamber for another. */
export const compressionRatioWorking = defineWorking({
  key: 'compression-ratio',
  group: 'measuring',
  title: 'Compression ratio',
  asks: 'What is the compression ratio, and what must the chamber hold for another?',
  sections: [
    {
      heading: 'Bore and stroke',
      fields: [
        { kind: 'quantity', name: 'bore', label: 'Bore', of: 'length', unit: 'mm' },
        { kind: 'quantity', name: 'stroke', label: 'Stroke', of: 'length', unit: 'mm' },
      ],
    },
    {
      heading: 'Above the piston at TDC',
      fields: [
        {
          kind: 'quantity',
          name: 'chamber',
          label: 'Chamber in the head, valves and plug in',
          of: 'volume',
          unit: 'cm3',
        },
        {
          kind: 'quantity',
          name: 'gasketBore',
          label: 'Gasket, diameter of its opening',
          of: 'length',
          unit: 'mm',
        },
        {
          kind: 'quantity',
          name: 'gasketThickness',
          label: 'Gasket, thickness when tight',
          of: 'length',
          unit: 'mm',
        },
        {
          kind: 'quantity',
          name: 'deck',
          label: 'Piston below the deck',
          hint: 'minus where it stands above',
          of: 'length',
          unit: 'mm',
          signed: true,
        },
        {
          kind: 'quantity',
          name: 'dish',
          label: 'Dish in the piston’s crown',
          hint: 'valve pockets too; minus for a dome',
          of: 'volume',
          unit: 'cm3',
          signed: true,
          optional: 'a flat crown',
        },
      ],
    },
    {
      heading: 'Wanted',
      fields: [
        {
          kind: 'number',
          name: 'wanted',
          label: 'Ratio wanted',
          counts: 'to 1',
          optional: 'no chamber is worked out for it',
        },
      ],
    },
  ],
  example: {
    typed: {
      ...{ bore: '86 mm', stroke: '86 mm', chamber: '40 cm3', gasketBore: '88 mm' },
      ...{ gasketThickness: '1.2 mm', deck: '0.5 mm', dish: '4 cm3' },
    },
    from: 'definition of the ratio, as a training page has it; the figures worked out beside it: 10.22 to 1',
  },
  basis: [
    'Ratio = (swept + clearance)/clearance; clearance = chamber + π/4·gasket’s opening²·thickness + π/4·bore²·deck + dish. By definition.',
  ],
  fieldOf: [
    [/^gasket\.bore/, 'gasketBore'],
    [/^gasket/, 'gasketThickness'],
    [/^(bore|stroke|chamber|deck|dish|wanted)/, '$1'],
  ],
  fromSpec: ({ engine }) => [
    {
      name: engine.name.value,
      typed: {
        bore: typed(engine.bore.value),
        stroke: typed(engine.stroke.value),
        wanted: String(engine.compressionRatio.value),
      },
    },
  ],
  answer: (read): WorkedOut => {
    const dish = read.quantityIf('dish');
    const wanted = read.numberIf('wanted');
    const answer = compressionRatio({
      bore: read.quantity('bore'),
      stroke: read.quantity('stroke'),
      chamber: read.quantity('chamber'),
      gasket: { bore: read.quantity('gasketBore'), thickness: read.quantity('gasketThickness') },
      deck: read.quantity('deck'),
      dish,
      wanted,
    });
    return {
      parts: [
        {
          kind: 'facts',
          facts: [
            { name: 'Compression ratio', value: `${printNumber(answer.compressionRatio, 2)} to 1` },
            { name: 'Swept by one piston', value: printVolume(answer.swept) },
            { name: 'Left above it at TDC', value: printVolume(answer.clearanceVolume) },
            { name: 'Squish, piston to head', value: printSize(answer.squish) },
            ...(answer.chamberFor === undefined || wanted === undefined
              ? []
              : [
                  {
                    name: `Chamber for ${printNumber(wanted, 2)} to 1`,
                    value: printVolume(answer.chamberFor),
                  },
                ]),
          ],
        },
      ],
      assumed: [
        ...(dish === undefined ? ['The piston’s crown is flat.'] : []),
        'The crevice above the top ring is left out: it lowers the ratio a little.',
      ],
      cautions: [
        ...answer.cautions,
        'Measure every chamber, and check piston to valve as well: skimming a head brings both closer.',
      ],
    };
  },
});
