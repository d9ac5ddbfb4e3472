import type { Expanding, ExpandingMaterial, HeatToAssemble } from '../../contracts/fits.js';
import type { Quantity, Unit } from '../../contracts/quantity.js';
import type { KeySpec } from '../../contracts/spec.js';
import { fit } from '../../fits/fit.js';
import { heatToAssemble } from '../../fits/heat-to-assemble.js';
import { expansions } from '../../fits/tables/expansion.js';
import { convert, convertInterval } from '../../quantities/convert.js';
import { printNumber, printQuantity } from '../../quantities/print.js';
import { defineWorking } from '../define-working.js';
import type { CaseReader } from '../read-case.js';
import type { WorkingCase } from '../working.js';
import { heatSections } from './heat-fields.js';
import { printedLength } from './printed-length.js';

/** How hot or cold a joint must be made to go together. */
export const heatToAssembleWorking = defineWorking({
  key: 'heat-to-assemble',
  group: 'fits-and-keys',
  title: 'Heat to put it together',
  asks: 'How hot must the outer part be, or how cold the inner one, for this joint to go together?',
  sections: heatSections,
  example: {
    typed: {
      diameter: '30 mm',
      interference: '15 µm',
      clearance: '14.8 µm',
      hub: 'steel',
      shaft: 'steel',
      by: 'heating-hub',
      room: '20 °C',
      hottestAllowed: '120 °C',
    },
    from: 'bearing suppliers’ rule for hot mounting: 80 to 90 K above the shaft, an open bearing to 120 °C',
  },
  fromSpec: ({ keys }) => keys.flatMap(typedJoint),
  basis: [
    'ΔT = (interference + clearance) / (α · d): shrink-fit assembly, any handbook.',
    'Coefficients: Fundamentals of Materials Science and Engineering, 3rd ed., table B.6, and two handbook tables; the least of a material’s alloys.',
    'What bearings stand: two bearing suppliers’ notes on hot mounting.',
  ],
  fieldOf: [
    [/^(hub|shaft)\.coefficient/, '$1Coefficient'],
    [/^(diameter|interference|clearance|room|coldest|hottestAllowed|coldestAllowed)\b/, '$1'],
  ],
  answer: (read) => {
    const [hottestAllowed, coldestAllowed, coldest] = ['hottestAllowed', 'coldestAllowed', 'coldest'].map(
      (name) => read.quantityIf(name),
    );
    const diameter = read.quantity('diameter');
    const [clearance, room] = [read.quantityIf('clearance'), read.quantityIf('room')];
    const answer = heatToAssemble({
      diameter,
      interference: read.quantity('interference'),
      clearance: clearance ?? { ...diameter, value: diameter.value / 1000 },
      hub: expandingOf(read, 'hub'),
      shaft: expandingOf(read, 'shaft'),
      room: room ?? { value: 20, unit: '°C' },
      by: read.choice('by'),
      coldest,
      hottestAllowed,
      coldestAllowed,
    });
    return {
      parts: [
        { kind: 'judgement', verdict: answer.verdict, reason: answer.reason },
        {
          kind: 'facts',
          facts: [
            {
              name: 'Outer part',
              value: inBoth(answer.hubTemperature),
              note: moved(answer.hubRise, 'above'),
            },
            {
              name: 'Inner part',
              value: inBoth(answer.shaftTemperature),
              note: moved(answer.shaftDrop, 'below'),
            },
            { name: 'Clearance then', value: printedLength(answer.clearanceThen) },
          ],
        },
        { kind: 'steps', heading: 'In this order', steps: stepsOf(answer) },
      ],
      assumed: [
        ...(clearance === undefined
          ? ['A clearance of a thousandth of the diameter is wanted: common practice, no source.']
          : []),
        ...(room === undefined ? ['The room is at 20 °C.'] : []),
        ...answer.assumed,
        ...coefficientsOf(read),
      ],
      cautions: answer.cautions,
    };
  },
});

function expandingOf(read: CaseReader, part: 'hub' | 'shaft'): Expanding {
  const chosen = read.choice<ExpandingMaterial | 'other'>(part);
  return chosen === 'other' ? { coefficient: read.number(`${part}Coefficient`) } : chosen;
}

function coefficientsOf(read: CaseReader): readonly string[] {
  const chosen = new Set((['hub', 'shaft'] as const).map((part) => read.choice(part)));
  return [...chosen].flatMap((material) => {
    const listed = expansions.filter((one) => one.material === material);
    if (listed.length === 0) return [];
    const least = listed.reduce((a, b) => (b.coefficient < a.coefficient ? b : a));
    return [`${least.coefficient} millionths per kelvin: ${least.alloy}, ${least.source}.`];
  });
}

function inBoth(temperature: Quantity): string {
  const other: Unit = temperature.unit === '°F' ? '°C' : '°F';
  const shown = (quantity: Quantity): string => printQuantity(quantity, { digits: 0 });
  return `${shown(temperature)} (${shown(convert(temperature, other))})`;
}

/** In both sizes of degree, so that nobody converts a difference as a temperature. */
function moved(difference: Quantity, way: 'above' | 'below'): string | undefined {
  if (difference.value === 0) return undefined;
  const fahrenheit = convertInterval(difference, '°F').value;
  return `${printNumber(difference.value, 0)} °C, or ${printNumber(fahrenheit, 0)} °F, ${way} the room`;
}

function stepsOf({
  hubRise,
  shaftDrop,
  hubTemperature,
  shaftTemperature,
}: HeatToAssemble): readonly string[] {
  const said = [
    'Measure both parts at room temperature, clean them, and lay out what stops the part where it must sit.',
    shaftDrop.value > 0 && `Cool the inner part to ${inBoth(shaftTemperature)}, all through, and dry it.`,
    hubRise.value > 0 &&
      `Heat the outer part evenly to ${inBoth(hubTemperature)}, in an oven or on a plate; measure it, do not guess by colour.`,
    'Put them together in one movement, without a stop, and hold them home until they grip.',
    'Let it come to room temperature by itself, then look whether it sits home all round.',
  ];
  return said.filter((step) => step !== false);
}

/** Only where a spec's bore is smaller than its shaft at the worst. */
function typedJoint({
  name,
  hubBore,
  shaftDiameter,
}: KeySpec): readonly { name: string; typed: WorkingCase }[] {
  const [hole, shaft] = [hubBore.value, shaftDiameter.value];
  if (!hole.low || !hole.high || !shaft.low || !shaft.high) return [];
  const { least } = fit({
    hole: { low: hole.low, high: hole.high },
    shaft: { low: shaft.low, high: shaft.high },
  });
  if (least.value >= 0) return [];
  return [
    {
      name: `${name}: hub on its shaft`,
      typed: {
        diameter: printQuantity(shaft.high),
        interference: printedLength({ value: -least.value, unit: least.unit }),
      },
    },
  ];
}
