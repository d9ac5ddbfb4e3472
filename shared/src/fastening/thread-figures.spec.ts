import { describe, expect, it } from 'vitest';
import { InputError } from '../contracts/input-error.js';
import type { ThreadFiguresRequest } from '../contracts/fastening.js';
import { threadFigures } from './thread-figures.js';

describe('the figures of a thread', () => {
  it('are in mm for a metric thread', () => {
    // T4-003, EE-MA: M10x1.5, d2 = 9.0257, d3 = 8.1597, As = 57.99 mm² (ISO 898-1 prints 58.0).
    const { diameter, pitch, pitchDiameter, minorDiameter, stressArea } = threadFigures({ thread: 'M10' });
    expect([diameter, pitch]).toEqual([
      { value: 10, unit: 'mm' },
      { value: 1.5, unit: 'mm' },
    ]);
    expect(pitchDiameter.value).toBeCloseTo(9.025721420742506, 9);
    expect(minorDiameter.value).toBeCloseTo(8.159696016958067, 9);
    expect(stressArea.unit).toBe('mm2');
    expect(stressArea.value).toBeCloseTo(57.98959310705632, 9);
  });

  it('are in inches for a Unified one', () => {
    // T4-016, EE-UN: 3/8-16 prints 0.0775 in².
    const figures = threadFigures({ thread: '3/8 UNC' });
    expect(figures).toMatchObject({
      name: '3/8-16 UNC',
      perInch: 16,
      diameter: { value: 0.375, unit: 'in' },
    });
    expect(figures.pitch.value).toBeCloseTo(1 / 16, 12);
    expect(figures.stressArea.unit).toBe('in2');
    expect(figures.stressArea.value).toBeCloseTo(0.0775, 4);
  });

  it('are those of the Whitworth form for a BSW one', () => {
    // T4-028, BSW: 3/8, pitch diameter 0.3350, minor diameter 0.2950 in.
    const { pitchDiameter, minorDiameter } = threadFigures({ thread: '3/8 BSW' });
    expect(pitchDiameter.value).toBeCloseTo(0.335, 3);
    expect(minorDiameter.value).toBeCloseTo(0.295, 3);
  });

  it.each([[null], [{}], [{ thread: 'M11.5' }]])('%j cannot be used', (request) => {
    expect(() => threadFigures(request as ThreadFiguresRequest)).toThrow(InputError);
  });
});
