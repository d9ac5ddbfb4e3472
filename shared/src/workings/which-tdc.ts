import type { Sighting, TdcAnswer, WhichTdc, WhichTdcRequest } from '../contracts/calculations.js';
import { InputError } from '../contracts/input-error.js';
import type { Verdict } from '../contracts/verdict.js';
import { drawValveClock } from '../drawing/valve-clock.js';
import { firingAngles } from '../valve-train/firing-angles.js';
import { valveClock } from '../valve-train/valve-clock.js';
import { aroundTop } from '../valve-train/around-top.js';
import { whichTdc } from '../valve-train/which-tdc.js';
import { nameOf } from '../valve-train/words.js';
import { defineWorking } from './define-working.js';
import {
  cylinderOf,
  engineErrors,
  firingCase,
  firingOf,
  timingCase,
  timingOf,
  type TypedFiring,
} from './engine/engine-fields.js';
import { assumedEven, printAngle, sentencesOf } from './engine/engine-words.js';
import type { CaseReader } from './read-case.js';
import { sightingColumns, whichTdcSections } from './which-tdc-fields.js';
import { writeRows } from './rows.js';
import { spoken } from './wiring-map/spoken.js';
import type { AnswerPart, WorkingOptions } from './working.js';

const verdicts: Readonly<Record<TdcAnswer, Verdict>> = {
  'compression-tdc': 'pass',
  'exhaust-tdc': 'pass',
  'cannot-tell': 'not-judged',
  contradiction: 'doubtful',
};
const titles: Readonly<Record<TdcAnswer, string>> = {
  'compression-tdc': 'Compression TDC',
  'exhaust-tdc': 'Exhaust TDC',
  'cannot-tell': 'Cannot be told yet',
  contradiction: 'It contradicts itself',
};

/** Which of its two TDCs a cylinder is at, by what was seen. */
export const whichTdcWorking = defineWorking({
  key: 'which-tdc',
  group: 'valve-timing',
  title: 'Which TDC',
  asks: 'Is this cylinder at compression or at exhaust TDC?',
  sections: whichTdcSections,
  example: {
    typed: {
      order: '1-5-3-6-2-4',
      ivo: '10',
      ivc: '50',
      evo: '50',
      evc: '10',
      cylinder: '1',
      seen: writeRows(
        [
          { position: '1', cylinder: '1', piston: 'top' },
          { position: '1', cylinder: '6', rocking: 'yes' },
        ],
        sightingColumns.map(({ name }) => name),
      ),
    },
    from: 'TM 5-6115-400-12, figure 3-11: No. 6’s valves are watched to set No. 1',
  },
  fromSpec: (document) => [
    {
      name: 'The first cylinder of the order',
      typed: {
        ...firingCase(document),
        ...timingCase(document),
        cylinder: String(document.engine.firingOrder.value[0] ?? ''),
      },
    },
  ],
  basis: [
    'Where the valves’ events leave the crank, worked out as exact sets of angles; definition of the valve timing.',
    'A companion’s valves rock at compression TDC: TM 5-6115-400-12, figure 3-11.',
  ],
  fieldOf: [...engineErrors, [/^sightings/, 'seen'], [/^marksTogether/, 'marks']],
  answer: (read, options) => {
    const firing = firingOf(read);
    const request = requestOf(read, firing);
    const { answer, reason, next, windows } = whichTdc(request);
    return {
      parts: [
        { kind: 'judgement', of: titles[answer], verdict: verdicts[answer], reason: spoken(reason) },
        ...(next === undefined
          ? []
          : [
              {
                kind: 'steps' as const,
                heading: answer === 'cannot-tell' ? 'Look for this next' : 'Then',
                steps: sentencesOf(spoken(next)),
              },
            ]),
        ...(windows.length === 0
          ? []
          : [
              {
                kind: 'facts' as const,
                heading: 'Where it may stand in its own cycle, 0° its compression TDC',
                facts: standsAt(answer, windows).map((value, i, all) => ({
                  name: all.length === 1 ? 'From and to' : `Place ${i + 1}`,
                  value,
                })),
              },
            ]),
        ...clockThen(request, answer, options),
      ],
      assumed: [
        ...assumedEven(firing.intervals),
        'Between two positions the crank was turned the normal way, by less than one turn.',
        ...topTaken(request, answer),
        ...(request.isRowByRow
          ? ['Each thing was seen after the one above it, the crank turned on between them.']
          : []),
        ...(read.numberIf('tolerance') === undefined
          ? ['Everything seen may be 10° of crank off: common practice.']
          : []),
        ...(read.numberIf('about') === undefined ? ['The question is of the last position.'] : []),
      ],
      cautions: ['Take the plugs out and switch the ignition off before turning the engine by hand.'],
    };
  },
});

/** The whole engine with the cylinder at the TDC that was told. */
function clockThen(
  request: WhichTdcRequest,
  answer: TdcAnswer,
  options: WorkingOptions,
): readonly AnswerPart[] {
  if (answer !== 'compression-tdc' && answer !== 'exhaust-tdc') return [];
  const { firingOrder, intervals, valveTiming, cylinder } = request;
  const firing = firingAngles(firingOrder, intervals).find((one) => one.cylinder === cylinder);
  const crank = ((firing?.firesAt ?? 0) + (answer === 'exhaust-tdc' ? 360 : 0)) % 720;
  const clock = { firingOrder, valveTiming, crank, ...(intervals && { intervals }) };
  return [
    {
      kind: 'drawing',
      caption: 'What every valve does at that TDC: look whether it is so',
      drawing: drawValveClock({ request: clock, clock: valveClock(clock) }, options),
    },
  ];
}

/** That the piston is at a TDC at all, where neither it nor the marks were looked at. */
function topTaken(
  { cylinder, sightings, about, marksTogether }: WhichTdcRequest,
  answer: TdcAnswer,
): readonly string[] {
  const told = answer === 'compression-tdc' || answer === 'exhaust-tdc';
  const seen = sightings[about ?? sightings.length - 1] ?? [];
  const looked = seen.some((one) => one.cylinder === cylinder && one.piston === 'top');
  return told && !looked && marksTogether === undefined
    ? [`${upperFirst(nameOf(cylinder))}’s piston is taken to be at the top: it was not looked at.`]
    : [];
}

const upperFirst = (words: string): string => words.charAt(0).toUpperCase() + words.slice(1);

/** About the TDC that was told, else as ranges of the cycle. */
function standsAt(answer: TdcAnswer, windows: WhichTdc['windows']): readonly string[] {
  const around =
    answer === 'compression-tdc'
      ? aroundTop(windows, 0)
      : answer === 'exhaust-tdc'
        ? aroundTop(windows, 360)
        : undefined;
  return around === undefined ? rangesOf(windows) : [around];
}

/** The windows as ranges; one that was split at 720° is one again. */
function rangesOf(windows: WhichTdc['windows']): readonly string[] {
  const [first, last] = [windows[0], windows.at(-1)];
  const isSplit = windows.length > 1 && first?.[0] === 0 && last?.[1] === 720;
  const joined = isSplit && first && last ? [...windows.slice(1, -1), [last[0], first[1]] as const] : windows;
  return joined.map(([from, to]) => `${printAngle(from)} to ${printAngle(to)}`);
}

type TypedRequest = WhichTdcRequest & { readonly isRowByRow: boolean };

function requestOf(read: CaseReader, firing: TypedFiring): TypedRequest {
  const { rows, isRowByRow } = placed(read.rows('seen'));
  const positions = [...new Set(rows.map(({ position }) => position))].sort((a, b) => a - b);
  const [about, tolerance] = [read.numberIf('about'), read.numberIf('tolerance')];
  const marks = read.choice<'-' | 'compression' | 'exhaust'>('marks');
  const asked = about === undefined ? undefined : positions.indexOf(about);
  if (asked === -1)
    throw new InputError('about', `Nothing was seen at that position; there are ${positions.join(', ')}.`);
  return {
    ...firing,
    valveTiming: timingOf(read),
    cylinder: cylinderOf(read.text('cylinder'), firing),
    sightings: positions.map((position) =>
      rows.filter((one) => one.position === position).map(({ row }) => sightingOf(row, firing)),
    ),
    ...(asked === undefined ? {} : { about: asked }),
    ...(tolerance === undefined ? {} : { tolerance }),
    ...(marks === '-' ? {} : { marksTogether: marks }),
    isRowByRow,
  };
}

/**
 * Each row with its position. With none typed each row is a position of its own; else a row without one is at that
 * of the row above.
 */
function placed(rows: readonly CaseReader[]): {
  readonly rows: readonly { readonly row: CaseReader; readonly position: number }[];
  readonly isRowByRow: boolean;
} {
  const isBlank = rows.every((row) => row.numberIf('position') === undefined);
  let above = 1;
  return {
    rows: rows.map((row, i) => {
      above = isBlank ? i + 1 : (row.numberIf('position') ?? above);
      return { row, position: above };
    }),
    isRowByRow: isBlank && rows.length > 1,
  };
}

function sightingOf(row: CaseReader, firing: TypedFiring): Sighting {
  const seen = <T extends string>(name: string): T | undefined => {
    const chosen = row.choice<T | '-'>(name);
    return chosen === '-' ? undefined : chosen;
  };
  const [inlet, exhaust] = [
    seen<NonNullable<Sighting['inlet']>>('inlet'),
    seen<NonNullable<Sighting['exhaust']>>('exhaust'),
  ];
  const piston = seen<NonNullable<Sighting['piston']>>('piston');
  return {
    cylinder: cylinderOf(row.text('cylinder'), firing),
    ...(inlet && { inlet }),
    ...(exhaust && { exhaust }),
    ...(piston && { piston }),
    ...(seen('rocking') === undefined ? {} : { rocking: true as const }),
    ...(seen('pressure') === undefined ? {} : { pressure: true as const }),
  };
}
