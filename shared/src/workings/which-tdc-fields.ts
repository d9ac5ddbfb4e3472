import { firingFields, timingFields } from './engine/engine-fields.js';
import type { CellField, ChoiceField, FieldSection } from './working.js';

const notLooked = { value: '-', words: 'not looked at' };
const states: ChoiceField['choices'] = [
  notLooked,
  { value: 'shut', words: 'shut' },
  { value: 'opening', words: 'opening' },
  { value: 'full', words: 'fully open' },
  { value: 'closing', words: 'closing' },
];
const choice = (name: string, label: string, choices: ChoiceField['choices']): ChoiceField => ({
  kind: 'choice',
  name,
  label,
  choices,
  starts: '-',
});

/** One thing seen a row; rows with the same position were seen without turning the crank between them. */
export const sightingColumns: readonly CellField[] = [
  {
    kind: 'number',
    name: 'position',
    label: 'Position',
    hint: 'the same for things seen without turning the crank between them',
    counts: '',
    optional: 'row by row, the crank turned on between them',
  },
  { kind: 'text', name: 'cylinder', label: 'Cylinder', figures: true },
  choice('inlet', '{Inlet} valve', states),
  choice('exhaust', 'Exhaust valve', states),
  choice('piston', 'Piston', [
    notLooked,
    { value: 'top', words: 'at the top' },
    { value: 'bottom', words: 'at the bottom' },
  ]),
  choice('rocking', 'Valves', [notLooked, { value: 'yes', words: 'rocking' }]),
  choice('pressure', 'Plug hole', [notLooked, { value: 'yes', words: 'pressure felt' }]),
];

/** What the working asks for. */
export const whichTdcSections: readonly FieldSection[] = [
  {
    heading: 'The question',
    fields: [
      { kind: 'text', name: 'cylinder', label: 'Cylinder at TDC', figures: true },
      { kind: 'number', name: 'about', label: 'At position', counts: '', optional: 'the last one' },
    ],
  },
  {
    heading: 'What was seen, turning the crank the normal way',
    fields: [
      {
        kind: 'rows',
        name: 'seen',
        label: 'Seen',
        row: 'sighting',
        columns: sightingColumns,
        least: 1,
        most: 60,
      },
      {
        kind: 'choice',
        name: 'marks',
        label: 'Timing marks together at that position',
        choices: [
          notLooked,
          { value: 'compression', words: 'yes: they mean compression TDC' },
          { value: 'exhaust', words: 'yes: they mean exhaust TDC' },
        ],
        starts: '-',
      },
      {
        kind: 'number',
        name: 'tolerance',
        label: 'Each thing seen may be off by',
        counts: '°',
        optional: '10° of crank, common practice',
      },
    ],
  },
  { heading: 'The engine', fields: [...firingFields, ...timingFields()] },
];
