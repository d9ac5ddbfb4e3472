import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { TimingMarksRequest } from '../contracts/ignition-checks.js';
import { timingMarks } from './timing-marks.js';

const inches = (value: number) => ({ value, unit: 'in' }) as const;

describe('timing marks', () => {
  it('stand as far apart as the worked example prints', () => {
    // T3-049, DMP1: 6° on 6.6875 in is 0.3501 in (0.35016 cut off).
    const { arc } = timingMarks({ diameter: inches(6.6875), angle: 6 });
    expect(arc.value).toBeCloseTo(0.35015668118136234, 12);
    expect(arc.unit).toBe('in');
    // T3-051, DMP3: a degree on 8 in; a tenth of the rim is 36°.
    const eight = timingMarks({ diameter: inches(8), angle: 36 });
    expect(eight.arcPerDegree.value).toBeCloseTo(0.06981317007977318, 12);
    expect(eight.arc.value).toBeCloseTo((Math.PI * 8) / 10, 12);
  });

  it('go from angle to arc and back, in any unit', () => {
    const angles = fc.double({ min: 0, max: 360, noNaN: true });
    fc.assert(
      fc.property(angles, fc.double({ min: 1, max: 1000, noNaN: true }), (angle, size) => {
        const diameter = { value: size, unit: 'mm' } as const;
        const { arc } = timingMarks({ diameter, angle });
        const back = timingMarks({ diameter, arc: { value: arc.value / 25.4, unit: 'in' } });
        expect(back.angle).toBeCloseTo(angle, 8);
        expect(back.arc.unit).toBe('in');
        expect(back.arcPerDegree.value * 360 * 25.4).toBeCloseTo(Math.PI * size, 8);
      }),
    );
  });
});

it.each([
  ['diameter', { angle: 6 }],
  ['diameter.value', { diameter: inches(0), angle: 6 }],
  ['diameter.unit', { diameter: { value: 6, unit: 'lb' }, angle: 6 }],
  ['angle', { diameter: inches(6) }],
  ['angle', { diameter: inches(6), angle: 6, arc: inches(1) }],
  ['angle', { diameter: inches(6), angle: 361 }],
  ['angle', { diameter: inches(6), angle: NaN }],
  ['arc', { diameter: inches(6), arc: inches(19) }],
  ['arc.value', { diameter: inches(6), arc: inches(-1) }],
])('refuses by %s', (field, request) => {
  expect(() => timingMarks(request as TimingMarksRequest)).toThrow(expect.objectContaining({ field }));
});
