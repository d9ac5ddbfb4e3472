import { describe, expect, it } from 'vitest';
import type { Sighting, WhichTdcRequest } from '../contracts/calculations.js';
import { InputError } from '../contracts/input-error.js';
import { whichTdc } from './which-tdc.js';

// Windows in these tests follow from the definition of the valve timing, worked out by hand beside each.

const long = { ivo: 15, ivc: 55, evo: 50, evc: 15 };
const noOverlap = { ivo: 0, ivc: 45, evo: 50, evc: 0 };
const topAndShut: Sighting = { cylinder: 1, piston: 'top', inlet: 'shut', exhaust: 'shut' };
const base = { firingOrder: [1, 3, 4, 2], valveTiming: long, cylinder: 1 } as const;

function ask(sightings: readonly (readonly Sighting[])[], more: Partial<WhichTdcRequest> = {}) {
  return whichTdc({ ...base, sightings, ...more });
}

describe('with No. 1 at the top, both valves shut, and the exhaust opening next', () => {
  const sightings = [[topAndShut], [{ cylinder: 1, exhaust: 'opening' }]] as const;

  // common practice, no source: then it was compression TDC.
  it.each([long, noOverlap])('was compression TDC with timing %o', (valveTiming) => {
    const { answer, next, windows } = ask(sightings, { valveTiming, about: 0 });
    expect(answer).toBe('compression-tdc');
    expect(windows).toEqual([
      [0, 10],
      [710, 720],
    ]);
    expect(next).toContain("No. 1's exhaust valve was seen opening");
    // Exhaust opens 50° before BDC, that is 130° after compression TDC.
    expect(next).toContain('130°');
    expect(next).toMatch(/bring it round again/i);
  });

  it('is past it at the position looked at last, and says so', () => {
    // Exhaust opening: from 130 less 10 to the middle of 130–375, 252.5, and 10 more.
    const { answer, reason, next, windows } = ask(sightings);
    expect(answer).toBe('cannot-tell');
    expect(windows).toEqual([[120, 262.5]]);
    expect(reason).toContain('At position 1 it was at compression TDC');
    expect(next).toContain('130° past compression TDC: bring it round again');
    expect(next).toContain('that is its exhaust TDC; one whole turn further is its compression TDC');
  });

  it('tells nothing by the first position alone without overlap', () => {
    const { answer, reason, next } = ask([[topAndShut]], { valveTiming: noOverlap });
    expect(answer).toBe('cannot-tell');
    expect(reason).toContain('Both valves shut proves nothing');
    // No. 3 fires half a turn after No. 1: at No. 1's compression TDC it is at BDC before compression, its inlet
    // still open for 45°; at the exhaust TDC at BDC after power, its exhaust open for 50° already.
    expect(next).toContain("No. 3's exhaust valve: if it is open, No. 1 is at exhaust TDC");
    expect(next).toContain('watch No. 1');
  });
});

describe('by the rocking valves', () => {
  it.each([
    // T3-029, OVLM: the companion's valves rock, order 1-3-4-2.
    [[1, 3, 4, 2], { 1: 4, 2: 3, 3: 2, 4: 1 }],
    // T3-028, OVLM (TM 5-6115-400-12, fig 3-11: watch No. 6 to set No. 1) and CUM: order 1-5-3-6-2-4.
    [[1, 5, 3, 6, 2, 4], { 1: 6, 2: 5, 3: 4, 4: 3, 5: 2, 6: 1 }],
  ])('tells both TDCs of every cylinder of %o', (firingOrder, companions) => {
    for (const [name, companion] of Object.entries(companions)) {
      const cylinder = Number(name);
      const asked = { firingOrder, cylinder };
      expect(ask([[{ cylinder: companion, rocking: true }]], asked).answer).toBe('compression-tdc');
      expect(ask([[{ cylinder, rocking: true }]], asked).answer).toBe('exhaust-tdc');
      const untold = ask([[{ cylinder, piston: 'top' }]], asked);
      expect(untold.answer).toBe('cannot-tell');
      expect(untold.next).toContain(`Look at No. ${companion}'s valves: if they rock`);
    }
  });

  it('names the companion as a cross-check, until it was seen', () => {
    expect(ask([[topAndShut]]).next).toContain('cross-check, look at No. 4: its valves rock');
    const both = ask([[topAndShut, { cylinder: 4, rocking: true }]]);
    expect(both.answer).toBe('compression-tdc');
    expect(both.next).toBeUndefined();
  });

  it('sends one from exhaust TDC a whole turn on', () => {
    const { windows, next } = ask([[{ cylinder: 1, rocking: true }]]);
    // 360 − 15 − 10 to 360 + 15 + 10.
    expect(windows).toEqual([[335, 385]]);
    expect(next).toContain('one whole turn on');
    expect(next).toContain("No. 4's valves rock");
  });

  it('is no evidence where the timing has no overlap at all', () => {
    const valveTiming = { ivo: -15, ivc: 45, evo: 50, evc: -15 };
    const { answer, reason, windows } = ask([[{ cylinder: 4, rocking: true }]], { valveTiming });
    expect(answer).toBe('contradiction');
    expect(windows).toEqual([]);
    expect(reason).toContain('overlap of −30°');
  });
});

describe('engines without companions', () => {
  it('tells a three by another cylinder', () => {
    // T2-001, W-FO2010: order 1-2-3, 240° apart. At No. 1's compression TDC No. 2 is at 480° of its cycle, near the
    // middle of its inlet stroke; at No. 1's exhaust TDC it is at 120°, with both valves shut.
    const three = { firingOrder: [1, 2, 3] };
    const untold = ask([[{ cylinder: 1, piston: 'top' }]], three);
    expect(untold.next).toContain("No. 2's inlet valve: if it is open, No. 1 is at compression TDC");
    expect(untold.next).not.toContain("No. 3's valves: if they rock");
    const seen = [
      { cylinder: 1, piston: 'top' },
      { cylinder: 2, inlet: 'full' },
    ] as const;
    expect(ask([seen], three).answer).toBe('compression-tdc');
    expect(ask([[seen[0], { cylinder: 2, inlet: 'shut' }]], three).answer).toBe('exhaust-tdc');
  });

  it('tells a five by another cylinder', () => {
    // T2-003, W-FO2010 and EC-FO: order 1-2-4-5-3, 144° apart (T2-021). At No. 1's compression TDC No. 4, which fires
    // 288° later, is at 432°, on its inlet stroke; at No. 1's exhaust TDC at 72°, on its power stroke.
    const five = { firingOrder: [1, 2, 4, 5, 3] };
    const top = { cylinder: 1, piston: 'top' } as const;
    expect(ask([[top, { cylinder: 4, inlet: 'opening' }]], five).answer).toBe('compression-tdc');
    expect(ask([[top, { cylinder: 4, inlet: 'shut', exhaust: 'shut' }]], five).answer).toBe('exhaust-tdc');
  });

  it('tells an odd-fire twin and a single by their own valves', () => {
    // T2-056, from memory: V-twin at 45°, intervals 315° and 405°.
    const twin = { firingOrder: ['rear', 'front'], intervals: [315, 405], cylinder: 'front' };
    const untold = ask([[{ cylinder: 'front', piston: 'top' }]], twin);
    expect(untold.next).toContain("cylinder front's own valves");
    expect(ask([[{ cylinder: 'front', rocking: true }]], twin).answer).toBe('exhaust-tdc');
    const single = { firingOrder: [1] };
    const alone = ask([[{ cylinder: 1, piston: 'top' }]], single).next;
    expect(alone).toContain("No. 1's own valves");
    expect(alone).not.toContain("No. 1's inlet valve");
    expect(ask([[topAndShut]], single).answer).toBe('compression-tdc');
  });
});

describe('other things seen', () => {
  it('takes pressure at the plug hole for compression', () => {
    // Compression with both valves shut: from 540 + 55 to 720, and 10 either side.
    const { answer, windows } = ask([[{ cylinder: 1, pressure: true }]]);
    expect(answer).toBe('compression-tdc');
    expect(windows).toEqual([
      [0, 10],
      [585, 720],
    ]);
    expect(ask([[{ cylinder: 4, pressure: true, piston: 'top' }]]).answer).toBe('exhaust-tdc');
  });

  it.each(['compression', 'exhaust'] as const)(
    'takes the marks for the %s TDC they are said to mean',
    (meaning) => {
      expect(ask([[{ cylinder: 1, piston: 'top' }]], { marksTogether: meaning }).answer).toBe(
        `${meaning}-tdc`,
      );
      expect(ask([[]], { marksTogether: meaning }).answer).toBe(`${meaning}-tdc`);
    },
  );

  it('takes the piston at the top for either TDC and at the bottom for either BDC', () => {
    expect(ask([[{ cylinder: 1, piston: 'top' }]], { tolerance: 0 }).windows).toEqual([
      [0, 0],
      [360, 360],
    ]);
    const bottom = ask([[{ cylinder: 1, piston: 'bottom' }]]);
    expect(bottom.windows).toEqual([
      [170, 190],
      [530, 550],
    ]);
    expect(bottom.answer).toBe('cannot-tell');
  });

  it('says which TDC comes next where it stands at neither', () => {
    const { answer, next } = ask([[{ cylinder: 1, inlet: 'closing' }]]);
    expect(answer).toBe('cannot-tell');
    expect(next).toContain('that is its compression TDC');
  });

  it('carries what was seen earlier on, by less than a turn', () => {
    // Inlet fully open at 470 ± 5 ± 10, then the piston at the top, turned on by less than 360: only 720 is near.
    const { answer } = ask([[{ cylinder: 1, inlet: 'full' }], [{ cylinder: 1, piston: 'top' }]]);
    expect(answer).toBe('compression-tdc');
  });
});

describe('sightings that contradict each other', () => {
  const first = (sightings: readonly (readonly Sighting[])[], more = {}) => ask(sightings, more).reason;

  it('names the two, at one position', () => {
    const { answer, reason, windows, next } = ask([
      [
        { cylinder: 2, piston: 'bottom' },
        { cylinder: 1, rocking: true },
        { cylinder: 4, rocking: true },
      ],
    ]);
    expect(answer).toBe('contradiction');
    expect(windows).toEqual([]);
    expect(reason).toContain("No. 1's valves rocking and No. 4's valves rocking cannot both be right");
    expect(reason).not.toContain('No. 2');
    expect(next).toContain('Look again');
  });

  it('names the two, one position after the other', () => {
    // From an inlet fully open to an exhaust opening of the same cylinder it is 360° at the least: 475 + 10 to 120 + 720.
    const seen = [[{ cylinder: 3, inlet: 'full' }], [{ cylinder: 3, exhaust: 'opening' }]] as const;
    expect(first(seen, { tolerance: 0 })).toContain(
      "No. 3's inlet valve fully open at position 1 and No. 3's exhaust valve opening at position 2 cannot both be right",
    );
  });

  it('names two within one sighting, and the marks', () => {
    expect(first([[{ cylinder: 1, inlet: 'full', exhaust: 'full' }]])).toContain('exhaust valve fully open');
    expect(first([[{ cylinder: 1, rocking: true }]], { marksTogether: 'compression' })).toContain(
      'the timing marks',
    );
  });

  it('names two and the third that comes between, where no two alone contradict', () => {
    // No. 3's exhaust fully open puts No. 1 at 432.5 ± 5; its inlet fully open one cycle on, 1185 at the least, is
    // more than two turns from there; shut between the two, 595 to 1065, is within a turn of either.
    const seen = [
      [{ cylinder: 3, exhaust: 'full' }],
      [{ cylinder: 1, inlet: 'shut' }],
      [{ cylinder: 1, inlet: 'full' }],
    ] as const;
    const reason = first(seen, { tolerance: 0 });
    expect(reason).toContain('cannot both be right, with');
    for (const words of ["No. 3's exhaust valve fully open", 'valve shut', "No. 1's inlet valve fully open"])
      expect(reason).toContain(words);
  });
});

describe('input that cannot be used', () => {
  const seen = [[topAndShut]];
  const many = Array.from({ length: 10_000 }, () => topAndShut);

  it.each([
    ['request', undefined],
    ['firingOrder', { ...base, sightings: seen, firingOrder: Array.from({ length: 1000 }, (_, i) => i + 1) }],
    ['firingOrder[1]', { ...base, sightings: seen, firingOrder: [1, 9, 4, 2] }],
    ['intervals', { ...base, sightings: seen, intervals: [100, 100, 100, 100] }],
    ['valveTiming.evo', { ...base, sightings: seen, valveTiming: { ...long, evo: NaN } }],
    ['cylinder', { ...base, sightings: seen, cylinder: 5 }],
    ['tolerance', { ...base, sightings: seen, tolerance: -1 }],
    ['tolerance', { ...base, sightings: seen, tolerance: NaN }],
    ['about', { ...base, sightings: seen, about: 1 }],
    ['about', { ...base, sightings: seen, about: 0.5 }],
    ['marksTogether', { ...base, sightings: seen, marksTogether: 'both' }],
    ['sightings', { ...base, sightings: [] }],
    ['sightings', { ...base, sightings: 'top' }],
    ['sightings', { ...base, sightings: many.map((one) => [one]) }],
    ['sightings', { ...base, sightings: Array.from({ length: 50 }, () => many.slice(0, 32)) }],
    ['sightings[0]', { ...base, sightings: [many] }],
    ['sightings[0]', { ...base, sightings: [[]] }],
    ['sightings[0][1]', { ...base, sightings: [[topAndShut, { cylinder: 4 }]] }],
    ['sightings[0][0]', { ...base, sightings: [['top']] }],
    ['sightings[0][0].cylinder', { ...base, sightings: [[{ piston: 'top' }]] }],
    ['sightings[0][0].inlet', { ...base, sightings: [[{ cylinder: 1, inlet: 'open' }]] }],
    ['sightings[0][0].exhaust', { ...base, sightings: [[{ cylinder: 1, exhaust: 1 }]] }],
    ['sightings[0][0].piston', { ...base, sightings: [[{ cylinder: 1, piston: 'middle' }]] }],
    ['sightings[0][0].rocking', { ...base, sightings: [[{ cylinder: 1, rocking: false }]] }],
    ['sightings[0][0].pressure', { ...base, sightings: [[{ cylinder: 1, pressure: 'some' }]] }],
  ])('%s', (field, request) => {
    let thrown: unknown;
    try {
      whichTdc(request as WhichTdcRequest);
    } catch (error) {
      thrown = error;
    }
    expect(thrown).toBeInstanceOf(InputError);
    expect((thrown as InputError).field).toBe(field);
  });

  it('answers the largest request that it takes', () => {
    const all: Sighting[] = Array.from({ length: 32 }, (_, i) => ({ cylinder: (i % 16) + 1, piston: 'top' }));
    const firingOrder = Array.from({ length: 16 }, (_, i) => i + 1);
    const { answer } = ask(
      Array.from({ length: 9 }, () => all),
      { firingOrder },
    );
    expect(answer).toBe('contradiction');
  });
});
