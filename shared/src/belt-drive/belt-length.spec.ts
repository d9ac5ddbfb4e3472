import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { BeltLengthRequest } from '../contracts/belt-drive.js';
import { InputError } from '../contracts/input-error.js';
import { beltLength } from './belt-length.js';

const mm = (value: number) => ({ value, unit: 'mm' }) as const;
const belt = (driver: number, driven: number, centres: number): BeltLengthRequest => ({
  driverDiameter: mm(driver),
  drivenDiameter: mm(driven),
  centres: mm(centres),
});

describe('length of an open belt', () => {
  it.each([
    // T6-004: both of one size, where the tangent form 2R(π − α + tan α) has tan 90°.
    [150, 150, 400, 1271.238898038469],
    // T6-006 and T6-007, exact.
    [132, 71, 284.5, 891.1445683578838],
    [180, 60, 130, 665.2098068452814],
    // T6-002, printed as 27.32 m.
    [1600, 500, 12000, 27323.885035303434],
  ])('%d and %d mm, %d mm apart', (driver, driven, centres, length) => {
    expect(beltLength(belt(driver, driven, centres)).length.value).toBeCloseTo(length, 8);
    expect(beltLength(belt(driven, driver, centres)).length.value).toBeCloseTo(length, 8);
  });

  it('does not jump where the pulleys come to one size', () => {
    // Of D + δ and D the length grows by π/2·δ while δ is small.
    const [one, other] = [beltLength(belt(150, 150, 400)), beltLength(belt(150 + 1e-6, 150, 400))];
    expect(other.length.value - one.length.value).toBeCloseTo((Math.PI / 2) * 1e-6, 10);
    expect(one.wrap).toEqual({ driver: 180, driven: 180 });
    expect(one.ratio).toBe(1);
  });

  it('is the same by the tangent form where that has no pole', () => {
    // Source BL2: 2R(π − α + tan α) + 2r(α − tan α), cos α = (R − r)/C.
    const size = fc.double({ min: 20, max: 400, noNaN: true });
    fc.assert(
      fc.property(size, size, fc.double({ min: 1.01, max: 10, noNaN: true }), (a, b, times) => {
        fc.pre(Math.abs(a - b) > 1);
        const [big, small] = [Math.max(a, b) / 2, Math.min(a, b) / 2];
        const centres = (big + small) * times;
        const angle = Math.acos((big - small) / centres);
        const tangent = 2 * big * (Math.PI - angle + Math.tan(angle)) + 2 * small * (angle - Math.tan(angle));
        expect(beltLength(belt(a, b, centres)).length.value).toBeCloseTo(tangent, 6);
      }),
    );
  });

  it('gives ratio and wrap, and keeps the unit of the centres', () => {
    // T6-010 (electrical handbook): 48 in drives 12 in at 1200 for 300 rev/min.
    const answer = beltLength({
      driverDiameter: { value: 48, unit: 'in' },
      drivenDiameter: { value: 1, unit: 'ft' },
      centres: { value: 2, unit: 'm' },
    });
    expect(answer.ratio).toBeCloseTo(4, 12);
    expect(answer.length.unit).toBe('m');
    expect(answer.wrap.driver + answer.wrap.driven).toBeCloseTo(360, 12);
    expect(answer.wrap.driver).toBeGreaterThan(180);
  });
});

describe('input that cannot be used', () => {
  it.each([
    ['request', null],
    ['driverDiameter.value', belt(0, 60, 200)],
    ['drivenDiameter.value', belt(60, -60, 200)],
    ['centres.value', belt(60, 60, Infinity)],
    ['centres', belt(180, 60, 119)],
    ['centres.unit', { ...belt(60, 60, 200), centres: { value: 200, unit: 'N' } }],
  ])('%s', (field, request) => {
    expect(() => beltLength(request as BeltLengthRequest)).toThrow(InputError);
    expect(() => beltLength(request as BeltLengthRequest)).toThrow(expect.objectContaining({ field }));
  });
});
