import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { LashOrderRequest, ListedValve, ValveType } from '../contracts/valve-figures.js';
import { isOpen, phaseOf, valveEvents } from './phase.js';
import { lashOrder } from './lash-order.js';

const usual = { ivo: 10, ivc: 50, evo: 50, evc: 10 };

/** Valves numbered from the front, two a cylinder: `E I I E …`. */
function valvesOf(layout: string): readonly ListedValve[] {
  return layout.split(' ').map((letter, i) => ({
    valve: String(i + 1),
    cylinder: Math.floor(i / 2) + 1,
    type: letter === 'E' ? 'exhaust' : 'inlet',
  }));
}

const four = { firingOrder: [1, 3, 4, 2], valveTiming: usual, valves: valvesOf('E I I E E I I E') };
const six = { firingOrder: [1, 5, 3, 6, 2, 4], valveTiming: usual };

const sums = (request: LashOrderRequest): readonly number[] =>
  lashOrder(request).mates.map(({ set, whenFullyOpen }) => Number(set) + Number(whenFullyOpen));

describe('mates', () => {
  it('are those of the rule of nine on a mirrored four', () => {
    // T3-020, R9O and R9A: 1↔8, 2↔7, 3↔6, 4↔5.
    expect(sums(four)).toEqual([9, 9, 9, 9, 9, 9, 9, 9]);
  });

  it('are those of the rule of thirteen on a mirrored six', () => {
    // The trade's rule, from memory; no printed source.
    const valves = valvesOf('E I E I E I I E I E I E');
    expect(new Set(sums({ ...six, valves }))).toEqual(new Set([13]));
  });

  it.each([
    ['four', four, 'E I E I E I E I'],
    ['six', six, 'E I E I E I E I E I E I'],
  ])('follow no rule where the valves of a %s are not laid out as a mirror', (_, engine, layout) => {
    const valves = valvesOf(layout);
    const { mates } = lashOrder({ ...engine, valves });
    expect(new Set(sums({ ...engine, valves })).size).toBeGreaterThan(1);
    // By definition: the like valve of the companion, two places from the other end.
    const pairs = valves.length + 2;
    expect(mates[0]).toEqual({ set: '1', whenFullyOpen: String(pairs - 3) });
  });

  it('are 360° apart, not half the order on: none on an odd-fire ten', () => {
    // T2-037: five intervals of 54 and 90 in turn are 342 or 378, never 360.
    const firingOrder = [1, 10, 9, 4, 3, 6, 5, 8, 7, 2];
    const intervals = [54, 90, 54, 90, 54, 90, 54, 90, 54, 90];
    const valves = valvesOf(Array.from({ length: 10 }, () => 'E I').join(' '));
    const { mates, stops } = lashOrder({ firingOrder, intervals, valveTiming: usual, valves });
    expect(mates.every(({ whenFullyOpen }) => whenFullyOpen === null)).toBe(true);
    expect(stops.flatMap(({ set }) => set)).toHaveLength(20);
  });

  it('go first with first where a cylinder has several like valves', () => {
    const valves = [1, 2].flatMap((cylinder) =>
      (['inlet', 'inlet', 'exhaust'] as const).map((type, i): ListedValve => ({
        valve: `${cylinder}${type}${i}`,
        cylinder,
        type,
      })),
    );
    const { mates } = lashOrder({ firingOrder: [1, 2], valveTiming: usual, valves });
    expect(mates.map(({ whenFullyOpen }) => whenFullyOpen)).toEqual([
      '2inlet0',
      '2inlet1',
      '2exhaust2',
      '1inlet0',
      '1inlet1',
      '1exhaust2',
    ]);
  });
});

describe('stops', () => {
  it('are the two of the trade on a four whose margin leaves just these', () => {
    // T3-024 and T3-025, VA4: at No. 1's firing TDC I1 E1 I2 E3, a turn on E2 I3 I4 E4, 60° clear of every event.
    const { stops } = lashOrder({ ...four, margin: 60 });
    expect(stops).toHaveLength(2);
    const names = ['E1', 'I1', 'I2', 'E2', 'E3', 'I3', 'I4', 'E4'];
    const sets = stops.map(({ set }) => set.map((valve) => names[Number(valve) - 1] ?? '').sort());
    const at = (crank: number): readonly string[] =>
      four.valves
        .filter(({ cylinder, type }) => isClear(four, cylinder as number, type, crank, 60))
        .map(({ valve }) => names[Number(valve) - 1] ?? '')
        .sort();
    expect(at(0)).toEqual(['E1', 'E3', 'I1', 'I2']);
    expect(at(360)).toEqual(['E2', 'E4', 'I3', 'I4']);
    expect(sets.flat().sort()).toEqual([...names].sort());
  });

  it('is one for a single cylinder, in the middle of where both valves are shut', () => {
    const valves = valvesOf('E I');
    const { stops, mates } = lashOrder({ firingOrder: [1], valveTiming: usual, valves });
    expect(stops).toHaveLength(1);
    expect(stops[0]?.set).toEqual(['1', '2']);
    // Inlet shut from 590°, exhaust until 130° of the next cycle: half way is the firing TDC.
    expect(stops[0]?.crank).toBe(0);
    expect(mates).toEqual([
      { set: '1', whenFullyOpen: null },
      { set: '2', whenFullyOpen: null },
    ]);
  });

  it('answers sixteen cylinders of four valves', () => {
    const firingOrder = Array.from({ length: 16 }, (_, i) => i + 1);
    const valves = firingOrder.flatMap((cylinder) =>
      (['inlet', 'inlet', 'exhaust', 'exhaust'] as const).map((type, i): ListedValve => ({
        valve: `${cylinder}.${i}`,
        cylinder,
        type,
      })),
    );
    const { stops } = lashOrder({ firingOrder, valveTiming: usual, valves });
    expect(new Set(stops.flatMap(({ set }) => set)).size).toBe(64);
  });
});

function isClear(
  { firingOrder, valveTiming }: Pick<LashOrderRequest, 'firingOrder' | 'valveTiming'>,
  cylinder: number,
  type: ValveType,
  crank: number,
  margin: number,
): boolean {
  const firesAt = (firingOrder.indexOf(cylinder) * 720) / firingOrder.length;
  const { opens, closes } = valveEvents(valveTiming)[type];
  const phase = phaseOf(crank, firesAt);
  const sinceShut = (phase - closes + 1440) % 720;
  const untilOpen = (opens - phase + 1440) % 720;
  const isShut = !isOpen({ opens, closes, centre: 0 }, phase);
  const room = 720 - (closes - opens);
  return isShut && Math.min(sinceShut, room) >= margin - 1e-6 && untilOpen >= margin - 1e-6;
}

const anyTiming = fc.record({
  ivo: fc.integer({ min: -20, max: 60 }),
  ivc: fc.integer({ min: 10, max: 90 }),
  evo: fc.integer({ min: 10, max: 90 }),
  evc: fc.integer({ min: -20, max: 60 }),
});

describe('any engine', () => {
  const anyEngine = fc.record({
    firingOrder: fc.constantFrom(
      [1],
      [1, 2],
      [1, 2, 3],
      [1, 3, 4, 2],
      [1, 2, 4, 5, 3],
      [1, 8, 4, 3, 6, 5, 7, 2],
    ),
    valveTiming: anyTiming,
    margin: fc.integer({ min: 1, max: 60 }),
  });
  const valvesFor = (firingOrder: readonly number[]): readonly ListedValve[] =>
    valvesOf(firingOrder.map((_, i) => (i % 2 === 0 ? 'E I' : 'I E')).join(' '));

  it('has every valve set once, on its base circle with the margin', () => {
    fc.assert(
      fc.property(anyEngine, (engine) => {
        const valves = valvesFor(engine.firingOrder);
        const { stops, mates } = lashOrder({ ...engine, valves });
        expect(stops.flatMap(({ set }) => set).sort()).toEqual(valves.map(({ valve }) => valve).sort());
        for (const { crank, set } of stops) {
          expect(set.length).toBeGreaterThan(0);
          for (const name of set) {
            const { cylinder, type } = valves[Number(name) - 1] as ListedValve;
            expect(isClear(engine, cylinder as number, type, crank, engine.margin)).toBe(true);
          }
        }
        const cranks = stops.map(({ crank }) => crank);
        expect(cranks).toEqual([...cranks].sort((a, b) => a - b));
        const mateOf = new Map(mates.map(({ set, whenFullyOpen }) => [set, whenFullyOpen]));
        for (const [set, mate] of mateOf) if (mate !== null) expect(mateOf.get(mate)).toBe(set);
      }),
    );
  });

  it('has the fewest stops and then the least turning, as trying every degree finds them', () => {
    const small = fc.record({
      firingOrder: fc.constantFrom([1], [1, 2], [1, 2, 3], [1, 3, 4, 2]),
      valveTiming: anyTiming,
      margin: fc.integer({ min: 1, max: 60 }),
    });
    fc.assert(
      fc.property(small, (engine) => {
        const valves = valvesFor(engine.firingOrder);
        const clearAt = Array.from({ length: 720 }, (_, crank) =>
          valves.reduce(
            (mask, { cylinder, type }, i) =>
              isClear(engine, cylinder as number, type, crank, engine.margin) ? mask | (1 << i) : mask,
            0,
          ),
        );
        const all = (1 << valves.length) - 1;
        const { stops } = lashOrder({ ...engine, valves });
        const turning = (stops.at(-1)?.crank ?? 0) - (stops[0]?.crank ?? 0);
        const tried = leastByTrying(clearAt, all);
        expect(stops.length).toBe(tried.stops);
        expect(turning).toBeCloseTo(tried.turning, 6);
      }),
      { numRuns: 60 },
    );
  });
});

/** Fewest stops and least turning among whole degrees: all events are at whole degrees, so the best stops are too. */
function leastByTrying(clearAt: readonly number[], all: number): { stops: number; turning: number } {
  const at = (crank: number): number => clearAt[crank % 720] ?? 0;
  const every = clearAt.map((_, i) => i);
  if (every.some((crank) => at(crank) === all)) return { stops: 1, turning: 0 };
  let turning = Infinity;
  for (const first of every) {
    for (let by = 1; by < Math.min(720, turning); by += 1) {
      if ((at(first) | at(first + by)) === all) turning = by;
    }
  }
  if (turning < Infinity) return { stops: 2, turning };
  for (const first of every) {
    for (let by = 2; by < Math.min(720, turning); by += 1) {
      const rest = all & ~(at(first) | at(first + by));
      for (let middle = 1; middle < by && by < turning; middle += 1) {
        if ((at(first + middle) & rest) === rest) turning = by;
      }
    }
  }
  return { stops: turning < Infinity ? 3 : 4, turning };
}

it.each([
  ['request', 7],
  ['firingOrder', { ...four, firingOrder: Array.from({ length: 1000 }, (_, i) => i + 1) }],
  ['firingOrder[1]', { ...four, firingOrder: [1, 1, 4, 2] }],
  ['intervals', { ...four, intervals: [1, 2, 3, 4] }],
  ['valveTiming.evo', { ...four, valveTiming: { ...usual, evo: 'x' } }],
  ['valves', { ...four, valves: [] }],
  ['valves', { ...four, valves: Array.from({ length: 5000 }, () => four.valves[0]) }],
  ['valves[0].cylinder', { ...four, valves: [{ valve: '1', cylinder: 9, type: 'inlet' }] }],
  ['valves[0].type', { ...four, valves: [{ valve: '1', cylinder: 1, type: 'sleeve' }] }],
  ['valves[0].valve', { ...four, valves: [{ valve: 'x'.repeat(1_000_000), cylinder: 1, type: 'inlet' }] }],
  ['valves[1].valve', { ...four, valves: [four.valves[0], four.valves[0]] }],
  ['margin', { ...four, margin: -1 }],
  ['margin', { ...four, margin: NaN }],
  // 720 − 240 leaves 480 of base circle: 241 either side does not fit, and no more than 180 is taken.
  ['margin', { ...four, valveTiming: { ...usual, ivc: 170 }, margin: 181 }],
  ['margin', { ...four, valveTiming: { ivo: 100, ivc: 160, evo: 100, evc: 100 }, margin: 141 }],
])('refuses by %s', (field, request) => {
  expect(() => lashOrder(request as LashOrderRequest)).toThrow(expect.objectContaining({ field }));
});

it('names the margin that there is room for', () => {
  // Inlet open 100 + 180 + 160 = 440°, shut 280°: at most 140° either side.
  const request = { ...four, valveTiming: { ivo: 100, ivc: 160, evo: 100, evc: 100 }, margin: 150 };
  expect(() => lashOrder(request)).toThrow('The base circle leaves room for a margin of at most 140°.');
});
