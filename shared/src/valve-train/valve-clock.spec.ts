import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { CylinderClock, ValveClockRequest, ValveTiming } from '../contracts/calculations.js';
import { InputError } from '../contracts/input-error.js';
import { valveClock } from './valve-clock.js';

const four = [1, 3, 4, 2];
const timing = (ivo: number, ivc: number, evo: number, evc: number): ValveTiming => ({ ivo, ivc, evo, evc });
const tern = timing(15, 55, 55, 15);

function at(crank: number, more: Partial<ValveClockRequest> = {}): readonly CylinderClock[] {
  return valveClock({ firingOrder: four, valveTiming: tern, crank, ...more }).cylinders;
}

function cylinder(number: number | string, clocks: readonly CylinderClock[]): CylinderClock {
  const found = clocks.find((clock) => clock.cylinder === number);
  if (!found) throw new Error(`no cylinder ${number}`);
  return found;
}

function fieldOf(request: unknown): string {
  try {
    valveClock(request as ValveClockRequest);
  } catch (error) {
    if (error instanceof InputError) return error.field;
    throw error;
  }
  return 'no error';
}

describe('the figures of a valve timing', () => {
  it.each([
    // T3-001, VT1: course notes, valve timing diagram 20-35-35-10; the events read, the rest worked out.
    [timing(20, 35, 35, 10), 235, 225, 30, 97.5, 102.5, 100],
    // T3-002 and T3-008, VT2: article on camshaft duration, 7/39 and 51/3; the exhaust's 234° is printed.
    [timing(7, 39, 51, 3), 226, 234, 10, 106, 114, 110],
    // T3-003, VT5: course notes, 5/45/45/5.
    [timing(5, 45, 45, 5), 230, 230, 10, 110, 110, 110],
    // T3-004, VT6: article, 15/35/40/5.
    [timing(15, 35, 40, 5), 230, 225, 20, 100, 107.5, 103.75],
    // T3-005, VT7: training text of 2008, limits for a slow petrol engine 40/60/60/40.
    [timing(40, 60, 60, 40), 280, 280, 80, 100, 100, 100],
  ])('%o', (valveTiming, inlet, exhaust, overlap, inletCentre, exhaustCentre, separation) => {
    const clock = valveClock({ firingOrder: four, valveTiming, crank: 0 });
    expect(clock.duration).toEqual({ inlet, exhaust });
    expect(clock.overlap).toBe(overlap);
    expect(clock.lobeCentre).toEqual({ inlet: inletCentre, exhaust: exhaustCentre });
    expect(clock.lobeSeparation).toBe(separation);
  });

  it('adds overlap from 15 and 15', () => {
    // T3-013, CRAM: study cards for a technical examination.
    expect(valveClock({ firingOrder: four, valveTiming: timing(15, 45, 45, 15), crank: 0 }).overlap).toBe(30);
  });

  it('has a negative overlap where both valves are shut between exhaust and inlet', () => {
    // By definition: the inlet opens 5° after TDC, the exhaust shuts 3° before it.
    const valveTiming = timing(-5, 45, 45, -3);
    const clock = valveClock({ firingOrder: four, valveTiming, crank: 360 });
    expect(clock.overlap).toBe(-8);
    expect(cylinder(1, clock.cylinders)).toMatchObject({ inlet: 'shut', exhaust: 'shut' });
  });
});

describe('what the cylinders do', () => {
  it.each([
    // T3-029, OVLM: the companion's valves rock, order 1-3-4-2.
    [four, { 1: 4, 2: 3, 3: 2, 4: 1 }],
    // T3-028, OVLM (TM 5-6115-400-12, fig 3-11) and CUM: order 1-5-3-6-2-4.
    [[1, 5, 3, 6, 2, 4], { 1: 6, 2: 5, 3: 4, 4: 3, 5: 2, 6: 1 }],
  ])('rocks the valves of the companion while one fires: %o', (firingOrder, rocking) => {
    for (const [firing, rocks] of Object.entries(rocking)) {
      const crank = (720 / firingOrder.length) * firingOrder.indexOf(Number(firing));
      const clocks = at(crank, { firingOrder });
      expect(cylinder(Number(firing), clocks)).toMatchObject({ phase: 0, inlet: 'shut', exhaust: 'shut' });
      expect(clocks.filter((one) => one.inlet === 'opening' && one.exhaust === 'closing')).toEqual([
        expect.objectContaining({ cylinder: rocks, phase: 360 }),
      ]);
    }
  });

  it.each([
    // T3-024 and T3-025, VA4: with 1-3-4-2, valves on their seats at No. 1 and at No. 4 firing, timing 10/50/50/10.
    [0, ['I1', 'E1', 'I2', 'E3']],
    [360, ['E2', 'I3', 'I4', 'E4']],
  ])('leaves on its seat every valve that may be set with the crank at %d°', (crank, settable) => {
    const clocks = at(crank, { valveTiming: timing(10, 50, 50, 10) });
    const shut = clocks.flatMap((one) => [
      ...(one.inlet === 'shut' ? [`I${one.cylinder}`] : []),
      ...(one.exhaust === 'shut' ? [`E${one.cylinder}`] : []),
    ]);
    expect(shut).toEqual(expect.arrayContaining(settable));
    expect(shut).toHaveLength(4);
  });

  it('names the later stroke and the later state on a boundary', () => {
    // By the contract's rule; the events of 15/55/55/15 are at 345, 595, 125 and 375, the centres at 470 and 250.
    expect([0, 180, 360, 540].map((crank) => cylinder(1, at(crank)).stroke)).toEqual([
      'power',
      'exhaust',
      'inlet',
      'compression',
    ]);
    const inlet = (crank: number): string => cylinder(1, at(crank)).inlet;
    expect([344, 345, 464, 465, 475, 476, 594, 595].map(inlet)).toEqual([
      'shut',
      'opening',
      'opening',
      'full',
      'full',
      'closing',
      'closing',
      'shut',
    ]);
    const exhaust = (crank: number): string => cylinder(1, at(crank)).exhaust;
    expect([124, 125, 244, 245, 255, 256, 374, 375].map(exhaust)).toEqual([
      'shut',
      'opening',
      'opening',
      'full',
      'full',
      'closing',
      'closing',
      'shut',
    ]);
  });

  it('keeps to the boundaries where the firing angle is no whole number', () => {
    // Radial seven, 720/7 apart (T2-017, W-FO2010: order 1-3-5-7-2-4-6); the fourth in the order fires at 3 × 720/7.
    const clocks = at((3 * 720) / 7 + 180, { firingOrder: [1, 3, 5, 7, 2, 4, 6] });
    expect(cylinder(7, clocks).stroke).toBe('exhaust');
  });

  it('follows the intervals of an odd-fire engine and takes labels', () => {
    // T2-056, from memory: a V-twin on one pin, cylinders 45° apart, fires at 315° and 405° intervals.
    const clocks = at(315, { firingOrder: ['rear', 'front'], intervals: [315, 405] });
    expect(cylinder('front', clocks).phase).toBe(0);
    expect(cylinder('rear', clocks).phase).toBe(315);
  });
});

describe('piston height', () => {
  const rods = { stroke: { value: 100, unit: 'mm' }, rodLength: { value: 150, unit: 'mm' } } as const;

  it.each([
    // T3-040 to T3-046, PM4: encyclopedia copy of the piston motion equations; stroke 100 mm, rod 150 mm.
    [10, 1.0111039228199843],
    [30, 8.796735233287677],
    [90, 58.57864376269049],
    [120, 81.38593383654926],
    [180, 100],
    // T3-047, PM4: half the stroke is done at acos(r/2l).
    [80.4059317731395, 50],
  ])('at %d° of crank', (crank, drop) => {
    for (const angle of [crank, -crank, crank + 360]) {
      const piston = cylinder(1, at(angle, rods)).pistonFromTop;
      expect(piston?.unit).toBe('mm');
      expect(piston?.value).toBeCloseTo(drop, 9);
    }
  });

  it('is in the unit of the stroke, whatever the rod is given in', () => {
    // T3-030 and T3-033, PM1: rod 6.024 in, stroke 3.307 in; pin 7.68 in high at TDC, 6.218 in at the angle that
    // the engine reaches in 0.002100653404 s at 6000 rpm (T3-032).
    const lengths = {
      stroke: { value: 3.307, unit: 'in' },
      rodLength: { value: 6.024 * 25.4, unit: 'mm' },
    } as const;
    const piston = cylinder(1, at(0.002100653404 * 6 * 6000, lengths)).pistonFromTop;
    expect(piston?.unit).toBe('in');
    expect(3.307 / 2 + 6.024 - (piston?.value ?? NaN)).toBeCloseTo(6.218, 3);
  });

  it('is left out unless both lengths are known', () => {
    expect(cylinder(1, at(90))).not.toHaveProperty('pistonFromTop');
    expect(cylinder(1, at(90, { stroke: rods.stroke }))).not.toHaveProperty('pistonFromTop');
  });
});

describe('input that cannot be used', () => {
  const good = { firingOrder: four, valveTiming: tern, crank: 0 };
  const mm = (value: number): object => ({ value, unit: 'mm' });

  it.each([
    ['request', null],
    ['firingOrder', { ...good, firingOrder: [] }],
    ['firingOrder', { ...good, firingOrder: Array.from({ length: 1000 }, (_, i) => i + 1) }],
    ['firingOrder[2]', { ...good, firingOrder: [1, 3, 3, 2] }],
    ['firingOrder[1]', { ...good, firingOrder: [1, 'two'] }],
    ['firingOrder[0]', { ...good, firingOrder: [NaN, 2] }],
    ['intervals', { ...good, intervals: [180, 180, 180] }],
    ['intervals', { ...good, intervals: [180, 180, 180, 170] }],
    ['intervals[1]', { ...good, intervals: [180, NaN, 180, 180] }],
    ['intervals[1]', { ...good, intervals: [360, 0, 180, 180] }],
    ['valveTiming', { ...good, valveTiming: [] }],
    ['valveTiming.evc', { ...good, valveTiming: { ivo: 15, ivc: 55, evo: 55 } }],
    ['valveTiming.ivo', { ...good, valveTiming: timing(1000, 55, 55, 15) }],
    ['valveTiming.ivc', { ...good, valveTiming: timing(15, NaN, 55, 15) }],
    ['crank', { ...good, crank: Infinity }],
    ['crank', { ...good, crank: '90' }],
    ['stroke.value', { ...good, stroke: mm(0), rodLength: mm(150) }],
    ['stroke.value', { ...good, stroke: mm(-80) }],
    ['stroke.unit', { ...good, stroke: { value: 100, unit: 'N·m' }, rodLength: mm(150) }],
    ['rodLength', { ...good, stroke: mm(100), rodLength: mm(50) }],
  ])('%s', (field, request) => {
    expect(fieldOf(request)).toBe(field);
  });
});

describe('properties', () => {
  const anyTiming = fc.record({
    ivo: fc.integer({ min: -20, max: 60 }),
    ivc: fc.integer({ min: 0, max: 90 }),
    evo: fc.integer({ min: 0, max: 90 }),
    evc: fc.integer({ min: -20, max: 60 }),
  });
  const anyOrder = fc.integer({ min: 1, max: 12 }).chain((n) =>
    fc.shuffledSubarray(
      [...Array(n).keys()].map((i) => i + 1),
      { minLength: n },
    ),
  );

  it('comes round every two turns', () => {
    fc.assert(
      fc.property(
        anyOrder,
        anyTiming,
        fc.integer({ min: -2000, max: 2000 }),
        (firingOrder, valveTiming, crank) => {
          const request = { firingOrder, valveTiming, crank };
          const later = valveClock({ ...request, crank: crank + 720 });
          const now = valveClock(request);
          now.cylinders.forEach((one, i) => {
            const again = later.cylinders[i];
            expect(again).toMatchObject({ stroke: one.stroke, inlet: one.inlet, exhaust: one.exhaust });
            expect(again?.phase).toBeCloseTo(one.phase, 6);
          });
        },
      ),
    );
  });

  it('adds up: the degrees a valve is off its seat are its duration, and both off theirs the overlap', () => {
    fc.assert(
      fc.property(anyTiming, (valveTiming) => {
        const clocks = Array.from({ length: 720 }, (_, crank) => cylinder(1, at(crank, { valveTiming })));
        const { duration, overlap, lobeSeparation } = valveClock({
          firingOrder: four,
          valveTiming,
          crank: 0,
        });
        expect(clocks.filter((one) => one.inlet !== 'shut')).toHaveLength(duration.inlet);
        expect(clocks.filter((one) => one.exhaust !== 'shut')).toHaveLength(duration.exhaust);
        const both = clocks.filter((one) => one.inlet !== 'shut' && one.exhaust !== 'shut');
        expect(both).toHaveLength(Math.max(0, overlap));
        // T3-001's identity: overlap = (Di + De)/2 − 2 LSA.
        expect((duration.inlet + duration.exhaust) / 2 - 2 * lobeSeparation).toBeCloseTo(overlap, 9);
      }),
      { numRuns: 25 },
    );
  });
});
