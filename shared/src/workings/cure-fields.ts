import type { CellField, FieldSection } from './working.js';

const yesNo = [
  { value: 'no', words: 'no' },
  { value: 'yes', words: 'yes' },
] as const;

const span = (name: string, label: string): CellField => ({
  kind: 'quantity',
  name,
  label,
  of: 'time',
  unit: 'h',
});

export const sheetColumns: readonly CellField[] = [
  { kind: 'quantity', name: 'temperature', label: 'At', of: 'temperature', unit: '°C' },
  { kind: 'quantity', name: 'gap', label: 'Gap', of: 'length', unit: 'mm', optional: 'any' },
  { kind: 'text', name: 'substrate', label: 'On', hint: 'steel, zinc, cast iron', optional: 'any material' },
  { kind: 'choice', name: 'activator', label: 'Activator', choices: yesNo, starts: 'no' },
  { kind: 'number', name: 'humidity', label: 'Humidity', counts: '%', optional: 'any' },
  { ...span('toHandle', 'To handle'), optional: 'not given' },
  span('toLoad', 'To load'),
  span('full', 'To full strength'),
];

/** What is asked of a joint that sets. */
export const cureFields: readonly FieldSection[] = [
  {
    heading: 'The data sheet',
    fields: [
      {
        kind: 'rows',
        name: 'sheet',
        label: 'Figures of the data sheet',
        row: 'line',
        least: 1,
        most: 30,
        columns: sheetColumns,
      },
      {
        kind: 'quantity',
        name: 'openTime',
        label: 'May stay open for',
        hint: 'from applying it to closing the joint',
        of: 'time',
        unit: 'min',
        optional: 'not checked',
      },
      { kind: 'date', name: 'lotExpires', label: 'Lot good to', optional: 'not checked' },
      {
        kind: 'choice',
        name: 'retorque',
        label: 'Its sheet allows tightening again',
        choices: yesNo,
        starts: 'no',
      },
    ],
  },
  {
    heading: 'The joint',
    fields: [
      {
        kind: 'quantity',
        name: 'temperature',
        label: 'Temperature of the parts',
        of: 'temperature',
        unit: '°C',
      },
      {
        kind: 'quantity',
        name: 'gap',
        label: 'Gap it fills',
        of: 'length',
        unit: 'mm',
        optional: 'not given; a sheet that goes by gaps is then not judged',
      },
      {
        kind: 'text',
        name: 'substrate',
        label: 'Material',
        hint: 'as the data sheet calls it',
        optional: 'not given; a sheet that tells materials apart is then not judged',
      },
      { kind: 'choice', name: 'activator', label: 'Activator was used', choices: yesNo, starts: 'no' },
      {
        kind: 'number',
        name: 'humidity',
        label: 'Humidity of the air',
        counts: '%',
        optional: 'not given; a sealant that cures by moisture is then not judged',
      },
    ],
  },
  {
    heading: 'The times',
    fields: [
      { kind: 'moment', name: 'applied', label: 'Applied' },
      {
        kind: 'moment',
        name: 'closed',
        label: 'Joint closed',
        optional: 'closed when it was applied',
      },
      { kind: 'moment', name: 'now', label: 'Now' },
      {
        kind: 'rows',
        name: 'log',
        label: 'Temperatures on the way',
        row: 'temperature',
        least: 0,
        most: 60,
        optional: 'the temperature of the parts throughout',
        columns: [
          { kind: 'moment', name: 'at', label: 'At' },
          { kind: 'quantity', name: 'temperature', label: 'Temperature', of: 'temperature', unit: '°C' },
        ],
      },
    ],
  },
];
