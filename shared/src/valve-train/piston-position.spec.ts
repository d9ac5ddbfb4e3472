import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { PistonHeightRequest } from '../contracts/valve-figures.js';
import { pistonHeight } from './piston-position.js';

const mm = (value: number) => ({ value, unit: 'mm' }) as const;
const inches = (value: number) => ({ value, unit: 'in' }) as const;
const hundred = { stroke: mm(100), rodLength: mm(150) };

describe('where the piston stands', () => {
  it.each([
    // T3-040 … T3-046, PM4: the slider-crank equation, worked out outside.
    [10, 1.0111039228199843],
    [30, 8.796735233287677],
    [90, 58.57864376269049],
    [120, 81.38593383654926],
    [180, 100],
    [0, 0],
  ])('at %d° of 100 mm stroke and 150 mm rod', (crank, expected) => {
    for (const same of [crank, -crank, crank + 720]) {
      const answer = pistonHeight({ ...hundred, crank: same });
      expect(answer.fromTop.value).toBeCloseTo(expected, 10);
      expect(answer.crank).toBeCloseTo(crank, 10);
    }
    expect(pistonHeight({ ...hundred, fromTop: mm(expected) }).crank).toBeCloseTo(crank, 6);
  });

  it('finds the angle at half the stroke', () => {
    // T3-047, PM4: acos(50/300).
    const { crank } = pistonHeight({ ...hundred, fromTop: { value: 5, unit: 'cm' } });
    expect(crank).toBeCloseTo(80.4059317731395, 10);
  });

  it('moves as fast as the worked example', () => {
    const engine = { stroke: inches(3.307), rodLength: inches(6.024), crankSpeed: 6000 };
    // T3-030, PM1: pin height at TDC 7.6775 in (prints 7.68).
    expect(pistonHeight({ ...engine, crank: 0 }).pinHeight.value).toBeCloseTo(7.6775, 10);
    const top = pistonHeight({ ...engine, crank: 0 });
    // T3-032, PM1: that angle is reached in 0.0021006534042130893 s, which is θ/(6 · 6000).
    expect(top.greatestSpeedAt / 36_000).toBeCloseTo(0.0021006534042130893, 12);
    // T3-033, PM1: pin height there 6.2177 in (prints 6.218).
    const there = pistonHeight({ ...engine, crank: top.greatestSpeedAt });
    expect(there.pinHeight.value).toBeCloseTo(6.217707632015666, 9);
    // T3-034, PM1: 1077.54 in/s (prints 1078); 1 in = 0.0254 m.
    expect(top.greatestSpeed).toBeCloseTo(1077.5402279590255 * 0.0254, 9);
  });

  it('gives the mean speed', () => {
    // MPS1: 90 mm at 3000 rev/min is 9 m/s, at 7200 rev/min 21.6 m/s.
    const engine = { stroke: mm(90), rodLength: mm(150), crank: 0 };
    expect(pistonHeight({ ...engine, crankSpeed: 3000 }).meanSpeed).toBeCloseTo(9, 12);
    expect(pistonHeight({ ...engine, crankSpeed: 7200 }).meanSpeed).toBeCloseTo(21.6, 12);
    expect(pistonHeight(engine)).not.toHaveProperty('meanSpeed');
  });

  it('is fastest where the acceleration is nothing', () => {
    // T3-038: r = 2, l = 6, the root by three methods, right to 8 decimals; in 40 digits it is 73.175 296 636 241 2°.
    const { greatestSpeedAt } = pistonHeight({ stroke: mm(4), rodLength: mm(6), crank: 0 });
    expect(greatestSpeedAt).toBeCloseTo(73.1752966362412, 11);
  });

  it('goes from angle to height and back, and never is faster than its greatest speed', () => {
    const anyEngine = fc.record({
      stroke: fc.double({ min: 10, max: 300, noNaN: true }),
      ratio: fc.double({ min: 0.51, max: 5, noNaN: true }),
      crank: fc.double({ min: 1, max: 179, noNaN: true }),
    });
    fc.assert(
      fc.property(anyEngine, ({ stroke, ratio, crank }) => {
        const engine = { stroke: mm(stroke), rodLength: mm(stroke * ratio), crankSpeed: 3000 };
        const at = pistonHeight({ ...engine, crank });
        expect(pistonHeight({ ...engine, fromTop: at.fromTop }).crank).toBeCloseTo(crank, 5);
        const step = 0.01;
        const next = pistonHeight({ ...engine, crank: crank + step });
        // 3000 rev/min are 18 000° a second.
        const speed = ((next.fromTop.value - at.fromTop.value) / 1000 / step) * 18_000;
        expect(speed).toBeLessThanOrEqual((at.greatestSpeed ?? NaN) * (1 + 1e-6));
      }),
    );
  });
});

it.each([
  ['request', null],
  ['stroke', { rodLength: mm(150), crank: 0 }],
  ['stroke.value', { ...hundred, stroke: mm(0), crank: 0 }],
  ['rodLength', { ...hundred, rodLength: mm(50), crank: 0 }],
  ['rodLength.unit', { ...hundred, rodLength: { value: 1, unit: 'N' }, crank: 0 }],
  ['crank', hundred],
  ['crank', { ...hundred, crank: 0, fromTop: mm(0) }],
  ['crank', { ...hundred, crank: Infinity }],
  ['fromTop', { ...hundred, fromTop: mm(100.01) }],
  ['fromTop.value', { ...hundred, fromTop: mm(-1) }],
  ['crankSpeed', { ...hundred, crank: 0, crankSpeed: 0 }],
  ['crankSpeed', { ...hundred, crank: 0, crankSpeed: NaN }],
])('refuses by %s', (field, request) => {
  expect(() => pistonHeight(request as PistonHeightRequest)).toThrow(expect.objectContaining({ field }));
});
