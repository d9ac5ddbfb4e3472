import type { Fit, FitPart } from '../../contracts/fits.js';
import { drawFitZones } from '../../drawing/fit-zones.js';
import { fit } from '../../fits/fit.js';
import type { Quantity } from '../../contracts/quantity.js';
import { defineWorking } from '../define-working.js';
import type { CaseReader } from '../read-case.js';
import type { FieldSection, WorkingCase, WorkingField } from '../working.js';
import { printedLength } from './printed-length.js';
import { typedLimits } from './spec-limits.js';

const isBy = (part: string, by: string) => (typed: WorkingCase) => (typed[`${part}By`] ?? 'limits') === by;

function section(part: 'hole' | 'shaft', heading: string, example: string): FieldSection {
  const length = (name: string, label: string, by: string): WorkingField => ({
    kind: 'quantity',
    name: `${part}${name}`,
    label,
    of: 'length',
    unit: 'mm',
    when: isBy(part, by),
  });
  return {
    heading,
    fields: [
      {
        kind: 'choice',
        name: `${part}By`,
        label: `The ${part} is known by`,
        choices: [
          { value: 'limits', words: 'its least and most size' },
          { value: 'class', words: 'its size and class' },
        ],
        starts: 'limits',
      },
      length('Size', `Size of the ${part}`, 'class'),
      {
        kind: 'text',
        name: `${part}Class`,
        label: `Class of the ${part}`,
        hint: example,
        figures: true,
        when: isBy(part, 'class'),
      },
      length('Low', `Least size of the ${part}`, 'limits'),
      length('High', `Most size of the ${part}`, 'limits'),
    ],
  };
}

/** What a hole and a shaft leave between them. */
export const fitWorking = defineWorking({
  key: 'fit',
  group: 'fits-and-keys',
  title: 'Fit of a hole and a shaft',
  asks: 'How much clearance or interference is there between this hole and this shaft?',
  sections: [
    section('hole', 'The hole', 'H7, K7, N9, JS9'),
    section('shaft', 'The shaft', 'g6, h6, k6, n6, p6, s6'),
  ],
  example: {
    typed: {
      holeBy: 'class',
      holeSize: '50 mm',
      holeClass: 'H7',
      shaftBy: 'class',
      shaftSize: '50 mm',
      shaftClass: 'p6',
    },
    from: 'ISO 286-2, 50 mm H7/p6: 1 to 42 µm of interference',
  },
  fromSpec: ({ keys }) =>
    keys.map(({ name, hubBore, shaftDiameter }) => ({
      name: `${name}: shaft and bore`,
      typed: {
        holeBy: 'limits',
        shaftBy: 'limits',
        ...typedLimits(hubBore.value, 'holeLow', 'holeHigh'),
        ...typedLimits(shaftDiameter.value, 'shaftLow', 'shaftHigh'),
      },
    })),
  basis: [
    'Tightest: least hole less most shaft. Loosest: most hole less least shaft. ISO 286-1:2010, 3.3.',
    'Limits of the classes: ISO 286-1 and -2:2010, 1 to 250 mm.',
  ],
  fieldOf: [
    [/^(hole|shaft)\.size/, '$1Size'],
    [/^(hole|shaft)\.class/, '$1Class'],
    [/^(hole|shaft)\.low/, '$1Low'],
    [/^(hole|shaft)\.high/, '$1High'],
  ],
  answer: (read, options) => {
    const request = { hole: partOf(read, 'hole'), shaft: partOf(read, 'shaft') };
    const answer = fit(request);
    return {
      parts: [
        {
          kind: 'facts',
          heading: headings[answer.kind],
          facts: [
            { name: 'Tightest', value: spaceWords(answer.least) },
            { name: 'Loosest', value: spaceWords(answer.most) },
            { name: 'What it means', value: meanings[answer.kind] },
          ],
        },
        {
          kind: 'drawing',
          caption: 'Where the two sizes may lie, on one scale',
          drawing: drawFitZones({ request, answer }, options),
        },
      ],
      assumed: ['Both parts are at one temperature; sizes of a class hold at 20 °C.'],
      cautions:
        answer.kind === 'clearance'
          ? []
          : [
              'Pressing stores force: stand clear of the press’s line, wear eye protection, and support the part under the joint. The maker’s own way of putting it together comes first.',
            ],
    };
  },
});

const headings: Record<Fit['kind'], string> = {
  clearance: 'A clearance fit',
  transition: 'A transition fit',
  interference: 'An interference fit',
};
const meanings: Record<Fit['kind'], string> = {
  clearance: 'any such shaft goes into any such hole by hand',
  transition: 'it depends on the two parts: measure the very ones that go together',
  interference: 'it needs a press, heat or cold, whichever two parts go together',
};

function partOf(read: CaseReader, part: 'hole' | 'shaft'): FitPart {
  return read.choice(`${part}By`) === 'class'
    ? { size: read.quantity(`${part}Size`), class: read.text(`${part}Class`) }
    : { low: read.quantity(`${part}Low`), high: read.quantity(`${part}High`) };
}

function spaceWords({ value, unit }: Quantity): string {
  return `${printedLength({ value: Math.abs(value), unit })} of ${value < 0 ? 'interference' : 'clearance'}`;
}
