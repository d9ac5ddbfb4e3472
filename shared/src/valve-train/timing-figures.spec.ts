import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { TimingFiguresRequest } from '../contracts/valve-figures.js';
import { timingFigures } from './timing-figures.js';

const timing = { ivo: 7, ivc: 39, evo: 51, evc: 3 };
const quotedAt = { lift: { value: 1, unit: 'mm' } } as const;

describe('the figures of a timing', () => {
  it('follow from the four events', () => {
    // T3-002, VT2: durations, overlap, centre lines and separation of 7/39/51/3.
    const answer = timingFigures({ timing, quotedAt });
    expect(answer).toMatchObject({
      duration: { inlet: 226, exhaust: 234 },
      overlap: 10,
      lobeCentre: { inlet: 106, exhaust: 114 },
      lobeSeparation: 110,
      verdict: 'not-judged',
    });
    // Straight up, both centres would be at 110°: by definition 4° advanced.
    expect(answer.advance).toBe(4);
    expect(answer).not.toHaveProperty('late');
    expect(answer.assumed).toEqual([expect.stringContaining('symmetrical')]);
  });

  it('say that a lobe that is not symmetrical has its greatest lift elsewhere', () => {
    const { assumed } = timingFigures({ timing, quotedAt, symmetrical: false });
    expect(assumed[0]).toMatch(/not symmetrical.*not the greatest lift/);
  });

  it('advance by what the camshaft is turned forwards, and nothing else changes', () => {
    const figure = fc.integer({ min: 0, max: 60 });
    const anyTiming = fc.record({ ivo: figure, ivc: figure, evo: figure, evc: figure });
    fc.assert(
      fc.property(anyTiming, fc.integer({ min: -15, max: 15 }), ({ ivo, ivc, evo, evc }, by) => {
        const before = timingFigures({ timing: { ivo, ivc, evo, evc }, quotedAt });
        const turned = { ivo: ivo + by, ivc: ivc - by, evo: evo + by, evc: evc - by };
        const after = timingFigures({
          timing: turned,
          quotedAt,
          spec: { timing: { ivo, ivc, evo, evc }, quotedAt },
        });
        expect(after.advance - before.advance).toBeCloseTo(by, 9);
        expect([after.duration, after.overlap]).toEqual([before.duration, before.overlap]);
        expect(Object.values(after.late ?? {}).map((late) => late + by)).toEqual([0, 0, 0, 0]);
        expect(after.verdict).toBe(Math.abs(by) <= 2 ? 'pass' : 'fail');
        // Overlap is both durations' mean less twice the separation: an identity printed with T3-001.
        const { duration, overlap, lobeSeparation } = after;
        expect((duration.inlet + duration.exhaust) / 2 - 2 * lobeSeparation).toBeCloseTo(overlap, 9);
      }),
    );
  });
});

describe('against a spec', () => {
  const spec = { timing, quotedAt };

  it('finds a camshaft that is late as a whole', () => {
    // 12° late: openings 12° nearer to their dead centre, closings 12° farther past theirs.
    const late = { ivo: -5, ivc: 51, evo: 39, evc: 15 };
    const answer = timingFigures({ timing: late, quotedAt, spec });
    expect(answer.late).toEqual({ ivo: 12, ivc: 12, evo: 12, evc: 12 });
    expect(answer.verdict).toBe('fail');
    expect(answer.reason).toContain('the whole camshaft stands 12° late');
    expect(timingFigures({ timing: late, quotedAt, spec, tolerance: 12 }).verdict).toBe('pass');
  });

  it('finds events that are not out alike', () => {
    const answer = timingFigures({ timing: { ...timing, ivc: 49 }, quotedAt, spec });
    expect(answer.late).toEqual({ ivo: 0, ivc: 10, evo: 0, evc: 0 });
    expect(answer.reason).toContain('They are not out alike');
  });

  it.each([
    ['another lift', { lift: { value: 0.05, unit: 'in' } }],
    ['a lash', { lash: { value: 1, unit: 'mm' } }],
  ] as const)('does not compare figures quoted at %s', (_, other) => {
    const answer = timingFigures({ timing, quotedAt, spec: { timing, quotedAt: other } });
    expect(answer.verdict).toBe('not-judged');
    expect(answer).not.toHaveProperty('late');
    expect(answer.reason).toContain('are not compared');
  });

  it('compares the same lift in another unit', () => {
    const thou = { lift: { value: 50, unit: 'thou' } } as const;
    const inch = { lift: { value: 1.27, unit: 'mm' } } as const;
    expect(timingFigures({ timing, quotedAt: thou, spec: { timing, quotedAt: inch } }).verdict).toBe('pass');
  });
});

it.each([
  ['timing', { quotedAt }],
  ['timing.ivo', { timing: { ...timing, ivo: NaN }, quotedAt }],
  ['quotedAt', { timing, quotedAt: {} }],
  ['quotedAt', { timing, quotedAt: { ...quotedAt, lash: quotedAt.lift } }],
  ['quotedAt.lift.value', { timing, quotedAt: { lift: { value: 0, unit: 'mm' } } }],
  ['quotedAt.lash.unit', { timing, quotedAt: { lash: { value: 0, unit: 'N' } } }],
  ['spec.timing.evc', { timing, quotedAt, spec: { timing: { ...timing, evc: 900 }, quotedAt } }],
  ['spec.quotedAt', { timing, quotedAt, spec: { timing } }],
  ['tolerance', { timing, quotedAt, tolerance: -1 }],
  ['symmetrical', { timing, quotedAt, symmetrical: 'yes' }],
])('refuses by %s', (field, request) => {
  expect(() => timingFigures(request as TimingFiguresRequest)).toThrow(expect.objectContaining({ field }));
});
