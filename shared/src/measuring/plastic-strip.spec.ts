import fc from 'fast-check';
import { expect, it } from 'vitest';
import type { PlasticStripRequest } from '../contracts/measuring.js';
import { plasticStrip } from './plastic-strip.js';

const mm = (value: number) => ({ value, unit: 'mm' }) as const;

it('gives the clearance by the volume of the strip', () => {
  // T7-013, PGS: a strip's specification, clearance = constant ÷ flattened width.
  const { clearance } = plasticStrip({ diameter: mm(0.2), width: mm(0.6) });
  expect(clearance.value).toBeCloseTo(0.05235987755982989, 14);
  expect(clearance.unit).toBe('mm');
});

it('is always flatter than the strip was round', () => {
  const size = fc.double({ min: 0.01, max: 2, noNaN: true });
  fc.assert(
    fc.property(size, size, (diameter, more) => {
      const { clearance } = plasticStrip({ diameter: mm(diameter), width: mm(diameter + more) });
      expect(clearance.value).toBeLessThan(diameter);
    }),
  );
});

it.each<[string, unknown]>([
  ['diameter.value', { diameter: mm(0), width: mm(1) }],
  ['width.value', { diameter: mm(0.2), width: mm(NaN) }],
  ['width', { diameter: mm(0.2), width: mm(0.2) }],
])('is refused on %s', (field, request) => {
  expect(() => plasticStrip(request as PlasticStripRequest)).toThrow(expect.objectContaining({ field }));
});
