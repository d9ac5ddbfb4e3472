import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { ThreadStackRequest } from '../contracts/fastening.js';
import { InputError } from '../contracts/input-error.js';
import type { Quantity } from '../contracts/quantity.js';
import { threadStack } from './thread-stack.js';

const mm = (value: number): Quantity => ({ value, unit: 'mm' });
const inch = (value: number): Quantity => ({ value, unit: 'in' });
const nutted: ThreadStackRequest = {
  thread: 'M10x1.5',
  boltLength: mm(50),
  grip: mm(35),
  washers: mm(2),
  into: { nutHeight: mm(8.4) },
};
const tapped: ThreadStackRequest = {
  thread: 'M10x1.5',
  boltLength: mm(50),
  grip: mm(30),
  into: { material: 'aluminium', threadDepth: mm(25), holeDepth: mm(30) },
};

describe('a bolt into a nut', () => {
  it('comes through by its length less grip, washers and nut', () => {
    // By hand: 50 − 35 − 2 − 8.4 = 4.6 mm, 4.6/1.5 pitches; needed 35 + 2 + 8.4 + 1.5.
    const { verdict, protrusion, engagement, engagementInDiameters, lengthNeeded } = threadStack(nutted);
    expect(verdict).toBe('pass');
    expect(protrusion?.length.value).toBeCloseTo(4.6, 9);
    expect(protrusion?.pitches).toBeCloseTo(4.6 / 1.5, 9);
    expect(engagement.value).toBeCloseTo(8.4, 9);
    expect(engagementInDiameters).toBeCloseTo(0.84, 9);
    expect(lengthNeeded.value).toBeCloseTo(46.9, 9);
  });

  it('takes the height of the table where none is given, and says so', () => {
    // ISO 4032, M10: m max 8.4 mm (from memory).
    const { protrusion, assumed } = threadStack({ ...nutted, into: {} });
    expect(protrusion?.length.value).toBeCloseTo(4.6, 9);
    expect(assumed.join()).toContain('ISO 4032');
  });

  it.each([
    [46.9, 'pass', 'comes past the nut'],
    [46.8, 'fail', 'a bolt of 46.9\u2009mm'],
    [44, 'fail', 'ends 1.4\u2009mm inside the nut'],
    [36, 'fail', 'does not reach the nut'],
  ] as const)('of %s mm: %s', (length, verdict, words) => {
    const stack = threadStack({ ...nutted, boltLength: mm(length) });
    expect(stack.verdict).toBe(verdict);
    expect(stack.reason).toContain(words);
    expect(stack.engagement.value).toBeGreaterThanOrEqual(0);
  });

  it('answers in the unit of its length, and asks for the height of an inch nut', () => {
    const stud = {
      ...nutted,
      thread: '3/8-24 UNF',
      boltLength: inch(2),
      grip: inch(1.5),
      washers: undefined,
    };
    expect(() => threadStack({ ...stud, into: {} })).toThrow(
      expect.objectContaining({ field: 'into.nutHeight' }),
    );
    const { protrusion } = threadStack({ ...stud, into: { nutHeight: inch(0.328), leastPitches: 2 } });
    expect(protrusion?.length.unit).toBe('in');
    expect(protrusion?.length.value).toBeCloseTo(0.172, 9);
    expect(protrusion?.pitches).toBeCloseTo(0.172 * 24, 9);
  });
});

describe('a bolt into a tapped hole', () => {
  it.each([
    // Common practice, no source: 2 × the diameter in aluminium, 1 × in steel; a pitch of thread left over.
    [50, 'pass', 20, 5],
    [49, 'fail', 19, 6],
    [53.5, 'pass', 23.5, 1.5],
    [54.5, 'doubtful', 24.5, 0.5],
    [56, 'fail', 25, -1],
    [61, 'fail', 25, -6],
  ] as const)('of %s mm: %s', (length, verdict, engagement, spare) => {
    const stack = threadStack({ ...tapped, boltLength: mm(length) });
    expect(stack.verdict).toBe(verdict);
    expect(stack.engagement.value).toBeCloseTo(engagement, 9);
    expect(stack.spare?.value).toBeCloseTo(spare, 9);
  });

  it('says which of bottoming, running out of thread and short engagement it is', () => {
    const reason = (more: Partial<ThreadStackRequest>) => threadStack({ ...tapped, ...more }).reason;
    expect(reason({ boltLength: mm(61) })).toContain('bottoms');
    expect(reason({ boltLength: mm(56) })).toContain('past the end of the full thread');
    expect(reason({ boltLength: mm(45) })).toContain('a bolt of at least 50.0\u2009mm');
    expect(reason({ boltLength: mm(20) })).toContain('does not reach the hole');
    expect(reason({ into: { material: 'aluminium', threadDepth: mm(15) } })).toContain('No bolt helps');
  });

  it('cannot bottom in a through hole', () => {
    const stack = threadStack({
      ...tapped,
      boltLength: mm(70),
      into: { material: 'steel', threadDepth: mm(25) },
    });
    expect(stack.verdict).toBe('pass');
    expect(stack).not.toHaveProperty('spare');
  });
});

describe('input that cannot be used', () => {
  it.each([
    ['request', null],
    ['thread', { ...nutted, thread: '3/8-16' }],
    ['boltLength.value', { ...nutted, boltLength: mm(0) }],
    ['boltLength.value', { ...nutted, boltLength: mm(1e9) }],
    ['grip.value', { ...nutted, grip: mm(-1) }],
    ['grip', { ...nutted, grip: 35 }],
    ['washers.unit', { ...nutted, washers: { value: 2, unit: 'bar' } }],
    ['into', { ...nutted, into: 'a nut' }],
    ['into.nutHeight.value', { ...nutted, into: { nutHeight: mm(0) } }],
    ['into.leastPitches', { ...nutted, into: { leastPitches: -1 } }],
    ['into.material', { ...tapped, into: { material: 'cheese', threadDepth: mm(20) } }],
    ['into.threadDepth', { ...tapped, into: { material: 'steel' } }],
    ['into.holeDepth', { ...tapped, into: { material: 'steel', threadDepth: mm(20), holeDepth: mm(19) } }],
  ])('%s', (field, request) => {
    expect(() => threadStack(request as ThreadStackRequest)).toThrow(InputError);
    expect(() => threadStack(request as ThreadStackRequest)).toThrow(expect.objectContaining({ field }));
  });
});

it('a bolt of the length needed always comes through enough', () => {
  const length = fc.double({ min: 1, max: 500, noNaN: true });
  fc.assert(
    fc.property(length, length, (bolt, grip) => {
      const first = threadStack({ ...nutted, boltLength: mm(bolt), grip: mm(grip) });
      const again = threadStack({ ...nutted, boltLength: first.lengthNeeded, grip: mm(grip) });
      expect(again.verdict).toBe('pass');
    }),
  );
});
