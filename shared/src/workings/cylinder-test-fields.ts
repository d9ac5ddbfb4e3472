import type { FieldSection, WorkingCase } from './working.js';

export const isLeakDown = ({ test = 'compression' }: WorkingCase): boolean => test === 'leak-down';
const isCompression = (typed: WorkingCase): boolean => !isLeakDown(typed);

/** What is asked of a compression or leak-down test. */
export const cylinderFields: readonly FieldSection[] = [
  {
    heading: 'The test',
    fields: [
      {
        kind: 'choice',
        name: 'test',
        label: 'It was',
        choices: [
          { value: 'compression', words: 'a compression test' },
          { value: 'leak-down', words: 'a leak-down test' },
        ],
        starts: 'compression',
      },
      {
        kind: 'choice',
        name: 'gauge',
        label: 'The gauge reads in',
        choices: [
          { value: 'bar', words: 'bar' },
          { value: 'psi', words: 'psi' },
          { value: 'kPa', words: 'kPa' },
        ],
        starts: 'bar',
        when: isCompression,
      },
      {
        kind: 'rows',
        name: 'readings',
        label: 'Readings, in the order the cylinders stand',
        row: 'cylinder',
        least: 1,
        most: 24,
        columns: [
          { kind: 'text', name: 'cylinder', label: 'Cylinder', figures: true },
          { kind: 'text', name: 'dry', label: 'Dry', hint: 'pressure, or percent lost', figures: true },
          {
            kind: 'text',
            name: 'wet',
            label: 'With oil',
            optional: 'not tried',
            figures: true,
          },
          { kind: 'text', name: 'bank', label: 'Bank', optional: 'one bank' },
        ],
      },
      {
        kind: 'choice',
        name: 'rebuilt',
        label: 'Newly rebuilt',
        choices: [
          { value: 'no', words: 'no' },
          { value: 'yes', words: 'yes, the rings are not bedded' },
        ],
        starts: 'no',
      },
    ],
  },
  {
    heading: 'What is allowed',
    fields: [
      {
        kind: 'number',
        name: 'leastShare',
        label: 'Lowest at least',
        counts: '% of the highest',
        optional: '75 %, common practice',
        when: isCompression,
      },
      {
        kind: 'number',
        name: 'mostLeak',
        label: 'Most that may be lost',
        counts: '%',
        optional: 'no limit: the leaks are only compared',
        when: isLeakDown,
      },
      {
        kind: 'quantity',
        name: 'orifice',
        label: 'Orifice of this tester',
        of: 'length',
        unit: 'mm',
        optional: 'not known: a limit is then not applied',
        when: isLeakDown,
      },
      {
        kind: 'quantity',
        name: 'supply',
        label: 'Supply pressure of this tester',
        of: 'pressure',
        unit: 'psi',
        optional: 'not known',
        when: isLeakDown,
      },
      {
        kind: 'quantity',
        name: 'limitOrifice',
        label: 'Orifice that the limit is for',
        of: 'length',
        unit: 'mm',
        optional: 'not known: the limit is then not applied',
        when: isLeakDown,
      },
      {
        kind: 'quantity',
        name: 'limitSupply',
        label: 'Supply pressure that the limit is for',
        of: 'pressure',
        unit: 'psi',
        optional: 'not known',
        when: isLeakDown,
      },
    ],
  },
];
