import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { BeltAlignmentRequest } from '../contracts/belt-drive.js';
import { InputError } from '../contracts/input-error.js';
import { beltAlignment } from './belt-alignment.js';

const mm = (value: number) => ({ value, unit: 'mm' }) as const;
const gaps = (driverNear: number, driverFar: number, drivenNear: number, drivenFar: number) => ({
  driverNear: mm(driverNear),
  driverFar: mm(driverFar),
  drivenNear: mm(drivenNear),
  drivenFar: mm(drivenFar),
});
const drive = (...rims: readonly [number, number, number, number]): BeltAlignmentRequest => ({
  span: mm(300),
  gaps: gaps(...rims),
  driverDiameter: mm(100),
  drivenDiameter: mm(100),
});

describe('offset and angle', () => {
  it.each([
    ['straight', [0, 0, 0, 0], 0, 0],
    ['driven 2 mm back', [0, 0, 2, 2], 2, 0],
    // Both planes lean alike and lie in one: the edge was laid askew. Each 100 mm of way gains 1 mm of gap.
    ['an edge laid askew', [0.5, -0.5, 2.5, 3.5], 0, 0],
    // T6-021: tan 0.5° is 0.872 686 779 mm per 100 mm.
    ['driven turned 0.5°', [0, 0, 0.8726867790758789, 0], 0.8726867790758789 / 2, 0.5],
    // T6-026 over 500 mm is 4.363 433 895 mm; over 300 mm three fifths of it.
    [
      'driver turned 0.5°',
      [0, 0.8726867790758789, 0.43634338953793945, 0.43634338953793945],
      2.6180603372276365,
      -0.5,
    ],
  ] as const)('%s', (_, rims, offset, angle) => {
    const answer = beltAlignment(drive(...(rims as readonly [number, number, number, number])));
    expect(answer.offset.unit).toBe('mm');
    expect(answer.offset.value).toBeCloseTo(offset, 9);
    expect(answer.angle).toBeCloseTo(angle, 9);
  });

  it('are of the grooves where their depth behind the rim is given', () => {
    // Rims in one plane; the driven groove lies 3 mm further behind its rim.
    const faceToGroove = { driver: mm(9), driven: mm(12) };
    expect(beltAlignment({ ...drive(0, 0, 0, 0), faceToGroove }).offset.value).toBeCloseTo(3, 9);
    expect(beltAlignment({ ...drive(0, 0, -3, -3), faceToGroove }).offset.value).toBeCloseTo(0, 9);
  });

  it('do not change with how the straight edge is laid', () => {
    const gap = fc.double({ min: -5, max: 5, noNaN: true });
    // Laying it askew by a slope s adds s·x to each gap, x from the driver's middle.
    fc.assert(
      fc.property(gap, gap, gap, gap, fc.double({ min: -0.01, max: 0.01, noNaN: true }), (a, b, c, d, s) => {
        const first = beltAlignment(drive(a, b, c, d));
        const askew = beltAlignment(drive(a + s * 50, b - s * 50, c + s * 250, d + s * 350));
        expect(askew.offset.value).toBeCloseTo(first.offset.value, 9);
        // The angle is a difference of arc tangents: alike to the third order of so small slopes.
        expect(askew.angle).toBeCloseTo(first.angle, 1);
      }),
    );
  });
});

describe('the limits', () => {
  it.each([
    [drive(0, 0, 2.61, 2.61), 'pass'],
    [drive(0, 0, 2.62, 2.62), 'fail'],
    [drive(0, 0, -2.62, -2.62), 'fail'],
    [drive(0, 0, 0.43, -0.43), 'pass'],
    [drive(0, 0, 0.44, -0.44), 'fail'],
    [{ ...drive(0, 0, 2.62, 2.62), limit: { offsetPerSpan: 0.01 } }, 'pass'],
    [{ ...drive(0, 0, 0.43, -0.43), limit: { angle: 0.25 } }, 'fail'],
  ] as const)('%#', (request, verdict) => {
    // 0.0087 · 300 mm = 2.61 mm; tan 0.5° · 100 mm = 0.8727 mm (T6-021).
    expect(beltAlignment(request).verdict).toBe(verdict);
  });

  it('stand in the reason', () => {
    expect(beltAlignment(drive(0, 0, 3, 3)).reason).toMatch(
      /3\smm out of one plane \(at most 2\.61\smm over this span\)/,
    );
  });
});

describe('input that cannot be used', () => {
  const good = drive(0, 0, 1, 1);
  it.each([
    ['request', 'x'],
    ['span.value', { ...good, span: mm(0) }],
    ['span', { ...good, span: undefined }],
    ['gaps', { ...good, gaps: [] }],
    ['gaps.drivenFar', { ...good, gaps: { ...good.gaps, drivenFar: 1 } }],
    ['gaps.driverNear.value', { ...good, gaps: { ...good.gaps, driverNear: mm(NaN) } }],
    ['driverDiameter.value', { ...good, driverDiameter: mm(-1) }],
    ['gaps.drivenFar', drive(0, 0, 1, 102)],
    ['gaps.driverFar', drive(0, 102, 1, 1)],
    ['drivenDiameter.unit', { ...good, drivenDiameter: { value: 1, unit: 'bar' } }],
    ['faceToGroove.driven', { ...good, faceToGroove: { driver: mm(9) } }],
    ['limit.angle', { ...good, limit: { angle: -1 } }],
    ['limit.offsetPerSpan', { ...good, limit: { offsetPerSpan: '0.01' } }],
  ])('%s', (field, request) => {
    expect(() => beltAlignment(request as BeltAlignmentRequest)).toThrow(InputError);
    expect(() => beltAlignment(request as BeltAlignmentRequest)).toThrow(expect.objectContaining({ field }));
  });
});
