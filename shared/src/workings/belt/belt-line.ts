import type {
  BeltGaps,
  BeltLimit,
  BeltLine,
  BeltLineRequest,
  DrivenPulley,
} from '../../contracts/belt-drive.js';
import { beltLine } from '../../belt-drive/belt-line.js';
import { printLength } from '../../belt-drive/print-length.js';
import { drawBeltLine } from '../../drawing/belt-line.js';
import { toSi } from '../../quantities/convert.js';
import { printNumber, printQuantity } from '../../quantities/print.js';
import { defineWorking } from '../define-working.js';
import type { CaseReader } from '../read-case.js';
import type { AnswerPart, WorkingOptions } from '../working.js';
import { beltLineSections, rims, usualNames } from './belt-line-fields.js';

/** Whether a belt's pulleys run in one plane, and what brings them there. */
export const beltLineWorking = defineWorking({
  key: 'belt-line',
  group: 'belt-drive',
  title: 'Belt line',
  asks: 'Do these pulleys run in one plane, and if not, which way must one move?',
  sections: beltLineSections,
  example: {
    typed: {
      driver: 'crank pulley',
      driverDiameter: '100 mm',
      name1: 'dynamo pulley',
      diameter1: '100 mm',
      span1: '500 mm',
      gap1driverFar: '0 mm',
      gap1driverNear: '0 mm',
      gap1drivenNear: '1.00 mm',
      gap1drivenFar: '1.87 mm',
    },
    from: 'a pulley-alignment table: 0.5° is 0.87 mm in 100 mm',
  },
  fromSpec: ({ belt }) => [
    {
      name: 'The belt',
      typed: {
        driverDiameter: printQuantity(belt.driverDiameter.value),
        diameter1: printQuantity(belt.drivenDiameter.value),
        span1: printQuantity(belt.span.value),
        ...(belt.offset.value.high === undefined
          ? {}
          : { offsetLimit: printQuantity(belt.offset.value.high) }),
      },
    },
  ],
  basis: [
    'Slope of a rim: difference of its two gaps over its diameter. Turned: difference of the two slopes’ angles. Out of plane: the driven groove’s middle from the driver’s plane carried over the span. Plane geometry.',
    '0.5°, which is 0.87 mm in 100 mm, for V-belts: a pulley-alignment maker’s table.',
  ],
  fieldOf: [
    [/^driver\.name/, 'driver'],
    [/^driver\.diameter/, 'driverDiameter'],
    [/^driver\.faceToGroove/, 'driverGroove'],
    ...([1, 2] as const).flatMap((n): (readonly [RegExp, string])[] => {
      const at = `^driven\\[${n - 1}\\]\\.`;
      return [
        [new RegExp(`${at}(name|diameter|span|shim)`), `$1${n}`],
        [new RegExp(`${at}faceToGroove`), `groove${n}`],
        [new RegExp(`${at}roomInFront`), `front${n}`],
        [new RegExp(`${at}roomBehind`), `behind${n}`],
        [new RegExp(`${at}gaps\\.(\\w+)`), `gap${n}$1`],
        [new RegExp(`${at}quarterTurn\\.(\\w+)`), `turned${n}$1`],
      ];
    }),
    [/^limit\.angle/, 'angleLimit'],
    [/^limit\.offsetPerSpan/, 'offsetLimit'],
  ],
  answer: (read, options) => {
    const request = requestOf(read);
    const answer = beltLine(request);
    return {
      parts: [
        { kind: 'judgement', verdict: answer.verdict, reason: answer.reason },
        {
          kind: 'steps',
          heading: 'What to do',
          steps: [...edgeWords(request), ...answer.pulleys.map(({ cure }) => cure.words)],
        },
        ...drawings(request, answer, options),
        tableOf(answer),
      ],
      assumed: [
        ...answer.assumed,
        ...(request.driven.length > 1 && request.limit?.offsetPerSpan !== undefined
          ? ['The limit out of plane is taken for the first span, and in proportion for the other.']
          : []),
      ],
      cautions: [
        'Take the battery’s {earth} {lead} off first, and keep hands out of belts and fan: an engine turned by hand can still fire.',
      ],
    };
  },
});

/** Two gaps of the driver that differ by more than this, metres, are of an edge that does not lie flat. */
const flat = 1e-6;

/** The straight edge is laid along the driver: where its own gaps differ, that comes first. */
function edgeWords({ driver, driven }: BeltLineRequest): readonly string[] {
  const leaning = driven
    .flatMap(({ gaps, quarterTurn }) => (quarterTurn === undefined ? [gaps] : [gaps, quarterTurn]))
    .find(({ driverNear, driverFar }) => Math.abs(toSi(driverNear) - toSi(driverFar)) > flat);
  if (leaning === undefined) return [];
  const { driverNear, driverFar } = leaning;
  return [
    `The straight edge does not lie flat on the ${driver.name}: ${printQuantity(driverFar)} at its far rim, ${printQuantity(driverNear)} at its near one. Lay it flat and measure again. If it cannot lie flat, the ${driver.name} or its shaft leans: put that right first.`,
  ];
}

function requestOf(read: CaseReader): BeltLineRequest {
  const driverGroove = read.quantityIf('driverGroove');
  const numbers = read.choice('pulleys') === 'three' ? ([1, 2] as const) : ([1] as const);
  const driven = numbers.map((n) => drivenOf(read, n));
  const limit = limitOf(read);
  return {
    driver: {
      name: read.textIf('driver') ?? usualNames[0],
      diameter: read.quantity('driverDiameter'),
      ...(driverGroove === undefined ? {} : { faceToGroove: driverGroove }),
    },
    driven,
    ...(limit === undefined ? {} : { limit }),
  };
}

function drivenOf(read: CaseReader, n: 1 | 2): DrivenPulley {
  const gaps = (prefix: string): BeltGaps =>
    Object.fromEntries(rims.map((rim) => [rim, read.quantity(`${prefix}${n}${rim}`)])) as unknown as BeltGaps;
  return {
    name: read.textIf(`name${n}`) ?? usualNames[n],
    diameter: read.quantity(`diameter${n}`),
    span: read.quantity(`span${n}`),
    gaps: gaps('gap'),
    quarterTurn: read.choice(`sets${n}`) === 'two' ? gaps('turned') : undefined,
    faceToGroove: read.quantityIf(`groove${n}`),
    shim: read.quantityIf(`shim${n}`),
    roomInFront: read.quantityIf(`front${n}`),
    roomBehind: read.quantityIf(`behind${n}`),
  };
}

function limitOf(read: CaseReader): BeltLimit | undefined {
  const [angle, offset, span] = [
    read.numberIf('angleLimit'),
    read.quantityIf('offsetLimit'),
    read.quantity('span1'),
  ];
  if (angle === undefined && offset === undefined) return undefined;
  return {
    angle,
    offsetPerSpan: offset === undefined || span.value === 0 ? undefined : toSi(offset) / toSi(span),
  };
}

function drawings(
  request: BeltLineRequest,
  answer: BeltLine,
  options: WorkingOptions,
): readonly AnswerPart[] {
  return answer.pulleys.map(({ name }, driven) => ({
    kind: 'drawing',
    caption: `${request.driver.name} and ${name}, from above`,
    drawing: drawBeltLine({ request, answer, driven }, options),
  }));
}

function tableOf({ pulleys }: BeltLine): AnswerPart {
  return {
    kind: 'table',
    heading: 'Found',
    columns: [
      { name: 'Pulley' },
      { name: 'Out of plane', figures: true },
      { name: 'In 100 mm', figures: true },
      { name: 'Turned', figures: true },
      { name: 'Run-out', figures: true },
      { name: 'Clears' },
    ],
    rows: pulleys.map(({ name, offset, offsetPerSpan, angle, runOut, clears }) => [
      name,
      `${printLength(Math.abs(toSi(offset)), offset.unit)}${wayOf(offset.value)}`,
      printQuantity({ value: Math.abs(offsetPerSpan) * 100, unit: 'mm' }, { digits: 2 }),
      turnWords(angle),
      runOut === null ? 'not measured' : `${printNumber(Math.abs(runOut), 2)}°`,
      clears === null ? 'not asked' : clears ? 'yes' : 'no',
    ]),
  };
}

function wayOf(offset: number): string {
  if (offset === 0) return '';
  return offset > 0 ? ' back' : ' forward';
}

function turnWords(angle: number): string {
  const figure = `${printNumber(Math.abs(angle), 2)}°`;
  if (Math.abs(angle) < 0.005) return figure;
  return `${figure}, far rim ${angle > 0 ? 'forward' : 'back'}`;
}
