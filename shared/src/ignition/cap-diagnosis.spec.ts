import { describe, expect, it } from 'vitest';
import type {
  CapDiagnosis,
  CapDiagnosisRequest,
  CapMapRequest,
  Cylinder,
} from '../contracts/calculations.js';
import { capDiagnosis } from './cap-diagnosis.js';
import { capMap } from './cap-map.js';
import { causeTitle } from './causes/causes.js';

const four: CapMapRequest = { firingOrder: [1, 3, 4, 2], rotation: 'anticlockwise' };
const six: CapMapRequest = { firingOrder: [1, 5, 3, 6, 2, 4], rotation: 'clockwise' };
const eight: CapMapRequest = { firingOrder: [1, 8, 4, 3, 6, 5, 7, 2], rotation: 'clockwise' };

/** Fits these cylinders to the posts as the rotor meets them, the first post first. */
const leadsOn = (cap: CapMapRequest, met: readonly Cylinder[]): Record<string, Cylinder> =>
  Object.fromEntries(capMap(cap).rows.map(({ post }, i) => [post, met[i] ?? 'none']));

const diagnose = (
  cap: CapMapRequest,
  met: readonly Cylinder[],
  more: Partial<CapDiagnosisRequest> = {},
): CapDiagnosis => capDiagnosis({ cap, fitted: leadsOn(cap, met), ...more });

const lateOf = (answer: CapDiagnosis): Record<string, number> =>
  Object.fromEntries(answer.cylinders.map(({ cylinder, late }) => [cylinder, late]));

describe('capDiagnosis, against outside values', () => {
  // T2-047. Order 1-8-4-3-6-5-7-2: article on V8 firing orders (CP-FO). Each cylinder of an exchanged pair is fired at the
  // other one's time: index difference × 720/n, by definition.
  it('finds leads 5 and 7 of an eight exchanged: 5 is 90° late, 7 is 90° early', () => {
    const answer = diagnose(eight, [1, 8, 4, 3, 6, 7, 5, 2]);
    expect(answer).toMatchObject({ verdict: 'fail', cause: 'two-leads-swapped', alsoFits: [] });
    expect(lateOf(answer)).toMatchObject({ 5: 90, 7: -90, 1: 0, 8: 0 });
  });

  // T2-048, T2-049. Order 1-3-4-2: "Firing order", encyclopedia copy of 2010 (W-FO2010); errors by the same definition.
  it('finds companions 1 and 4 exchanged 360° out, both at the end of the exhaust stroke', () => {
    const answer = diagnose(four, [4, 3, 1, 2]);
    expect(lateOf(answer)).toEqual({ 1: 360, 3: 0, 4: 360, 2: 0 });
    expect(answer.cylinders.map(({ stroke }) => stroke)).toEqual([
      'exhaust',
      'compression',
      'exhaust',
      'compression',
    ]);
  });

  it('finds leads 1 and 3 exchanged: 1 is 180° late, 3 is 180° early', () => {
    expect(lateOf(diagnose(four, [3, 1, 4, 2]))).toEqual({ 1: 180, 3: -180, 4: 0, 2: 0 });
  });

  // Common practice, no source.
  it('cures 1-3-4-2 wired 1-4-3-2 by one swap of the leads of 3 and 4', () => {
    const answer = diagnose(four, [1, 4, 3, 2]);
    expect(answer).toMatchObject({ cause: 'two-leads-swapped', alsoFits: ['other-firing-order'] });
    expect(answer.swaps).toEqual([{ between: ['4', '3'], outlets: ['4', '3'] }]);
    expect(answer.asFitted).toEqual([1, 4, 3, 2]);
    expect(answer.reason).toMatch(
      /cylinder 3 .*One swap puts it right: exchange the leads at outlets 4 and 3/,
    );
  });

  // T3-001. Valve timing 20/35/35/10: course notes on the valve timing diagram (VT1). With 10° of advance, a spark 180° late
  // is 170° after TDC, past the exhaust's opening at 145°; one 180° early is 190° before, on the inlet stroke,
  // where the inlet is open from 20° before TDC to 35° past BDC; one 360° out is 10° before exhaust TDC, where
  // both are open.
  it('says which valves are open at the spark', () => {
    const valveTiming = { ivo: 20, ivc: 35, evo: 35, evc: 10 };
    const moved = diagnose(four, [3, 1, 4, 2], { valveTiming });
    expect(moved.cylinders).toEqual([
      { cylinder: 1, post: '4', late: 180, stroke: 'power', inletOpen: false, exhaustOpen: true },
      { cylinder: 3, post: '1', late: -180, stroke: 'inlet', inletOpen: true, exhaustOpen: false },
      { cylinder: 4, post: '3', late: 0, stroke: 'compression', inletOpen: false, exhaustOpen: false },
      { cylinder: 2, post: '2', late: 0, stroke: 'compression', inletOpen: false, exhaustOpen: false },
    ]);
    const out = diagnose(four, [4, 3, 1, 2], { valveTiming }).cylinders[0];
    expect(out).toMatchObject({ stroke: 'exhaust', inletOpen: true, exhaustOpen: true });
    const unknown = diagnose(four, [4, 3, 1, 2]).cylinders[0];
    expect(unknown).toMatchObject({ inletOpen: null, exhaustOpen: null });
  });

  it('takes the stroke at TDC minus the advance, the later one on a boundary', () => {
    expect(diagnose(four, [1, 3, 4, 2], { advance: 0 }).cylinders[0]?.stroke).toBe('power');
    expect(diagnose(four, [1, 3, 4, 2], { advance: 30 }).cylinders[0]?.stroke).toBe('compression');
    expect(diagnose(four, [3, 1, 4, 2], { advance: 0 }).cylinders[0]?.stroke).toBe('exhaust');
  });
});

describe('capDiagnosis, cause by cause', () => {
  it('passes what is right, says so, and warns of nothing', () => {
    const answer = diagnose(four, [1, 3, 4, 2]);
    expect(answer).toMatchObject({ verdict: 'pass', cause: 'right', alsoFits: [], swaps: [], cautions: [] });
    expect(answer).not.toHaveProperty('movedBy');
    expect(answer.reason).toContain('1-3-4-2');
  });

  it('doubts a right wiring on a cap that is not spaced as the engine fires', () => {
    const odd = { ...four, intervals: [90, 270, 90, 270] };
    expect(diagnose(odd, [1, 3, 4, 2])).toMatchObject({ verdict: 'doubtful', cause: 'right' });
    expect(diagnose(odd, [1, 3, 2, 4])).toMatchObject({ verdict: 'fail' });
  });

  it('counts how far the whole set is moved the way the rotor turns', () => {
    const answer = diagnose(four, [2, 1, 3, 4]);
    expect(answer).toMatchObject({ cause: 'whole-set-moved', movedBy: 1, asFitted: [1, 3, 4, 2] });
    expect(answer.swaps).toHaveLength(3);
    expect(answer.reason).toMatch(/1 post on .* 180° late.* 1 post back, against the rotor/);
    expect(answer.reason).toMatch(/its body 90° against the way the rotor turns.* its drive 90° with it/);
    const three = diagnose(four, [3, 4, 2, 1]);
    expect(three).toMatchObject({ cause: 'whole-set-moved', movedBy: 3 });
    expect(three.reason).toMatch(/180° early.* 1 post on, with the rotor/);
    expect(three.reason).toMatch(/its body 90° with the way the rotor turns.* its drive 90° against it/);
  });

  it('reads a set moved half way round as a full crank turn out', () => {
    const answer = diagnose(six, [6, 2, 4, 1, 5, 3]);
    expect(answer).toMatchObject({ cause: 'whole-set-moved', movedBy: 3, alsoFits: [] });
    expect(new Set(answer.cylinders.map(({ late }) => late))).toEqual(new Set([360]));
    expect(answer.reason).toMatch(/full crank turn out.*half a turn/);
    expect(answer.swaps).toHaveLength(3);
  });

  it('offers no turn of the distributor where posts are unevenly spaced', () => {
    const oddFire: CapMapRequest = {
      ...six,
      intervals: [90, 150, 90, 150, 90, 150],
      posts: [0, 45, 120, 165, 240, 285].map((angle, i) => ({ post: String(i + 1), angle })),
    };
    const byOne = diagnose(oddFire, [4, 1, 5, 3, 6, 2]);
    expect(byOne).toMatchObject({ cause: 'whole-set-moved', movedBy: 1 });
    expect(lateOf(byOne)).toEqual({ 1: 90, 5: 150, 3: 90, 6: 150, 2: 90, 4: 150 });
    expect(byOne.reason).toContain('does not cure it');
    const byTwo = diagnose(oddFire, [2, 4, 1, 5, 3, 6]);
    expect(byTwo).toMatchObject({ movedBy: 2 });
    expect(byTwo.reason).toMatch(/240° late.*its body 120° against/);
  });

  it('sees outlets read as posts: right on the outside, crossed inside', () => {
    const crossed: CapMapRequest = {
      firingOrder: [1, 3, 4, 2],
      rotation: 'anticlockwise',
      posts: [
        { post: 'A', angle: 315 },
        { post: 'B', angle: 225 },
        { post: 'D', angle: 135 },
        { post: 'C', angle: 45 },
      ],
      trace: { A: 'B', B: 'A', C: 'C', D: 'D' },
    };
    const answer = capDiagnosis({
      cap: crossed,
      fitted: { A: 1, B: 3, C: 2, D: 4 },
      fittedBy: 'outlet',
    });
    expect(answer).toMatchObject({ cause: 'outlets-read-as-posts', alsoFits: ['two-leads-swapped'] });
    expect(answer.swaps).toEqual([{ between: ['A', 'B'], outlets: ['B', 'A'] }]);
    expect(answer.reason).toMatch(/outlets A and B cross over.*cylinders 1 and 3 get each other’s spark/);
    expect(lateOf(answer)).toEqual({ 1: 180, 3: -180, 4: 0, 2: 0 });
    const right = capDiagnosis({ cap: crossed, fitted: { A: 3, B: 1, C: 2, D: 4 }, fittedBy: 'outlet' });
    expect(right.cause).toBe('right');
  });

  it('sees three outlets read as posts', () => {
    const cap = { ...six, trace: { 1: '2', 2: '3', 3: '1', 4: '4', 5: '5', 6: '6' } };
    const fitted = { 1: 1, 2: 5, 3: 3, 4: 6, 5: 2, 6: 4 };
    const answer = capDiagnosis({ cap, fitted, fittedBy: 'outlet' });
    expect(answer).toMatchObject({ cause: 'outlets-read-as-posts', alsoFits: [] });
    expect(answer.swaps).toHaveLength(2);
    expect(answer.reason).toContain('cylinders 1, 5 and 3 get one another’s sparks');
  });

  // Common practice, no source: on a four, 1-2-4-3 for 1-3-4-2 is a swap, a reversal and another order at once.
  it('names the reversal of a four and lists the swap and the other order beside it', () => {
    const answer = diagnose(four, [1, 2, 4, 3]);
    expect(answer.cause).toBe('wired-against-the-rotor');
    expect(answer.alsoFits).toEqual(['two-leads-swapped', 'other-firing-order']);
    expect(answer.reason).toMatch(
      /anticlockwise, seen on the cap.* set out clockwise.*only cylinders 1 and 4/,
    );
  });

  // T2-052. 1-4-2-6-3-5 is the mirror order of 1-5-3-6-2-4, by definition of the other hand of crank.
  it('names the reversal of a six, which is another order too', () => {
    const answer = diagnose(six, [1, 4, 2, 6, 3, 5]);
    expect(answer).toMatchObject({ cause: 'wired-against-the-rotor', alsoFits: ['other-firing-order'] });
    expect(answer.swaps).toHaveLength(2);
  });

  it('does not take a reversal about another post for one', () => {
    expect(diagnose(four, [2, 4, 3, 1])).toMatchObject({ cause: 'mixed', asFitted: [1, 2, 4, 3] });
  });

  // T2-012, T2-005. 1-8-7-2-6-5-4-3: article on V8 firing orders (CP-FO); 1-4-5-2-3-6: FAA handbook (FAA-FO).
  it.each([
    [eight, [1, 8, 7, 2, 6, 5, 4, 3], 'V8'],
    [six, [1, 4, 5, 2, 3, 6], 'flat six'],
  ])('knows another engine’s order when it meets one', (cap, met, engine) => {
    const answer = diagnose(cap, met);
    expect(answer).toMatchObject({ cause: 'other-firing-order', alsoFits: [] });
    expect(answer.reason).toContain(engine);
    expect(answer.reason).toContain(met.join('-'));
  });

  it('knows another order when the engine’s own does not begin with cylinder 1', () => {
    const cap: CapMapRequest = { firingOrder: [5, 3, 6, 2, 4, 1], rotation: 'clockwise' };
    expect(diagnose(cap, [5, 2, 3, 6, 1, 4]).cause).toBe('other-firing-order');
  });

  it('calls the rest mixed, and still cures it', () => {
    const answer = diagnose(six, [5, 3, 1, 2, 6, 4]);
    expect(answer).toMatchObject({ verdict: 'fail', cause: 'mixed', alsoFits: [] });
    expect(answer.swaps).toHaveLength(3);
    expect(answer.reason).toMatch(/No single mistake.*3 swaps put it right, in this order/);
  });

  it('takes labels and two cylinders', () => {
    const twin: CapMapRequest = { firingOrder: ['front', 'rear'], rotation: 'clockwise' };
    expect(diagnose(twin, ['rear', 'front'])).toMatchObject({
      cause: 'whole-set-moved',
      movedBy: 1,
      alsoFits: ['two-leads-swapped'],
    });
    expect(diagnose({ firingOrder: [1], rotation: 'clockwise' }, [1]).cause).toBe('right');
  });

  it('has a title for every cause', () => {
    expect(causeTitle('right')).toBe('Right');
    expect(causeTitle('other-firing-order')).toBe('Another firing order');
  });
});

describe('capDiagnosis, its cautions', () => {
  const valveTiming = { ivo: 7, ivc: 39, evo: 51, evc: 3 };

  it('warns of flash back for a spark on an open inlet valve', () => {
    const { cautions } = diagnose(four, [3, 1, 4, 2], { valveTiming });
    expect(cautions).toHaveLength(2);
    expect(cautions[0]).toMatch(/spark of cylinder 3 .*inlet valve open.*flash back through the carburettor/);
    expect(cautions[1]).toMatch(/Do not crank/);
  });

  it('says “probably” where no valve timing is known', () => {
    expect(diagnose(four, [3, 1, 4, 2]).cautions[0]).toContain('probably open');
  });

  it('warns of a kick back for a spark well before TDC, both valves shut', () => {
    const { cautions } = diagnose(eight, [1, 8, 4, 3, 6, 7, 5, 2], { valveTiming });
    expect(cautions[0]).toMatch(/spark of cylinder 7 .*well before TDC.*kick back/);
    expect(cautions).toHaveLength(2);
  });

  it('warns of both where the inlet valve is still open on the compression stroke', () => {
    const lateShutting = { ivo: 30, ivc: 85, evo: 60, evc: 30 };
    const { cautions } = diagnose(eight, [1, 8, 4, 3, 6, 7, 5, 2], {
      valveTiming: lateShutting,
      advance: 10,
    });
    expect(cautions).toHaveLength(3);
  });
});
