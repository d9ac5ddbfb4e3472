import { printQuantity } from '../quantities/print.js';
import { lifterPreload } from '../valve-train/lifter-preload.js';
import { defineWorking } from './define-working.js';
import { limitsCases } from './engine/limits-cases.js';
import { spoken } from './wiring-map/spoken.js';
import type { WorkingCase } from './working.js';

const atPivot = ({ adjuster }: WorkingCase): boolean => adjuster === 'pivot';

/** How far a hydraulic lifter is pressed in by its adjuster. */
export const lifterPreloadWorking = defineWorking({
  key: 'lifter-preload',
  group: 'valve-timing',
  title: '{Follower} preload',
  asks: 'How far do these turns of the adjuster press a hydraulic {follower} in?',
  sections: [
    {
      heading: 'The adjuster',
      fields: [
        {
          kind: 'number',
          name: 'turns',
          label: 'Turns past zero {clearance}',
          counts: 'turns',
          hint: '0.75 or 3/4',
        },
        {
          kind: 'quantity',
          of: 'length',
          unit: 'mm',
          name: 'pitch',
          label: 'Pitch of its thread',
          hint: '1 mm; 1/24 in for 24 threads an inch',
        },
        {
          kind: 'choice',
          name: 'adjuster',
          label: 'It is',
          choices: [
            { value: 'push-rod', words: 'at the push rod’s end' },
            { value: 'pivot', words: 'the nut at the rocker’s pivot' },
          ],
          starts: 'push-rod',
        },
        {
          kind: 'number',
          name: 'ratio',
          label: 'Rocker ratio',
          counts: 'to 1',
          hint: 'Lift at the valve over lift at the {follower}',
          when: atPivot,
        },
      ],
    },
    {
      heading: 'What the maker allows',
      fields: [
        {
          kind: 'quantity',
          of: 'length',
          unit: 'mm',
          name: 'low',
          label: 'Least preload',
          optional: 'it is not judged',
        },
        {
          kind: 'quantity',
          of: 'length',
          unit: 'mm',
          name: 'high',
          label: 'Most preload',
          optional: 'it is not judged',
        },
      ],
    },
  ],
  example: {
    typed: { turns: '3/4', pitch: '1/24 in', low: '0.020 in', high: '0.045 in' },
    from: 'pitch of a thread, 24 to the inch: 3/4 of 1/24 in is 1/32 in; no printed source',
  },
  fromSpec: (document) => limitsCases(document, 'preload'),
  basis: [
    'Preload = turns × pitch at the push rod: definition of the pitch.',
    'At the pivot × (1 + 1 ÷ ratio): the rocker as a lever about the valve’s tip; no printed source.',
  ],
  fieldOf: [
    [/^rockerRatio/, 'ratio'],
    [/^limits\.low/, 'low'],
    [/^limits/, 'high'],
    [/^pitch/, 'pitch'],
  ],
  answer: (read) => {
    const adjuster = read.choice<'push-rod' | 'pivot'>('adjuster');
    const [low, high] = [read.quantityIf('low'), read.quantityIf('high')];
    const { verdict, reason, preload, assumed } = lifterPreload({
      turns: read.number('turns'),
      pitch: read.quantity('pitch'),
      adjuster,
      ...(adjuster === 'pivot' ? { rockerRatio: read.number('ratio') } : {}),
      ...(low === undefined || high === undefined ? {} : { limits: { low, high } }),
    });
    return {
      parts: [
        { kind: 'judgement', verdict, reason: spoken(reason) },
        { kind: 'facts', facts: [{ name: 'Preload', value: printQuantity(preload) }] },
      ],
      assumed: assumed.map(spoken),
      cautions: [
        'Wait until the {followers} have bled down before turning the engine: too much preload can hold a valve against a piston.',
      ],
    };
  },
});
