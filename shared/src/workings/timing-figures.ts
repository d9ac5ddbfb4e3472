import type { QuotedAt, TimingFigures } from '../contracts/valve-figures.js';
import type { SpecDocument } from '../contracts/spec.js';
import { printQuantity } from '../quantities/print.js';
import { timingFigures } from '../valve-train/timing-figures.js';
import { defineWorking } from './define-working.js';
import { timingCase, timingFields, timingOf } from './engine/engine-fields.js';
import { printAngle } from './engine/engine-words.js';
import type { CaseReader } from './read-case.js';
import { spoken } from './wiring-map/spoken.js';
import type { AnswerPart, WorkingCase, WorkingField } from './working.js';

const hasSpec = ({ compare = '' }: WorkingCase): boolean => compare === 'yes';

function quotedFields(prefix: string, when?: WorkingField['when']): readonly WorkingField[] {
  return [
    {
      kind: 'choice',
      name: `${prefix}by`,
      label: 'Quoted',
      choices: [
        { value: 'lift', words: 'at a lift of the valve' },
        { value: 'lash', words: 'with a {clearance} set' },
      ],
      starts: 'lift',
      ...(when && { when }),
    },
    { kind: 'quantity', of: 'length', unit: 'mm', name: `${prefix}at`, label: 'Of', ...(when && { when }) },
  ];
}

/** Durations and lobe centres of a camshaft, and how it stands against its spec. */
export const timingFiguresWorking = defineWorking({
  key: 'timing-figures',
  group: 'valve-timing',
  title: 'Timing figures',
  asks: 'What do these four valve events make of the camshaft, and is it timed as the spec has it?',
  sections: [
    {
      heading: 'As measured',
      fields: [
        ...timingFields(),
        ...quotedFields(''),
        {
          kind: 'choice',
          name: 'symmetrical',
          label: 'The lobes are',
          choices: [
            { value: 'yes', words: 'symmetrical, or taken so' },
            { value: 'no', words: 'not symmetrical' },
          ],
          starts: 'yes',
        },
      ],
    },
    {
      heading: 'Against a spec',
      fields: [
        {
          kind: 'choice',
          name: 'compare',
          label: 'Hold it against a spec',
          choices: [
            { value: 'no', words: 'no' },
            { value: 'yes', words: 'yes' },
          ],
          starts: 'no',
        },
        ...timingFields('spec-').map((field) => ({ ...field, when: hasSpec })),
        ...quotedFields('spec-', hasSpec),
        {
          kind: 'number',
          name: 'tolerance',
          label: 'Each event may be off by',
          counts: '°',
          optional: '2° of crank, common practice',
          when: hasSpec,
        },
      ],
    },
  ],
  example: {
    typed: { ivo: '7', ivc: '39', evo: '51', evc: '3', by: 'lift', at: '1 mm' },
    from: 'article on camshaft duration: 7/39 and 51/3 give 226° and 234°',
  },
  fromSpec: (document) => [
    { name: 'To be held against the engine’s figures', typed: fromDocument(document) },
  ],
  basis: [
    'Duration = opens + 180° + closes; overlap = IVO + EVC; lobe centre = duration ÷ 2 − IVO (or − EVC); separation their mean: definition.',
    'Advance = separation − {inlet} lobe centre. Figures quoted at different lifts or {clearances} are not compared.',
  ],
  fieldOf: [
    [/^timing\.ivo/, 'ivo'],
    [/^timing\.ivc/, 'ivc'],
    [/^timing\.evo/, 'evo'],
    [/^timing\.evc/, 'evc'],
    [/^quotedAt/, 'at'],
    [/^spec\.timing\.ivo/, 'spec-ivo'],
    [/^spec\.timing\.ivc/, 'spec-ivc'],
    [/^spec\.timing\.evo/, 'spec-evo'],
    [/^spec\.timing\.evc/, 'spec-evc'],
    [/^spec\.quotedAt/, 'spec-at'],
  ],
  answer: (read) => {
    const isCompared = read.choice('compare') === 'yes';
    const tolerance = read.numberIf('tolerance');
    const figures = timingFigures({
      timing: timingOf(read),
      quotedAt: quotedAt(read, ''),
      symmetrical: read.choice('symmetrical') === 'yes',
      ...(isCompared ? { spec: { timing: timingOf(read, 'spec-'), quotedAt: quotedAt(read, 'spec-') } } : {}),
      ...(tolerance === undefined ? {} : { tolerance }),
    });
    return {
      parts: [
        ...(isCompared
          ? [{ kind: 'judgement' as const, verdict: figures.verdict, reason: spoken(figures.reason) }]
          : []),
        factsOf(figures),
        ...lateTable(figures),
      ],
      assumed: figures.assumed.map(spoken),
    };
  },
});

function quotedAt(read: CaseReader, prefix: string): QuotedAt {
  const at = read.quantity(`${prefix}at`);
  return read.choice(`${prefix}by`) === 'lift' ? { lift: at } : { lash: at };
}

function factsOf({ duration, overlap, lobeCentre, lobeSeparation, advance }: TimingFigures): AnswerPart {
  const stands = Math.abs(advance) < 0.05 ? 'straight up' : advance > 0 ? 'advanced' : 'retarded';
  return {
    kind: 'facts',
    heading: 'The camshaft',
    facts: [
      { name: '{Inlet} duration', value: printAngle(duration.inlet) },
      { name: 'Exhaust duration', value: printAngle(duration.exhaust) },
      {
        name: 'Overlap',
        value: printAngle(overlap),
        ...(overlap < 0 ? { note: 'both valves are shut between the two' } : {}),
      },
      { name: '{Inlet} lobe centre', value: printAngle(lobeCentre.inlet), note: 'after TDC' },
      { name: 'Exhaust lobe centre', value: printAngle(lobeCentre.exhaust), note: 'before TDC' },
      { name: 'Lobe separation', value: printAngle(lobeSeparation), note: 'of camshaft' },
      {
        name: 'The camshaft stands',
        value: stands === 'straight up' ? stands : `${printAngle(Math.abs(advance))} ${stands}`,
      },
    ],
  };
}

function lateTable({ late }: TimingFigures): readonly AnswerPart[] {
  if (late === undefined) return [];
  const row = (name: string, by: number): readonly string[] => [
    name,
    Math.abs(by) < 0.05 ? 'right' : `${printAngle(Math.abs(by))} ${by > 0 ? 'late' : 'early'}`,
  ];
  return [
    {
      kind: 'table',
      heading: 'Against the spec',
      columns: [{ name: 'Event' }, { name: 'Measured is', figures: true }],
      rows: [
        row('{Inlet} opens', late.ivo),
        row('{Inlet} closes', late.ivc),
        row('Exhaust opens', late.evo),
        row('Exhaust closes', late.evc),
      ],
    },
  ];
}

function fromDocument(document: SpecDocument): Record<string, string> {
  const { lift, lash } = document.valveTrain.timingQuotedAt.value;
  const at = lift ?? lash;
  const by = lift === undefined ? 'lash' : 'lift';
  return {
    compare: 'yes',
    ...timingCase(document, 'spec-'),
    by,
    'spec-by': by,
    ...(at === undefined ? {} : { at: printQuantity(at), 'spec-at': printQuantity(at) }),
  };
}
