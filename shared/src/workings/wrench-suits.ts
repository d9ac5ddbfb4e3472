import type { WrenchSuitsRequest } from '../contracts/fastening.js';
import { InputError } from '../contracts/input-error.js';
import { wrenchSuits } from '../fastening/wrench-suits.js';
import { printNumber } from '../quantities/print.js';
import { defineWorking } from './define-working.js';
import { toleranceFields, torqueField } from './fastening/fields.js';
import { percent } from './fastening/figures.js';
import { printFigure } from '../fastening/print-figure.js';
import { casesOfGroups, torqueOfGroup } from './fastening/groups-of-spec.js';
import { toleranceOf } from './fastening/tolerance.js';

const checkWords = {
  range: 'Range',
  deviation: 'What it may deliver',
  resolution: 'Divisions',
  calibration: 'Calibration',
} as const;

/** Whether a torque wrench suits a job. */
export const wrenchSuitsWorking = defineWorking({
  key: 'wrench-suits',
  group: 'tightening',
  title: 'Does the wrench suit the job',
  asks: 'Can this torque wrench hold the torque that is wanted?',
  sections: [
    {
      heading: 'The torque',
      fields: [
        torqueField,
        ...toleranceFields('no limits', 'no limits; nothing where only one is filled in'),
      ],
    },
    {
      heading: 'The wrench',
      fields: [
        {
          kind: 'choice',
          name: 'kind',
          label: 'The wrench',
          choices: [
            { value: 'click', words: 'is set and clicks' },
            { value: 'dial', words: 'has a dial or beam to read' },
            { value: 'digital', words: 'has a digital display' },
          ],
          starts: 'click',
        },
        { kind: 'quantity', name: 'rangeLow', label: 'Range, from', of: 'torque', unit: 'N·m' },
        { kind: 'quantity', name: 'rangeHigh', label: 'Range, to', of: 'torque', unit: 'N·m' },
        {
          kind: 'quantity',
          name: 'resolution',
          label: 'Divisions of its scale',
          optional: 'not judged',
          of: 'torque',
          unit: 'N·m',
        },
        {
          kind: 'number',
          name: 'deviation',
          label: 'Good to ±',
          optional: 'ISO 6789-1: 4 %, or 6 % of a wrench up to 10 N·m',
          counts: '%',
        },
        { kind: 'date', name: 'due', label: 'Calibration due', optional: 'not judged' },
        {
          kind: 'date',
          name: 'on',
          label: 'Day it is used',
          when: ({ due = '' }) => due !== '',
        },
      ],
    },
  ],
  example: {
    typed: { torque: '8 N·m', kind: 'click', rangeLow: '2 N·m', rangeHigh: '10 N·m' },
    from: 'a tool’s manual that restates ISO 6789: ±6 % up to 10 N·m, 7.52 to 8.48 N·m',
  },
  fieldOf: [
    [/^torque/, 'torque'],
    [/^tolerance\.high/, 'above'],
    [/^tolerance/, 'below'],
    [/^wrench\.range\.low/, 'rangeLow'],
    [/^wrench\.range/, 'rangeHigh'],
    [/^wrench\.resolution/, 'resolution'],
    [/^wrench\.deviation/, 'deviation'],
    [/^wrench\.calibrationDue/, 'due'],
  ],
  basis: [
    'Permissible deviations of ISO 6789-1:2017, 5.1.5, type II class A, type I classes B and C, from memory.',
    'The wrench suits where what it may deliver at this torque stays inside the limits.',
  ],
  fromSpec: (document) => casesOfGroups(document, torqueOfGroup),
  answer: (read) => {
    const torque = read.quantity('torque');
    const deviation = read.numberIf('deviation');
    if (deviation !== undefined && deviation > 50) {
      throw new InputError('deviation', 'No torque wrench is off by more than 50 %.');
    }
    const due = read.textIf('due');
    const { verdict, reason, delivers, ratio, checks, assumed, ...answer } = wrenchSuits({
      torque,
      tolerance: toleranceOf(read, torque),
      wrench: {
        kind: read.choice<WrenchSuitsRequest['wrench']['kind']>('kind'),
        range: { low: read.quantity('rangeLow'), high: read.quantity('rangeHigh') },
        resolution: read.quantityIf('resolution'),
        deviation: deviation === undefined ? undefined : deviation / 100,
        calibrationDue: due,
      },
      on: due === undefined ? undefined : read.text('on'),
    });
    return {
      parts: [
        { kind: 'judgement', verdict, reason },
        {
          kind: 'facts',
          heading: 'At this torque',
          facts: [
            {
              name: 'It may deliver',
              value: `${printFigure(delivers.low)} to ${printFigure(delivers.high)}`,
            },
            { name: 'Good to', value: `±${percent(answer.deviation)}` },
            ...(ratio === null
              ? []
              : [{ name: 'Whole tolerance over that', value: `${printNumber(ratio, 1)} to 1` }]),
          ],
        },
        ...checks.map((check) => ({
          kind: 'judgement' as const,
          of: checkWords[check.of],
          verdict: check.verdict,
          reason: check.reason,
        })),
      ],
      assumed: [
        ...assumed,
        'The wrench is used by its middle grip, in the range of its calibration, and wound down after use.',
      ],
    };
  },
});
