import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { InputError } from '../contracts/input-error.js';
import { lashOrder } from '../valve-train/lash-order.js';
import { lifterPreload } from '../valve-train/lifter-preload.js';
import { pistonHeight } from '../valve-train/piston-position.js';
import { positiveStop } from '../valve-train/positive-stop.js';
import { shim } from '../valve-train/shim.js';
import { timingFigures } from '../valve-train/timing-figures.js';
import { valveClock } from '../valve-train/valve-clock.js';
import { whichTdc } from '../valve-train/which-tdc.js';
import { capDiagnosis } from './cap-diagnosis.js';
import { capMap } from './cap-map.js';
import { dwell } from './dwell.js';
import { leadTest } from './lead-test.js';
import { rotorCheck } from './rotor-check.js';
import { timingMarks } from './timing-marks.js';

type Request = Readonly<Record<string, unknown>>;
type Calculation = (request: Request) => unknown;

const mm = { value: 90, unit: 'mm' };
const cap = { firingOrder: [1, 3, 4, 2], rotation: 'clockwise' };
const engine = { firingOrder: [1, 3, 4, 2], valveTiming: { ivo: 10, ivc: 50, evo: 50, evc: 10 } };

const calculations = [
  [
    'cap-map',
    capMap,
    {
      ...cap,
      posts: [],
      firstPost: '1',
      intervals: [],
      trace: {},
      strokesPerCycle: 4,
      rotationSeenFrom: 'cap',
    },
  ],
  [
    'cap-diagnosis',
    capDiagnosis,
    {
      cap,
      fitted: { 1: 1, 2: 3, 3: 4, 4: 2 },
      fittedBy: 'post',
      valveTiming: engine.valveTiming,
      advance: 10,
    },
  ],
  [
    'valve-clock',
    valveClock,
    { ...engine, crank: 0, stroke: mm, rodLength: mm, intervals: [180, 180, 180, 180] },
  ],
  [
    'which-tdc',
    whichTdc,
    { ...engine, cylinder: 1, sightings: [[{ cylinder: 1, piston: 'top' }]], about: 0, tolerance: 10 },
  ],
  ['rotor-check', rotorCheck, { cap, rotorAngle: 0, timing: { advance: 10 }, cylinder: 1, tolerance: 5 }],
  [
    'lead-test',
    leadTest,
    { reading: 'open', kind: 'resistive', length: mm, nominal: {}, whole: {}, endFittings: {} },
  ],
  ['timing-marks', timingMarks, { diameter: mm, angle: 6, arc: mm }],
  ['dwell', dwell, { cylinders: 4, dwell: 60, crankSpeed: 3000 }],
  ['lash-order', lashOrder, { ...engine, valves: [{ valve: '1', cylinder: 1, type: 'inlet' }], margin: 15 }],
  [
    'timing-figures',
    timingFigures,
    { timing: engine.valveTiming, quotedAt: { lift: mm }, spec: {}, tolerance: 2, symmetrical: true },
  ],
  ['positive-stop', positiveStop, { forward: 330, back: 30 }],
  ['shim', shim, { fitted: mm, measured: mm, wanted: { low: mm, high: mm }, sizes: [mm] }],
  ['lifter-preload', lifterPreload, { turns: 1, pitch: mm, adjuster: 'pivot', rockerRatio: 1.5, limits: {} }],
  ['piston-height', pistonHeight, { stroke: mm, rodLength: mm, crank: 0, fromTop: mm, crankSpeed: 3000 }],
] as unknown as readonly (readonly [string, Calculation, Request])[];

const long = 'x'.repeat(1_000_000);
const hostile: readonly unknown[] = [
  null,
  NaN,
  Infinity,
  -Infinity,
  -1,
  1e308,
  long,
  '__proto__',
  true,
  [],
  [null],
  Array.from({ length: 1000 }, (_, i) => i + 1),
  Array.from({ length: 100_000 }, () => ({ valve: long, cylinder: 1, type: 'inlet' })),
  [[], [[]]],
  {},
  JSON.parse('{"__proto__": {"value": 1}, "constructor": 1, "prototype": 2}'),
  { value: NaN, unit: 'mm' },
  { value: 1e300, unit: 'mm' },
  { value: 1, unit: long },
  { value: '90', unit: 'mm' },
  Object.fromEntries(Array.from({ length: 5000 }, (_, i) => [`key${i}`, i])),
  { [long]: 1 },
];

/** The answer is the calculation's, or an error on a field with a message of readable length. */
function refusesOrAnswers(calculation: Calculation, request: unknown): void {
  try {
    calculation(request as Request);
  } catch (error) {
    if (!(error instanceof InputError)) throw error;
    expect(error.field).not.toBe('');
    expect(error.message.length).toBeLessThan(1500);
  }
}

describe.each(calculations)('%s', (_, calculation, good) => {
  it('refuses hostile values in any field with an error that names one', () => {
    for (const value of hostile) {
      refusesOrAnswers(calculation, value);
      for (const field of Object.keys(good)) refusesOrAnswers(calculation, { ...good, [field]: value });
    }
  });

  it('refuses a request with a thousand names, or none', () => {
    const many = Object.fromEntries(Array.from({ length: 1000 }, (_, i) => [`field${i}`, 1]));
    expect(() => calculation({ ...good, ...many })).toThrow(InputError);
    expect(() => calculation({})).toThrow(InputError);
  });

  it('refuses anything else', () => {
    const fields = Object.keys(good);
    fc.assert(
      fc.property(fc.constantFrom(...fields), fc.anything({ maxDepth: 4 }), (field, value) => {
        refusesOrAnswers(calculation, { ...good, [field]: value });
      }),
    );
  });
});
