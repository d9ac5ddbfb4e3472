import { describe, expect, it } from 'vitest';
import type { LifterPreloadRequest } from '../contracts/valve-figures.js';
import { lifterPreload } from './lifter-preload.js';

const thread = { value: 1 / 24, unit: 'in' } as const;
const inches = (value: number) => ({ value, unit: 'in' }) as const;

describe('preload of a hydraulic lifter', () => {
  it('is turns times pitch at the push rod', () => {
    // By definition of the pitch: ¾ of 1/24 in is 1/32 in.
    const answer = lifterPreload({ turns: 0.75, pitch: thread });
    expect(answer.preload).toEqual(inches(0.03125));
    expect(answer.verdict).toBe('not-judged');
  });

  it('is more at the pivot, for the rocker tips about the valve', () => {
    // Lever about the valve's tip: pivot at 1.5 units, push rod at 2.5. One turn of 1 mm lowers it 2.5/1.5 mm.
    const pitch = { value: 1, unit: 'mm' } as const;
    const answer = lifterPreload({ turns: 1, pitch, adjuster: 'pivot', rockerRatio: 1.5 });
    expect(answer.preload.value).toBeCloseTo(2.5 / 1.5, 12);
    expect(answer.reason).toContain('1 turn past');
    expect(lifterPreload({ turns: 0.125, pitch }).reason).toContain('0.125 turns past');
  });

  it.each([
    [0.02, 0.06, 'pass'],
    [0.04, 0.06, 'fail'],
    [0.01, 0.02, 'fail'],
  ])('is judged from %d to %d in', (low, high, verdict) => {
    const limits = { low: inches(low), high: inches(high) };
    const answer = lifterPreload({ turns: 0.75, pitch: thread, limits });
    expect(answer.verdict).toBe(verdict);
    expect(answer.reason).toMatch(/^0\.75 turns past zero clearance: 0\.03125\u2009in is /);
  });
});

it.each([
  ['turns', { pitch: thread }],
  ['turns', { turns: -1, pitch: thread }],
  ['turns', { turns: 1000, pitch: thread }],
  ['pitch.value', { turns: 1, pitch: inches(0) }],
  ['adjuster', { turns: 1, pitch: thread, adjuster: 'nut' }],
  ['rockerRatio', { turns: 1, pitch: thread, adjuster: 'pivot' }],
  ['rockerRatio', { turns: 1, pitch: thread, adjuster: 'pivot', rockerRatio: 0 }],
  ['limits.low', { turns: 1, pitch: thread, limits: { low: inches(2), high: inches(1) } }],
  ['limits.high', { turns: 1, pitch: thread, limits: { low: inches(1) } }],
])('refuses by %s', (field, request) => {
  expect(() => lifterPreload(request as LifterPreloadRequest)).toThrow(expect.objectContaining({ field }));
});
