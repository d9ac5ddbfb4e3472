import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { Rotation } from '../contracts/calculations.js';
import type { RotorCheckRequest } from '../contracts/ignition-checks.js';
import { rotorCheck } from './rotor-check.js';

const posts = [45, 135, 225, 315].map((angle) => ({ post: String(angle), angle }));
const cap = { firingOrder: [1, 3, 4, 2], rotation: 'clockwise', posts } as const;
const timing = { advance: 10 };
const mm = (value: number) => ({ value, unit: 'mm' }) as const;

// Expected values by the geometry of the cap: clockwise, cylinder 1 at 45°, 3 at 135°, 4 at 225°, 2 at 315°.
describe('at the static timing mark', () => {
  it('points at its own post', () => {
    const answer = rotorCheck({ cap, rotorAngle: 47, timing });
    expect(answer).toMatchObject({
      verdict: 'pass',
      nearestPost: '45',
      nearestCylinder: 1,
      wantedPost: '45',
      error: 2,
      crankError: 4,
      atCompanion: false,
    });
    expect(answer.reason).toContain('2° past it, the way the rotor turns (4° of crank)');
  });

  it.each([
    [55, 'fail', 10, '45'],
    [39, 'fail', -6, '45'],
    [130, 'fail', 85, '135'],
    [315, 'fail', -90, '315'],
  ])('rotor at %d°: %s', (rotorAngle, verdict, error, nearestPost) => {
    const answer = rotorCheck({ cap, rotorAngle, timing });
    expect(answer).toMatchObject({ verdict, error, nearestPost, atCompanion: false });
    expect(answer).not.toHaveProperty('howToTell');
  });

  it.each([225, 222, 229])(
    'at the companion’s post, %d°, it cannot tell which of two is out',
    (rotorAngle) => {
      const answer = rotorCheck({ cap, rotorAngle, timing });
      expect(answer).toMatchObject({ verdict: 'doubtful', atCompanion: true, nearestCylinder: 4 });
      expect(answer.reason).toContain('exhaust TDC');
      expect(answer.howToTell).toContain('No. 1’s valves');
      expect(answer.howToTell).toContain('No. 4’s rock');
    },
  );

  it('is half a turn out without a companion too, where a three has no post', () => {
    const three = { firingOrder: [1, 2, 3], rotation: 'clockwise' } as const;
    const answer = rotorCheck({ cap: three, rotorAngle: 181, timing });
    expect(answer).toMatchObject({ verdict: 'doubtful', atCompanion: false });
    expect(answer.howToTell).toContain('stay so for some way either side');
  });

  it('has no exhaust TDC on a two-stroke', () => {
    const two = { ...cap, strokesPerCycle: 2 } as const;
    const answer = rotorCheck({ cap: two, rotorAngle: 225, timing });
    expect(answer).toMatchObject({ verdict: 'fail', error: 180, crankError: 180, atCompanion: false });
  });

  it('does not take another cylinder’s post for the companion’s where the cap is spaced wrong', () => {
    // The companion's post stands at 120° and No. 2's at 185°, 5° from half a turn on.
    const spaced = [0, 90, 120, 185].map((angle) => ({ post: String(angle), angle }));
    const answer = rotorCheck({ cap: { ...cap, posts: spaced }, rotorAngle: 182, timing });
    expect(answer).toMatchObject({ verdict: 'doubtful', atCompanion: false, nearestCylinder: 2 });
    expect(answer.reason).toContain('half a turn from No. 1’s post');
  });

  it('is never within the tolerance of two posts', () => {
    // Twelve posts stand 30° apart: at 18° the rotor is nearer to the second.
    const twelve = { firingOrder: [1, 7, 5, 11, 3, 9, 6, 12, 2, 8, 4, 10], rotation: 'clockwise' } as const;
    const ask = (tolerance?: number) => rotorCheck({ cap: twelve, rotorAngle: 18, timing, tolerance });
    expect(() => ask(15)).toThrow(expect.objectContaining({ field: 'tolerance' }));
    expect(() => ask(15)).toThrow('less than 15°');
    expect(ask(14.9)).toMatchObject({ verdict: 'fail', nearestCylinder: 7, error: 18 });
    expect(ask().assumed[0]).toContain('5° of distributor');
  });

  it('may be judged at another cylinder and with another tolerance', () => {
    const answer = rotorCheck({ cap, rotorAngle: 147, timing, cylinder: 3, tolerance: 12 });
    expect(answer).toMatchObject({ verdict: 'pass', wantedPost: '135', error: 12 });
  });
});

describe('at TDC', () => {
  it('is past its post by half the advance', () => {
    // 10° of crank are 5° of distributor.
    expect(rotorCheck({ cap, rotorAngle: 50, timing, crankAt: 'tdc' })).toMatchObject({
      verdict: 'pass',
      error: 0,
    });
    const late = { ...cap, rotation: 'anticlockwise' } as const;
    expect(rotorCheck({ cap: late, rotorAngle: 40, timing, crankAt: 'tdc' }).error).toBeCloseTo(0, 9);
  });

  it('is past it by all of the advance on a two-stroke', () => {
    const two = { ...cap, strokesPerCycle: 2 } as const;
    expect(rotorCheck({ cap: two, rotorAngle: 55, timing, crankAt: 'tdc' }).error).toBe(0);
  });

  it('knows the advance from the piston’s travel', () => {
    // T3-041, PM4: 8.796735233287677 mm down is 30° on 100 mm stroke and 150 mm rod, 15° of distributor.
    const piston = { pistonBeforeTdc: mm(8.796735233287677), stroke: mm(100), rodLength: mm(150) };
    const answer = rotorCheck({ cap, rotorAngle: 60, timing: piston, crankAt: 'tdc' });
    expect(answer.error).toBeCloseTo(0, 8);
  });
});

describe('the rotation', () => {
  it.each([
    ['same-way', 'clockwise', 45],
    ['other-way', 'anticlockwise', 45],
  ] as const)(
    'of a magneto’s armature, geared %s, is %s at the rotor',
    (gearedRotor, rotorTurns, rotorAngle) => {
      const answer = rotorCheck({ cap, rotorAngle, timing, rotationOf: 'armature', gearedRotor });
      expect(answer).toMatchObject({ rotorTurns, verdict: 'pass' });
    },
  );

  it('changes which post is past and which before', () => {
    const against = { ...cap, rotation: 'anticlockwise' } as const;
    expect(rotorCheck({ cap, rotorAngle: 60, timing }).error).toBe(15);
    expect(rotorCheck({ cap: against, rotorAngle: 60, timing }).error).toBe(-15);
  });
});

it('doubts a rotor that is right on a cap that does not suit the engine', () => {
  const odd = { ...cap, intervals: [150, 210, 150, 210] } as const;
  expect(rotorCheck({ cap: odd, rotorAngle: 45, timing }).verdict).toBe('doubtful');
});

describe('properties', () => {
  const anyCap = fc.record({
    firingOrder: fc.constantFrom(
      [1, 2],
      [1, 2, 3],
      [1, 3, 4, 2],
      [1, 5, 3, 6, 2, 4],
      [1, 8, 4, 3, 6, 5, 7, 2],
    ),
    rotation: fc.constantFrom<Rotation>('clockwise', 'anticlockwise'),
    rotationSeenFrom: fc.constantFrom('cap' as const, 'drive' as const),
  });
  const anyAngle = fc.integer({ min: -360, max: 360 });
  const other = (rotation: Rotation): Rotation => (rotation === 'clockwise' ? 'anticlockwise' : 'clockwise');

  it('says the same however the rotation and the angle were read: reversing twice changes nothing', () => {
    fc.assert(
      fc.property(anyCap, anyAngle, (engine, rotorAngle) => {
        const asked = { rotorAngle, timing, crankAt: 'tdc' } as const;
        const plain = rotorCheck({ cap: engine, ...asked });
        const turned = {
          ...engine,
          rotation: other(engine.rotation),
          rotationSeenFrom: engine.rotationSeenFrom === 'cap' ? ('drive' as const) : ('cap' as const),
        };
        expect({ ...rotorCheck({ cap: turned, ...asked }), reason: '' }).toEqual({ ...plain, reason: '' });
        const geared = rotorCheck({
          cap: { ...engine, rotation: other(engine.rotation) },
          ...asked,
          rotationOf: 'armature',
          gearedRotor: 'other-way',
        });
        expect({ ...geared, assumed: [] }).toEqual({ ...plain, assumed: [] });
        const seenBelow = rotorCheck({
          cap: engine,
          ...asked,
          rotorAngle: -rotorAngle,
          rotorSeenFrom: 'drive',
        });
        expect({ ...seenBelow, assumed: [] }).toEqual({ ...plain, assumed: [] });
      }),
    );
  });

  it('finds what a rotor is out by, from any place', () => {
    fc.assert(
      fc.property(anyCap, fc.integer({ min: -179, max: 180 }), fc.nat(15), (engine, out, pick) => {
        const { firingOrder } = engine;
        const place = pick % firingOrder.length;
        const turns = rotorCheck({ cap: engine, rotorAngle: 0, timing }).rotorTurns;
        const way = turns === 'clockwise' ? 1 : -1;
        // The posts stand evenly; cylinder at that place of the order has the post so many on from post 1 at 0°.
        const rotorAngle = (way * ((place * 360) / firingOrder.length + 5 + out)) % 360;
        const answer = rotorCheck({
          cap: engine,
          rotorAngle,
          timing,
          crankAt: 'tdc',
          cylinder: firingOrder[place],
        });
        expect(answer.error).toBeCloseTo(out, 9);
        expect(answer.crankError).toBeCloseTo(2 * out, 9);
        const half = firingOrder.length % 2 === 0 && Math.abs(out) >= 175;
        expect(answer.atCompanion).toBe(half);
      }),
    );
  });
});

it.each([
  ['request', []],
  ['cap', { rotorAngle: 0, timing }],
  ['cap.firingOrder[1]', { cap: { ...cap, firingOrder: [1, 1] }, rotorAngle: 0, timing }],
  ['rotorAngle', { cap, rotorAngle: NaN, timing }],
  ['rotorAngle', { cap, rotorAngle: 1e9, timing }],
  ['rotorSeenFrom', { cap, rotorAngle: 0, timing, rotorSeenFrom: 'below' }],
  ['timing', { cap, rotorAngle: 0 }],
  ['timing.advance', { cap, rotorAngle: 0, timing: {} }],
  ['timing.advance', { cap, rotorAngle: 0, timing: { advance: 91 } }],
  ['timing.advance', { cap, rotorAngle: 0, timing: { advance: 9, pistonBeforeTdc: mm(1) } }],
  ['timing.stroke', { cap, rotorAngle: 0, timing: { pistonBeforeTdc: mm(1) } }],
  [
    'timing.rodLength',
    { cap, rotorAngle: 0, timing: { pistonBeforeTdc: mm(1), stroke: mm(90), rodLength: mm(40) } },
  ],
  [
    'timing.pistonBeforeTdc',
    { cap, rotorAngle: 0, timing: { pistonBeforeTdc: mm(90), stroke: mm(90), rodLength: mm(140) } },
  ],
  [
    'timing.pistonBeforeTdc',
    { cap, rotorAngle: 0, timing: { pistonBeforeTdc: mm(91), stroke: mm(90), rodLength: mm(140) } },
  ],
  ['crankAt', { cap, rotorAngle: 0, timing, crankAt: 'bdc' }],
  ['cylinder', { cap, rotorAngle: 0, timing, cylinder: 5 }],
  ['rotationOf', { cap, rotorAngle: 0, timing, rotationOf: 'crank' }],
  ['gearedRotor', { cap, rotorAngle: 0, timing, rotationOf: 'armature' }],
  ['gearedRotor', { cap, rotorAngle: 0, timing, gearedRotor: 'same-way' }],
  ['tolerance', { cap, rotorAngle: 0, timing, tolerance: -1 }],
])('refuses by %s', (field, request) => {
  expect(() => rotorCheck(request as RotorCheckRequest)).toThrow(expect.objectContaining({ field }));
});
