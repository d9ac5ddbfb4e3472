import { dwell } from '../ignition/dwell.js';
import { printNumber } from '../quantities/print.js';
import { defineWorking } from './define-working.js';
import { printAngle } from './engine/engine-words.js';

/** What a dwell angle leaves, and how long that is. */
export const dwellWorking = defineWorking({
  key: 'dwell',
  group: 'wiring',
  title: 'Dwell',
  asks: 'How long do the contact points stay closed and open at this dwell?',
  sections: [
    {
      heading: 'The distributor',
      fields: [
        { kind: 'number', name: 'cylinders', label: 'Cylinders that it fires', counts: 'cylinders' },
        {
          kind: 'number',
          name: 'dwell',
          label: 'Dwell',
          counts: '°',
          hint: 'Distributor degrees, as a dwell meter shows them',
        },
        {
          kind: 'number',
          name: 'speed',
          label: 'Crank speed',
          counts: 'rev/min',
          optional: 'no times are given',
        },
        {
          kind: 'choice',
          name: 'strokes',
          label: 'The engine is a',
          choices: [
            { value: '4', words: 'four-stroke' },
            { value: '2', words: 'two-stroke' },
          ],
          starts: '4',
        },
      ],
    },
  ],
  example: {
    typed: { cylinders: '4', dwell: '60', speed: '5000' },
    from: 'article on the cam dwell angle: 6 ms from spark to spark, 4 ms closed',
  },
  fromSpec: ({ engine }) => [{ name: 'The engine', typed: { cylinders: String(engine.cylinders.value) } }],
  basis: ['Interval 360° ÷ cylinders, open angle = interval − dwell: by definition of the dwell angle.'],
  fieldOf: [
    [/^crankSpeed/, 'speed'],
    [/^strokesPerCycle/, 'strokes'],
  ],
  answer: (read) => {
    const crankSpeed = read.numberIf('speed');
    const closed = read.number('dwell');
    const answer = dwell({
      cylinders: read.number('cylinders'),
      dwell: closed,
      strokesPerCycle: read.choice('strokes') === '2' ? 2 : 4,
      ...(crankSpeed === undefined ? {} : { crankSpeed }),
    });
    const { betweenSparks, closedFor } = answer;
    const times =
      betweenSparks === undefined || closedFor === undefined
        ? []
        : [
            { name: 'Time from spark to spark', value: milliseconds(betweenSparks.value) },
            { name: 'Points closed', value: milliseconds(closedFor.value), note: 'the coil charges' },
          ];
    return {
      parts: [
        {
          kind: 'facts',
          facts: [
            { name: 'From spark to spark', value: printAngle(answer.interval), note: 'of distributor' },
            { name: 'Points open', value: printAngle(answer.openAngle), note: 'of distributor' },
            { name: 'Share of the time closed', value: `${printNumber(answer.share * 100, 1)}\u2009%` },
            ...times,
          ],
        },
      ],
      assumed: [
        'The sparks are evenly spaced, and the distributor turns once in a cycle.',
        'Dwell changes with the points gap: a wider gap gives less dwell, and the timing moves with it.',
      ],
    };
  },
});

const milliseconds = (seconds: number): string => `${printNumber(seconds * 1000, 2)}\u2009ms`;
