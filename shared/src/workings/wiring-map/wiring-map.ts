import { drawCap } from '../../drawing/cap.js';
import { drawSparkStrip } from '../../drawing/spark-strip.js';
import { cureInWords } from '../../ignition/cure-in-words.js';
import type { SpecDocument } from '../../contracts/spec.js';
import type {
  AnswerPart,
  FieldSection,
  TextField,
  Working,
  WorkingAnswer,
  WorkingOptions,
} from '../working.js';
import { causeTitles, swapCaption, swapLines } from './diagnosis-words.js';
import { formOfDocument } from './form-of-spec.js';
import { companionWords, intervalWords, leadRows } from './map-words.js';
import { fromQuery, toCase } from './query.js';
import { spoken } from './spoken.js';
import { sayAngles, sayBeside, sayFitted, sayTrace, sayValves, sayView } from './spoken-fields.js';
import type { FormErrors, FormField } from './wiring-form.js';
import { workOut, type WiringAnswer } from './work-out.js';

const text = (name: string, label: string, optional = '', says?: TextField['says']): TextField => ({
  kind: 'text',
  name,
  label,
  optional,
  figures: true,
  ...(says && { says }),
});

const sections: readonly FieldSection[] = [
  {
    heading: 'What the engine has',
    fields: [
      text('spec', 'Spec', 'typed in'),
      text('edition', 'Edition of the spec', 'none'),
      text('cylinders', 'Cylinders', '4'),
      text('order', 'Firing order'),
      text('turns', 'Rotor turns'),
      text('from', 'Seen from', 'the outside of the cap', sayView),
      text('posts', 'Posts, degrees from the mark', '', sayAngles),
      text('at', 'First post, degrees from the mark', '0', sayAngles),
      text('first', 'Post for the first cylinder', '', sayAngles),
      text('intervals', 'Intervals, degrees of crank'),
      text('trace', 'Cap traced, post to {outlet}', '', sayTrace),
      text('beside', '{Outlets} beside posts', 'as the drawing letters them', sayBeside),
      text('advance', 'Static timing, degrees before TDC', '10', sayAngles),
      text('valves', 'Valve timing', '', sayValves),
    ],
  },
  {
    heading: '{Leads} as fitted',
    fields: [text('fitted', '{Leads} as fitted, {outlet} to cylinder', '', sayFitted)],
  },
];

/** The names of the case by the fields of the form that they are read into, where they differ. */
const caseNames: Readonly<Partial<Record<FormField, string>>> = {
  seenFrom: 'from',
  angles: 'posts',
  firstAngle: 'at',
  ivo: 'valves',
  ivc: 'valves',
  evo: 'valves',
  evc: 'valves',
};

/** The plug-lead wiring map. The page has a form of its own; a case is what its address holds. */
export const wiringMapWorking: Working = {
  key: 'wiring-map',
  group: 'wiring',
  title: 'Wiring map',
  asks: 'Which {lead} goes where on the cap, and if they are fitted already, what is wrong with them?',
  sections,
  example: {
    // A cap with side outlets, its trace drawn; 3 and 1 are on each other's outlets.
    typed: {
      cylinders: '4',
      order: '1-3-4-2',
      turns: 'anticlockwise',
      from: 'cap',
      at: '45',
      first: '315',
      advance: '10',
      fitted: '315:1,225:3,135:4,45:2',
    },
    from: 'common practice, no source: 1-3-4-2 against the clock',
  },
  fromSpec: (document: SpecDocument) => [
    { name: 'The engine, nothing fitted', typed: toCase(formOfDocument(document)) },
  ],
  workOut: (typed, options): WorkingAnswer => {
    const answer = workOut(fromQuery((name) => typed[name] ?? null));
    return {
      errors: namedAsInCase(answer.errors),
      missing: answer.missing,
      parts: answer.map === null ? [] : partsOf(answer, options),
      assumed: assumedBy(answer),
      cautions: answer.diagnosis?.cautions.map(spoken) ?? [],
      basis: [
        'The rotor meets the posts in the firing order, turning at half crank speed (four-stroke): common practice, no source.',
        'Angles clockwise from the cap’s mark, looking at the outside of the cap.',
      ],
    };
  },
};

function namedAsInCase(errors: FormErrors): Readonly<Record<string, string>> {
  return Object.fromEntries(
    Object.entries(errors).map(([field, message]) => [caseNames[field as FormField] ?? field, message]),
  );
}

function partsOf(answer: WiringAnswer, options: WorkingOptions): readonly AnswerPart[] {
  return [...judgementOf(answer), ...drawingsOf(answer, options), ...tableOf(answer)];
}

function judgementOf({ map, diagnosis, fitted }: WiringAnswer): readonly AnswerPart[] {
  if (map === null) return [];
  if (diagnosis === null || fitted === null) {
    return [
      {
        kind: 'judgement',
        verdict: map.verdict,
        ...(map.verdict === 'pass' ? { word: 'Map worked out' } : {}),
        reason: spoken(map.reason),
      },
    ];
  }
  const also = diagnosis.alsoFits.map((cause) => causeTitles[cause]).join(', ');
  return [
    {
      kind: 'judgement',
      of: causeTitles[diagnosis.cause],
      verdict: diagnosis.verdict,
      reason: spoken(diagnosis.reason.replace(cureInWords(diagnosis.swaps), '').trim()),
    },
    ...(diagnosis.swaps.length === 0
      ? []
      : [
          {
            kind: 'steps' as const,
            heading: swapCaption(diagnosis.swaps.length),
            steps: swapLines(fitted, diagnosis.swaps),
          },
        ]),
    ...(also === ''
      ? []
      : [
          {
            kind: 'facts' as const,
            facts: [{ name: 'It also fits', value: also, note: 'the cure is the same' }],
          },
        ]),
  ];
}

function drawingsOf(
  { map, cap, fitted, diagnosis, valveTiming, advance }: WiringAnswer,
  options: WorkingOptions,
): readonly AnswerPart[] {
  if (map === null || cap === null) return [];
  const asFitted = fitted === null ? {} : { fitted, fittedBy: 'outlet' as const };
  const drawing = drawCap(
    { map, request: cap, ...asFitted, diagnosis: diagnosis ?? undefined, showRequired: true },
    options,
  );
  const caption = 'Cap from above, where the {leads} plug in. Angles clockwise from the mark.';
  const strip =
    diagnosis === null ? null : drawSparkStrip({ request: { valveTiming, advance }, diagnosis }, options);
  return [
    { kind: 'drawing', caption, drawing },
    ...(strip === null
      ? []
      : [
          {
            kind: 'drawing' as const,
            caption: 'Where each spark falls, in its own cylinder’s cycle',
            drawing: strip,
          },
        ]),
  ];
}

function tableOf({ map, cap, diagnosis }: WiringAnswer): readonly AnswerPart[] {
  if (map === null) return [];
  const companions = companionWords(map);
  const traced = cap?.trace !== undefined;
  const rows = leadRows(map, diagnosis).map(({ post, outlet, cylinder, firesAt, fitted }) => [
    post,
    ...(traced ? [outlet] : []),
    cylinder,
    ...(fitted === null ? [firesAt] : [fitted.cylinder, fitted.spark, fitted.valves]),
  ]);
  const columns = [
    { name: 'Post', figures: true as const },
    ...(traced ? [{ name: '{Outlet}', figures: true as const }] : []),
    { name: diagnosis === null ? 'Cylinder' : 'Should be', figures: true as const },
    ...(diagnosis === null
      ? [{ name: 'Fires at, crank after the first', figures: true as const }]
      : [{ name: 'Fitted', figures: true as const }, { name: 'Spark falls' }, { name: 'Valves then' }]),
  ];
  return [
    { kind: 'table', heading: '{Leads}, a row a post', columns, rows },
    {
      kind: 'facts',
      facts: [
        { name: 'Sparks', value: intervalWords(map) },
        ...(companions === null
          ? []
          : [{ name: 'Companions, whose pistons rise together', value: companions }]),
      ],
    },
  ];
}

function assumedBy({ map, cap, diagnosis, advance, valveTiming }: WiringAnswer): readonly string[] {
  if (map === null || cap === null) return [];
  return [
    ...(cap.intervals === undefined ? ['The engine fires evenly.'] : []),
    ...(cap.trace === undefined ? ['Each post leads to the {outlet} above it: the cap was not traced.'] : []),
    ...(diagnosis === null
      ? []
      : [
          `Each spark is judged where it falls, ${advance ?? 10}° before TDC.`,
          ...(valveTiming === undefined
            ? ['No valve timing was given, so what the valves do at a spark is not known.']
            : []),
        ]),
  ];
}
