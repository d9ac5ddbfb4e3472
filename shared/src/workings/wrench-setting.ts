import { InputError } from '../contracts/input-error.js';
import type { Quantity } from '../contracts/quantity.js';
import { wrenchSetting } from '../fastening/wrench-setting.js';
import { convert, toSi } from '../quantities/convert.js';
import { printNumber } from '../quantities/print.js';
import { defineWorking, type WorkedOut } from './define-working.js';
import { torqueField } from './fastening/fields.js';
import { newtonMetresBeside } from './fastening/figures.js';
import { printFigure } from '../fastening/print-figure.js';
import type { AnswerPart } from './working.js';
import { casesOfGroups, torqueOfGroup } from './fastening/groups-of-spec.js';

/** What a torque wrench is set to with an adapter or crow-foot on it. */
export const wrenchSettingWorking = defineWorking({
  key: 'wrench-setting',
  group: 'tightening',
  title: 'Wrench with a crow-foot or adapter',
  asks: 'What must the torque wrench be set to, with an adapter on it?',
  sections: [
    {
      heading: 'The fastener',
      fields: [{ ...torqueField, label: 'Torque the fastener must get' }],
    },
    {
      heading: 'Wrench and adapter',
      fields: [
        {
          kind: 'quantity',
          name: 'wrenchLength',
          label: 'Wrench, middle of the grip to its square',
          of: 'length',
          unit: 'mm',
        },
        {
          kind: 'quantity',
          name: 'adapterLength',
          label: 'Adapter, square to the middle of the fastener',
          of: 'length',
          unit: 'mm',
        },
        {
          kind: 'number',
          name: 'angle',
          label: 'Angle between adapter and wrench',
          hint: '0 in line and away from the hand, 90 square to it, 180 back towards the hand',
          counts: '°',
          optional: '0°, in line and away from the hand',
        },
        {
          kind: 'quantity',
          name: 'division',
          label: 'Divisions of the wrench’s scale',
          of: 'torque',
          unit: 'N·m',
          optional: 'the setting is not brought to a division',
        },
      ],
    },
  ],
  example: {
    typed: { torque: '135 lbf·in', wrenchLength: '10 in', adapterLength: '1.5 in', angle: '0' },
    from: 'T·L/(L + E) of 135 lbf·in, 10 in and 1.5 in, 117.39 lbf·in: a helicopter maintenance manual of 2010, chapter 20',
  },
  fieldOf: [
    [/^torque/, 'torque'],
    [/^wrenchLength/, 'wrenchLength'],
    [/^adapterLength/, 'adapterLength'],
    [/^adapterAngle/, 'angle'],
  ],
  basis: [
    'Setting = T·L/(L + E·cos θ): effective length of a straight and angled extension, TM 9-254, pp. 91 and 92.',
  ],
  fromSpec: (document) =>
    casesOfGroups(document, (group) => ({ torque: torqueOfGroup(group)['torque'] ?? '' })),
  answer: (read): WorkedOut => {
    const torque = read.quantity('torque');
    const angle = read.numberIf('angle') ?? 0;
    const [wrenchLength, adapterLength] = [read.quantity('wrenchLength'), read.quantity('adapterLength')];
    const { setting } = wrenchSetting({
      torque,
      wrenchLength,
      adapterLength,
      adapterAngle: angle,
    });
    const division = read.quantityIf('division');
    const atDivision = division && toDivision(setting, division);
    return {
      parts: [
        ...doubtOf(wrenchLength, adapterLength),
        {
          kind: 'facts',
          heading: 'The wrench',
          facts: [
            { name: 'Set it to', value: newtonMetresBeside(setting) },
            ...(atDivision === undefined ? [] : [nearestDivision(atDivision, setting)]),
            { name: 'The fastener then gets', value: printFigure(torque) },
            { name: 'Setting over torque', value: printNumber(setting.value / torque.value, 3) },
          ],
        },
        { kind: 'steps', heading: 'How to pull', steps: howToPull(angle) },
      ],
      assumed: [
        ...(read.numberIf('angle') === undefined
          ? ['The adapter lies in line with the wrench, away from the hand.']
          : []),
        'The hand pulls at the middle of the grip, square to the wrench; anywhere else the torque is another.',
      ],
    };
  },
});

/** No torque wrench is shorter than this, metres: common practice, no source. */
const shortestWrench = 0.1;

/** A length typed in the wrong unit makes a setting that looks like one; such a wrench is asked about. */
function doubtOf(wrench: Quantity, adapter: Quantity): readonly AnswerPart[] {
  const [length, beside] = [toSi(wrench), toSi(adapter)];
  if (length >= shortestWrench && length >= beside) return [];
  const why =
    length < beside
      ? `its adapter is longer, ${printFigure(adapter)}`
      : 'no torque wrench is as short as that';
  return [
    {
      kind: 'judgement',
      verdict: 'doubtful',
      reason: `A wrench ${printFigure(wrench)} long? As typed, ${why}: look at the units of both lengths before you set it.`,
    },
  ];
}

function toDivision(setting: Quantity, division: Quantity): Quantity {
  const step = convert(division, setting.unit).value;
  if (step <= 0 || step > setting.value) {
    throw new InputError('division', 'A division is more than nothing and less than the setting.');
  }
  return { value: Math.round(setting.value / step) * step, unit: setting.unit };
}

function nearestDivision(
  at: Quantity,
  setting: Quantity,
): { readonly name: string; readonly value: string; readonly note: string } {
  const off = (at.value / setting.value - 1) * 100;
  return {
    name: 'Nearest division',
    value: printFigure(at),
    note: Math.abs(off) < 0.05 ? 'on the setting' : `${printNumber(off, 1)} % off it`,
  };
}

function howToPull(angle: number): readonly string[] {
  const along = Math.cos((angle * Math.PI) / 180);
  const how =
    Math.abs(along) < 1e-9
      ? 'Keep the adapter square to the wrench: the setting is then the torque itself.'
      : Math.abs(along) > 1 - 1e-9
        ? `Keep the adapter in line with the wrench, ${along > 0 ? 'away from' : 'back towards'} the hand.`
        : `Keep the adapter at ${printNumber(angle, 1).replace(/\.0$/, '')}° to the wrench: another angle is another torque.`;
  return [
    how,
    'Hold the wrench by the middle of its grip and pull steadily, once, to the click or the figure.',
  ];
}
