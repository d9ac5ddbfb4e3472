import { proofStresses } from '../../fastening/tables/proof-stress.js';
import type { ChoiceField, FieldSection } from '../working.js';
import { intoField, isTapped, threadField, torqueField } from './fields.js';

const grades: ChoiceField['choices'] = [
  ...proofStresses.map(({ name, standard }) => ({
    value: name,
    words: standard === 'ISO 898-1' ? `class ${name}` : `SAE grade ${name.slice(-1)}`,
  })),
  { value: 'unknown', words: 'not known, or another' },
];

/** A grade as the field has it; what the tables don't have is not known. */
export const knownGrade = (grade: string): string =>
  grades.some(({ value }) => value === grade) ? grade : 'unknown';

const plainConditions = [
  { value: 'dry', words: 'dry' },
  { value: 'oiled', words: 'oiled' },
  { value: 'moly', words: 'with moly paste' },
] as const;

export const torqueDoubtSections: readonly FieldSection[] = [
  {
    heading: 'As printed',
    fields: [
      torqueField,
      {
        kind: 'quantity',
        name: 'alsoPrinted',
        label: 'The same in the other unit, as the page prints it',
        optional: 'nothing to compare',
        of: 'torque',
        unit: 'lbf·ft',
      },
    ],
  },
  {
    heading: 'The bolt, stud or nut',
    fields: [
      threadField,
      { kind: 'choice', name: 'grade', label: 'Class or grade', choices: grades, starts: 'unknown' },
      {
        kind: 'choice',
        name: 'use',
        label: 'What it does',
        choices: [
          { value: 'clamp', words: 'clamps parts together' },
          { value: 'plug', words: 'is a plug' },
          { value: 'union', words: 'is a union nut' },
          { value: 'gasket-cover', words: 'holds a cover on a soft gasket' },
          { value: 'to-yield', words: 'is tightened to yield' },
          { value: 'by-angle', words: 'is turned on by an angle' },
        ],
        starts: 'clamp',
      },
    ],
  },
  {
    heading: 'The threads',
    fields: [
      {
        kind: 'choice',
        name: 'condition',
        label: 'Threads as they go in',
        choices: [
          ...plainConditions,
          { value: 'thread-lock', words: 'with sealant or thread-lock' },
          { value: 'factor', words: 'plated or coated: by a nut factor' },
        ],
        starts: 'dry',
      },
      {
        kind: 'number',
        name: 'nutFactor',
        label: 'Nut factor',
        hint: 'From the maker of the coating; sources for plated bolts differ twofold, from 0.10 to 0.20',
        counts: '',
        when: ({ condition }) => condition === 'factor',
      },
      {
        kind: 'number',
        name: 'spread',
        label: 'The nut factor may be off by',
        optional: '30 % either way, common practice',
        counts: '%',
      },
      {
        kind: 'choice',
        name: 'printedFor',
        label: 'The torque is printed for threads',
        choices: [{ value: 'same', words: 'as they go in, or it does not say' }, ...plainConditions],
        starts: 'same',
      },
    ],
  },
  {
    heading: 'What it is screwed into',
    fields: [
      intoField,
      {
        kind: 'quantity',
        name: 'engagement',
        label: 'How far it screws in',
        optional: 'the female thread is not judged',
        of: 'length',
        unit: 'mm',
        when: isTapped,
      },
    ],
  },
];
