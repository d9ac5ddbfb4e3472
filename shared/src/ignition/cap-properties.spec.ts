import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { CapDiagnosis, CapMapRequest, Cylinder, LeadSwap, Rotation } from '../contracts/calculations.js';
import { capDiagnosis } from './cap-diagnosis.js';
import { capMap } from './cap-map.js';

const shuffled = <T>(items: readonly T[]): fc.Arbitrary<T[]> =>
  fc.shuffledSubarray([...items], { minLength: items.length, maxLength: items.length });

const names = (count: number, letter: string): string[] =>
  Array.from({ length: count }, (_, i) => `${letter}${i}`);

const other = (rotation: Rotation): Rotation => (rotation === 'clockwise' ? 'anticlockwise' : 'clockwise');

const cylindersOf = (count: number): fc.Arbitrary<readonly Cylinder[]> =>
  fc.constantFrom<readonly Cylinder[]>(
    names(count, 'L'),
    Array.from({ length: count }, (_, i) => i + 1),
  );

/** Crank degrees that add up to the cycle. */
const intervalsOf = (count: number): fc.Arbitrary<readonly number[] | undefined> =>
  fc.option(
    fc.array(fc.integer({ min: 1, max: 20 }), { minLength: count, maxLength: count }).map((parts) => {
      const sum = parts.reduce((a, b) => a + b, 0);
      return parts.map((part) => (part * 720) / sum);
    }),
    { nil: undefined },
  );

/** Any cap that can be described: order, labels, direction, side, odd posts, first post, intervals, trace. */
const anyCap: fc.Arbitrary<CapMapRequest> = fc.integer({ min: 1, max: 16 }).chain((count) =>
  fc.record({
    firingOrder: cylindersOf(count).chain(shuffled),
    rotation: fc.constantFrom<Rotation>('clockwise', 'anticlockwise'),
    rotationSeenFrom: fc.constantFrom('cap', 'drive', undefined),
    posts: fc
      .uniqueArray(fc.integer({ min: 0, max: 359 }), { minLength: count, maxLength: count })
      .map((angles) => angles.map((angle, i) => ({ post: `P${i}`, angle }))),
    firstPost: fc.constantFrom(undefined, ...names(count, 'P')),
    intervals: intervalsOf(count),
    trace: fc.oneof(
      fc.constant(undefined),
      fc
        .constantFrom('P', 'T')
        .chain((letter) => shuffled(names(count, letter)))
        .map((outlets) => Object.fromEntries(outlets.map((outlet, i) => [`P${i}`, outlet]))),
    ),
  }),
);

const anyWiring = anyCap.chain((cap) => fc.record({ cap: fc.constant(cap), met: shuffled(cap.firingOrder) }));

const fittedBy = (
  cap: CapMapRequest,
  met: readonly Cylinder[],
  by: 'post' | 'outlet',
): Record<string, Cylinder> =>
  Object.fromEntries(capMap(cap).rows.map((row, i) => [row[by], met[i] ?? 'none']));

const diagnose = (
  cap: CapMapRequest,
  met: readonly Cylinder[],
  by: 'post' | 'outlet' = 'post',
): CapDiagnosis => capDiagnosis({ cap, fitted: fittedBy(cap, met, by), fittedBy: by });

function afterSwaps(
  fitted: Record<string, Cylinder>,
  swaps: readonly LeadSwap[],
  by: 'between' | 'outlets',
): Record<string, Cylinder> {
  const now = { ...fitted };
  for (const swap of swaps) {
    const [one, two] = swap[by];
    const held = now[one];
    now[one] = now[two] ?? 'none';
    now[two] = held ?? 'none';
  }
  return now;
}

/** The fewest exchanges by trying them all, breadth first. */
function fewestByTrial(met: readonly Cylinder[], wanted: readonly Cylinder[]): number {
  const goal = wanted.join();
  let reached = new Map([[met.join(), [...met]]]);
  for (let swaps = 0; ; swaps++) {
    if (reached.has(goal)) return swaps;
    const next = new Map(reached);
    for (const now of reached.values()) {
      for (let i = 0; i < now.length; i++) {
        for (let j = 0; j < i; j++) {
          const after = now.map((one, at) => now[at === i ? j : at === j ? i : at] ?? one);
          next.set(after.join(), after);
        }
      }
    }
    reached = next;
  }
}

describe('map and diagnosis', () => {
  it('are each other’s inverse: leads set out by the map are right', () => {
    fc.assert(
      fc.property(anyCap, fc.constantFrom<'post' | 'outlet'>('post', 'outlet'), (cap, by) => {
        const fitted = Object.fromEntries(capMap(cap).leads.map((lead) => [lead[by], lead.cylinder]));
        const answer = capDiagnosis({ cap, fitted, fittedBy: by });
        expect(answer).toMatchObject({ cause: 'right', alsoFits: [], swaps: [], cautions: [] });
        expect(answer.asFitted).toEqual(cap.firingOrder);
        expect(answer.cylinders.every(({ late }) => late === 0)).toBe(true);
      }),
    );
  });

  it('are each other’s inverse: leads set out for another order are read back as that order', () => {
    fc.assert(
      fc.property(anyWiring, ({ cap, met }) => {
        const { leads } = capMap({ ...cap, firingOrder: met });
        const fitted = Object.fromEntries(leads.map(({ post, cylinder }) => [post, cylinder]));
        const start = met.findIndex((cylinder) => cylinder === cap.firingOrder[0]);
        expect(capDiagnosis({ cap, fitted }).asFitted).toEqual([...met.slice(start), ...met.slice(0, start)]);
      }),
    );
  });

  it('say the same by post and by outlet, and by the drive’s view turned round', () => {
    fc.assert(
      fc.property(anyWiring, ({ cap, met }) => {
        const answer = diagnose(cap, met);
        expect(diagnose(cap, met, 'outlet')).toEqual(answer);
        const drive: CapMapRequest = { ...cap, rotationSeenFrom: 'drive' };
        const fromCap: CapMapRequest = { ...cap, rotationSeenFrom: 'cap', rotation: other(cap.rotation) };
        const { rows, leads, companions, verdict } = capMap(drive);
        expect(capMap(fromCap)).toMatchObject({ rows, leads, companions, verdict });
        expect(diagnose(fromCap, met)).toEqual(diagnose(drive, met));
      }),
    );
  });

  it('find nothing changed when the rotor is reversed twice', () => {
    fc.assert(
      fc.property(anyCap, (cap) => {
        const even = {
          ...cap,
          posts: undefined,
          firstPost: undefined,
          trace: undefined,
          intervals: undefined,
        };
        const leads = (rotation: Rotation): readonly Cylinder[] =>
          [...capMap({ ...even, rotation }).rows]
            .sort((a, b) => a.angle - b.angle)
            .map((row) => row.cylinder);
        const once = leads(other(cap.rotation));
        const twice = [...once.slice(0, 1), ...once.slice(1).reverse()];
        expect(twice).toEqual(leads(cap.rotation));
        const wrongWay = Object.fromEntries(once.map((cylinder, i) => [String(i + 1), cylinder]));
        const { cause } = capDiagnosis({ cap: even, fitted: wrongWay });
        expect(cause).toBe(once.length < 3 ? 'right' : 'wired-against-the-rotor');
      }),
    );
  });
});

describe('swaps', () => {
  it('cure every wiring, done in the order listed, by post and by outlet', () => {
    fc.assert(
      fc.property(anyWiring, ({ cap, met }) => {
        const { swaps } = diagnose(cap, met);
        const byPost = afterSwaps(fittedBy(cap, met, 'post'), swaps, 'between');
        expect(capDiagnosis({ cap, fitted: byPost }).cause).toBe('right');
        const byOutlet = afterSwaps(fittedBy(cap, met, 'outlet'), swaps, 'outlets');
        expect(capDiagnosis({ cap, fitted: byOutlet, fittedBy: 'outlet' }).cause).toBe('right');
      }),
    );
  });

  it('are as few as trying every exchange finds', () => {
    const small = anyWiring.filter(({ met }) => met.length <= 5);
    fc.assert(
      fc.property(small, ({ cap, met }) => {
        expect(diagnose(cap, met).swaps).toHaveLength(fewestByTrial(met, cap.firingOrder));
      }),
      { numRuns: 60 },
    );
  });
});

describe('sparks', () => {
  it('are late within a turn either way, and together make whole cycles', () => {
    fc.assert(
      fc.property(anyWiring, ({ cap, met }) => {
        const late = diagnose(cap, met).cylinders.map((one) => one.late);
        expect(late.every((one) => one > -360 && one <= 360)).toBe(true);
        const cycles = late.reduce((sum, one) => sum + one, 0) / 720;
        expect(Math.abs(cycles - Math.round(cycles))).toBeLessThan(1e-9);
      }),
    );
  });

  it('are all late by the same when a set is moved on an even cap', () => {
    fc.assert(
      fc.property(anyCap, fc.nat(15), (cap, by) => {
        const n = cap.firingOrder.length;
        fc.pre(by > 0 && by < n);
        const even = {
          ...cap,
          posts: undefined,
          firstPost: undefined,
          trace: undefined,
          intervals: undefined,
        };
        const met = cap.firingOrder.map((_, i) => cap.firingOrder[(i - by + n) % n] ?? 'none');
        const answer = diagnose(even, met);
        expect(answer).toMatchObject({ cause: 'whole-set-moved', movedBy: by });
        const turn = (by * 720) / n;
        for (const { late } of answer.cylinders) expect(late).toBeCloseTo(turn > 360 ? turn - 720 : turn, 9);
      }),
    );
  });
});
