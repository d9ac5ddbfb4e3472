import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { CylinderClock, Sighting, ValveClockRequest, ValveTiming } from '../contracts/calculations.js';
import { valveClock } from './valve-clock.js';
import { whichTdc } from './which-tdc.js';
import type { Seen } from './seen.js';
import { contradicting, whereItStood } from './where-it-stood.js';
import { windowFrom } from './windows.js';

const anyTiming = fc.record({
  ivo: fc.integer({ min: -20, max: 50 }),
  ivc: fc.integer({ min: 10, max: 80 }),
  evo: fc.integer({ min: 10, max: 80 }),
  evc: fc.integer({ min: -20, max: 50 }),
});
const anyOrder = fc.constantFrom(
  { firingOrder: [1, 3, 4, 2] },
  { firingOrder: [1, 2, 3] },
  { firingOrder: [1, 5, 3, 6, 2, 4] },
  { firingOrder: [1, 3, 5, 7, 2, 4, 6] },
  { firingOrder: [1, 2], intervals: [315, 405] },
  { firingOrder: [1] },
);

/** What somebody sees of one cylinder who looks `slip` degrees before or after the crank stood there. */
function look(
  engine: Omit<ValveClockRequest, 'crank'>,
  crank: number,
  cylinder: number,
  slip: number,
): Sighting {
  const seen = valveClock({ ...engine, crank: crank + slip }).cylinders.find(
    (one) => one.cylinder === cylinder,
  );
  const { phase, inlet, exhaust, stroke } = seen as CylinderClock;
  const near = (tdc: number): boolean => Math.abs(((phase - slip - tdc + 900) % 360) - 180) <= 10;
  return {
    cylinder,
    inlet,
    exhaust,
    ...(near(0) && { piston: 'top' }),
    ...(near(180) && { piston: 'bottom' }),
    ...(inlet === 'opening' && exhaust === 'closing' && { rocking: true }),
    ...(stroke === 'compression' && inlet === 'shut' && { pressure: true }),
  };
}

describe('which TDC', () => {
  it('never loses the truth: sightings made by the valve clock, within the tolerance, leave it in the windows', () => {
    const anyLook = fc.record({ cylinder: fc.nat(6), slip: fc.integer({ min: -10, max: 10 }) });
    const anyPosition = fc.record({
      turn: fc.integer({ min: 0, max: 359 }),
      looks: fc.array(anyLook, { minLength: 1, maxLength: 3 }),
    });
    const anyPositions = fc.array(anyPosition, { minLength: 1, maxLength: 5 });
    fc.assert(
      fc.property(anyOrder, anyTiming, anyPositions, fc.nat(), (order, valveTiming, positions, pick) => {
        const engine = { ...order, valveTiming };
        const count = order.firingOrder.length;
        let crank = 0;
        const cranks = positions.map(({ turn }) => (crank += turn));
        const sightings = positions.map(({ looks }, i) =>
          looks.map(({ cylinder, slip }) => look(engine, cranks[i] ?? 0, (cylinder % count) + 1, slip)),
        );
        const about = pick % positions.length;
        const cylinder = (pick % count) + 1;
        const { windows, answer } = whichTdc({ ...engine, cylinder, sightings, about });
        const truth = valveClock({ ...engine, crank: cranks[about] ?? 0 }).cylinders.find(
          (one) => one.cylinder === cylinder,
        )?.phase;
        expect(answer).not.toBe('contradiction');
        expect(truth).toBeDefined();
        expect(
          windows.some(([from, to]) => from - 1e-6 <= (truth ?? NaN) && (truth ?? NaN) <= to + 1e-6),
        ).toBe(true);
        const holds = (angle: number): boolean => windows.some(([from, to]) => from <= angle && angle <= to);
        const holdsTop = holds(0) || holds(720);
        if (answer === 'compression-tdc') expect([holdsTop, holds(360)]).toEqual([true, false]);
        if (answer === 'exhaust-tdc') expect([holdsTop, holds(360)]).toEqual([false, true]);
        if (answer === 'cannot-tell') expect(holdsTop).toBe(holds(360));
      }),
      { numRuns: 400 },
    );
  });

  it('leaves nothing that does not fit: at every whole degree the windows say what trying them all says', () => {
    const anyState = fc.constantFrom('shut', 'opening', 'closing');
    const anySeen = fc.record({
      cylinder: fc.integer({ min: 1, max: 4 }),
      inlet: anyState,
      exhaust: anyState,
    });
    const even = anyTiming.map(({ ivo, ivc, evo, evc }) => ({
      ivo: ivo * 2,
      ivc: ivc * 2,
      evo: evo * 2,
      evc: evc * 2,
    }));
    const tolerance = 6;
    fc.assert(
      fc.property(even, anySeen, anySeen, (valveTiming, first, second) => {
        const { windows } = whichTdc({
          firingOrder: [1, 3, 4, 2],
          valveTiming,
          cylinder: 1,
          sightings: [[first], [second]],
          about: 0,
          tolerance,
        });
        const [before, after] = [first, second].map((seen) => fitting(valveTiming, seen, tolerance)) as [
          boolean[],
          boolean[],
        ];
        const fits = before.map(
          (here, phase) =>
            here && Array.from({ length: 360 }, (_, turn) => after[(phase + turn) % 720]).includes(true),
        );
        const told = fits.map((_, phase) =>
          windows.some(([from, to]) => (from <= phase && phase <= to) || (phase === 0 && to === 720)),
        );
        expect(told).toEqual(fits);
      }),
      { numRuns: 60 },
    );
  });
});

/** For every whole degree of No. 1's cycle, whether one sighting fits it: tried out, not worked out. */
function fitting(timing: ValveTiming, seen: Sighting, tolerance: number): boolean[] {
  const firesAt = [0, 540, 180, 360][Number(seen.cylinder) - 1] ?? 0;
  const lobes = {
    inlet: [360 - timing.ivo, 540 + timing.ivc],
    exhaust: [180 - timing.evo, 360 + timing.evc],
  } as const;
  const fitsOne = (valve: 'inlet' | 'exhaust', phase: number): boolean => {
    const [opens, closes] = lobes[valve];
    const middle = (opens + closes) / 2;
    const [from, to] = { opening: [opens, middle], closing: [middle, closes], shut: [closes, opens + 720] }[
      seen[valve] as 'opening' | 'closing' | 'shut'
    ] as [number, number];
    return [phase - 720, phase, phase + 720].some((at) => at >= from - tolerance && at <= to + tolerance);
  };
  return Array.from({ length: 720 }, (_, phase) => {
    const own = (phase - firesAt + 720) % 720;
    return fitsOne('inlet', own) && fitsOne('exhaust', own);
  });
}

describe('what contradicts', () => {
  it('is always a set that cannot be true, and true again without any one of it', () => {
    const anySeen = fc
      .record({ position: fc.nat(4), from: fc.nat(719), length: fc.nat(250) })
      .map(({ position, from, length }) => ({
        position,
        cylinder: 1,
        aspect: 'piston' as const,
        state: 'top',
        words: '',
        windows: windowFrom(from, from + length),
      }));
    fc.assert(
      fc.property(fc.array(anySeen, { minLength: 2, maxLength: 12 }), (list) => {
        const seen: readonly Seen[] = list.sort((a, b) => a.position - b.position);
        const fits = (some: readonly Seen[]): boolean => whereItStood(some, 0).length > 0;
        const blamed = contradicting(seen);
        expect(blamed.length === 0).toBe(fits(seen));
        if (blamed.length === 0) return;
        expect(fits(blamed)).toBe(false);
        const last = blamed.at(-1);
        if (last && blamed.length > 2) {
          for (const one of seen.slice(0, seen.indexOf(last))) expect(fits([one, last])).toBe(true);
        }
        for (const one of blamed) expect(fits(blamed.filter((other) => other !== one))).toBe(true);
      }),
      { numRuns: 500 },
    );
  });
});
