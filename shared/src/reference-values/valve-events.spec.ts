import { describe, expect, it } from 'vitest';
import type { Cylinder, ValveTiming } from '../contracts/calculations.js';
import type { ListedValve } from '../contracts/valve-figures.js';
import { timingMarks } from '../ignition/timing-marks.js';
import { lashOrder } from '../valve-train/lash-order.js';
import { pistonHeight } from '../valve-train/piston-position.js';
import { positiveStop } from '../valve-train/positive-stop.js';
import { timingFigures } from '../valve-train/timing-figures.js';
import { valveClock } from '../valve-train/valve-clock.js';
import { apart } from './apart.js';
import { checksOf } from './checks.js';

const checks = checksOf('Valve events and crank geometry');
const mm = (value: number) => ({ value, unit: 'mm' }) as const;
const inches = (value: number) => ({ value, unit: 'in' }) as const;

const figuresOf = (ivo: number, ivc: number, evo: number, evc: number) =>
  timingFigures({ timing: { ivo, ivc, evo, evc }, quotedAt: { lift: mm(1) } });

function named(...events: readonly [number, number, number, number]): Record<string, number> {
  const { duration, overlap, lobeCentre, lobeSeparation } = figuresOf(...events);
  return {
    intake_duration: duration.inlet,
    exhaust_duration: duration.exhaust,
    overlap,
    intake_centreline_ATDC: lobeCentre.inlet,
    exhaust_centreline_BTDC: lobeCentre.exhaust,
    lobe_separation: lobeSeparation,
  };
}

const four = [1, 3, 4, 2];
const six = [1, 5, 3, 6, 2, 4];
const usual: ValveTiming = { ivo: 10, ivc: 50, evo: 50, evc: 10 };

function mates(): Record<string, number> {
  const valves = ['E', 'I', 'I', 'E', 'E', 'I', 'I', 'E'].map((letter, i): ListedValve => ({
    valve: String(i + 1),
    cylinder: Math.floor(i / 2) + 1,
    type: letter === 'E' ? 'exhaust' : 'inlet',
  }));
  const answer = lashOrder({ firingOrder: four, valveTiming: usual, valves });
  return Object.fromEntries(answer.mates.map(({ set, whenFullyOpen }) => [set, Number(whenFullyOpen)]));
}

/** The valves that stay shut from 60° before a crank angle to 60° after it. */
function settable(crank: number): readonly string[] {
  const looks = Array.from({ length: 121 }, (_, i) =>
    valveClock({ firingOrder: four, valveTiming: usual, crank: crank - 60 + i }),
  );
  return four.flatMap((cylinder) =>
    (['inlet', 'exhaust'] as const).flatMap((valve) => {
      const shut = looks.every(
        ({ cylinders }) => cylinders.find((one) => one.cylinder === cylinder)?.[valve] === 'shut',
      );
      return shut ? [`${valve === 'inlet' ? 'I' : 'E'}${cylinder}`] : [];
    }),
  );
}

/** For each cylinder, the one whose valves rock while it fires. */
function rocking(firingOrder: readonly Cylinder[]): Record<string, Cylinder | undefined> {
  const pairs = firingOrder.map((cylinder, i): [string, Cylinder | undefined] => {
    const crank = (i * 720) / firingOrder.length;
    const { cylinders } = valveClock({ firingOrder, valveTiming: usual, crank });
    const rocks = cylinders.find(({ inlet, exhaust }) => inlet === 'opening' && exhaust === 'closing');
    return [String(cylinder), rocks?.cylinder];
  });
  return Object.fromEntries(pairs);
}

const long = { stroke: inches(3.307), rodLength: inches(6.024), crankSpeed: 6000 };
const fastest = pistonHeight({ ...long, crank: 0 });
const hundred = { stroke: mm(100), rodLength: mm(150) };
const drop = (crank: number): number => pistonHeight({ ...hundred, crank }).fromTop.value;

const run: Readonly<Record<string, () => unknown>> = {
  'T3-001': () => named(20, 35, 35, 10),
  'T3-002': () => named(7, 39, 51, 3),
  'T3-003': () => named(5, 45, 45, 5),
  'T3-004': () => named(15, 35, 40, 5),
  'T3-005': () => named(40, 60, 60, 40),
  'T3-008': () => figuresOf(7, 39, 51, 3).duration.exhaust,
  'T3-013': () => figuresOf(15, 50, 50, 15).overlap,
  // The stop caught the piston 36.75° before the wheel's zero and 35.25° after it.
  'T3-016': () => positiveStop({ forward: 360 - 36.75, back: 35.25 }).correction,
  'T3-019': () => positiveStop({ forward: 350, back: 14 }).tdc,
  'T3-020': mates,
  'T3-024': () => settable(0),
  'T3-025': () => settable(360),
  'T3-028': () => rocking(six),
  'T3-029': () => rocking(four),
  'T3-030': () => fastest.pinHeight.value,
  // 6 · 6000 degrees a second.
  'T3-032': () => fastest.greatestSpeedAt / 36_000,
  'T3-033': () => pistonHeight({ ...long, crank: fastest.greatestSpeedAt }).pinHeight.value,
  'T3-034': () => [0.0254, 0.44704].map((metresASecond) => (fastest.greatestSpeed ?? NaN) / metresASecond),
  'T3-038': () => pistonHeight({ stroke: mm(4), rodLength: mm(6), crank: 0 }).greatestSpeedAt,
  'T3-040': () => drop(10),
  'T3-041': () => drop(30),
  'T3-044': () => drop(90),
  'T3-045': () => drop(120),
  'T3-046': () => drop(180),
  'T3-047': () => pistonHeight({ ...hundred, fromTop: mm(50) }).crank,
  'T3-049': () => timingMarks({ diameter: inches(6.6875), angle: 6 }).arc.value,
  'T3-051': () => timingMarks({ diameter: inches(8), angle: 6 }).arcPerDegree.value,
};

const approximate = 'A textbook’s approximation for long rods; the product has the exact motion.';
const notRun: Readonly<Record<string, string>> = {
  'T3-035': approximate,
  'T3-036': approximate,
};

/** The valves that may be set are a set: the order in which they are printed means nothing. */
const inOrder = (value: unknown): unknown =>
  Array.isArray(value) && value.every((one) => typeof one === 'string')
    ? [...(value as string[])].sort()
    : value;

describe('worked out from outside', () => {
  it.each(Object.entries(run))('%s', (id, work) => {
    const check = checks.get(id);
    expect(check?.recomputed).toBe(true);
    expect(apart(inOrder(work()), inOrder(check?.expected))).toBeLessThan(1e-9);
  });
});

it('has the greatest speed nearer to where the acceleration is nothing than T3-038 prints', () => {
  // The condition for no acceleration of r cos θ + √(l² − r² sin² θ), r = 2, l = 6. The printed root was found by
  // searching for a maximum, which is flat: it is right to 8 decimals.
  const acceleration = (degrees: number): number => {
    const angle = (degrees * Math.PI) / 180;
    const [sine, ratio] = [Math.sin(angle), 2 / 6];
    const lean = 1 - (ratio * sine) ** 2;
    return Math.cos(angle) * lean ** 1.5 + ratio * (Math.cos(2 * angle) + ratio ** 2 * sine ** 4);
  };
  const ours = run['T3-038']?.() as number;
  expect(Math.abs(acceleration(ours))).toBeLessThan(1e-14);
  expect(Math.abs(acceleration(checks.get('T3-038')?.expected as number))).toBeGreaterThan(1e-12);
});

it('is every check of the topic, run or with the reason why not', () => {
  expect([...Object.keys(run), ...Object.keys(notRun)].sort()).toEqual([...checks.keys()].sort());
});
