import type { FieldSection, WorkingCase } from '../working.js';
import { toleranceFields, torqueField } from './fields.js';

const isLaidOut =
  (...layouts: readonly string[]) =>
  ({ layout = 'grid' }: WorkingCase): boolean =>
    layouts.includes(layout === '' ? 'grid' : layout);

export const planSections: readonly FieldSection[] = [
  {
    heading: 'The fasteners',
    fields: [
      {
        kind: 'choice',
        name: 'layout',
        label: 'They stand',
        choices: [
          { value: 'grid', words: 'in rows and columns' },
          { value: 'circle', words: 'round a circle' },
          { value: 'line', words: 'in a line' },
          { value: 'positions', words: 'as listed one by one' },
        ],
        starts: 'grid',
      },
      {
        kind: 'number',
        name: 'rows',
        label: 'Rows',
        counts: 'rows',
        when: isLaidOut('grid'),
      },
      {
        kind: 'number',
        name: 'columns',
        label: 'In each row',
        hint: 'They are numbered from 1, row by row',
        counts: 'fasteners',
        when: isLaidOut('grid'),
      },
      {
        kind: 'number',
        name: 'count',
        label: 'How many',
        hint: 'They are numbered from 1, clockwise or along the line',
        counts: 'fasteners',
        when: isLaidOut('circle', 'line'),
      },
      {
        kind: 'rows',
        name: 'positions',
        label: 'Where they stand',
        hint: 'Across to the right and down, in one measure of your own',
        row: 'fastener',
        columns: [
          { kind: 'text', name: 'fastener', label: 'Fastener', figures: true },
          { kind: 'number', name: 'x', label: 'Across', counts: '', signed: true },
          { kind: 'number', name: 'y', label: 'Down', counts: '', signed: true },
        ],
        least: 1,
        most: 200,
        when: isLaidOut('positions'),
      },
      {
        kind: 'choice',
        name: 'part',
        label: 'The part',
        choices: [
          { value: 'plain', words: 'a cover, cap or flange' },
          { value: 'head', words: 'a cylinder head' },
        ],
        starts: 'plain',
        when: isLaidOut('grid', 'line', 'positions'),
      },
      {
        kind: 'text',
        name: 'sequence',
        label: 'Maker’s sequence',
        hint: 'The numbers in their order: 3 8 2 7 4 9 1 6 5 10',
        optional: 'general practice, from the centre outwards or opposite and crossing',
        figures: true,
      },
    ],
  },
  {
    heading: 'Torque and passes',
    fields: [
      {
        ...torqueField,
        label: 'Final torque',
        optional: 'the passes have torques of their own',
      },
      ...toleranceFields('no limits', 'no limits; nothing where only one is filled in'),
      {
        kind: 'rows',
        name: 'passes',
        label: 'Passes',
        optional: 'half the torque, then all of it, common practice',
        row: 'pass',
        columns: [
          {
            kind: 'text',
            name: 'to',
            label: 'To',
            hint: '50 %, 30 N·m, 60°, or check',
            figures: true,
          },
        ],
        least: 1,
        most: 20,
      },
    ],
  },
];
