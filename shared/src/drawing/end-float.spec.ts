import { describe, expect, it } from 'vitest';
import { partsOf, unreadable, wordsOf } from './drawing-case.js';
import { drawEndFloat } from './end-float.js';
import type { Drawing, RectShape } from './shapes.js';

/** Drawing units to a millimetre, as the other parts are drawn. */
const perMillimetre = 5;

function gap(drawing: Drawing): number {
  return (partsOf(drawing, 'gap')[0] as RectShape).width;
}

function exaggeration(drawing: Drawing): number {
  return Number(/×(\d+)/.exec(wordsOf(drawing).find((word) => word.startsWith('Gap')) ?? '')?.[1]);
}

describe('end float', () => {
  it('draws the gap to the exaggeration that it states', () => {
    const drawing = drawEndFloat({ low: 0.1, high: 0.25, unit: 'mm' });
    expect(gap(drawing)).toBeCloseTo(0.175 * perMillimetre * exaggeration(drawing), 1);
    expect(wordsOf(drawing)).toEqual(expect.arrayContaining(['0.10 to 0.25', 'mm']));
    expect(drawing.table.rows).toEqual([
      ['End float', '0.10 to 0.25 mm'],
      ['Drawn', `Gap ×${exaggeration(drawing)}`],
    ]);
  });

  it('draws a reading in thou to the same rule', () => {
    // 1 in = 25.4 mm exactly (NIST SP 811, appendix B).
    const drawing = drawEndFloat({ low: 2, high: 6, unit: 'thou', reading: 3.5 });
    expect(gap(drawing)).toBeCloseTo(3.5 * 0.0254 * perMillimetre * exaggeration(drawing), 1);
    expect(wordsOf(drawing)).toEqual(expect.arrayContaining(['3.5', 'thou']));
  });

  it.each([
    { unit: 'mm' },
    { high: 0.3, unit: 'mm' },
    { low: 0.05, unit: 'mm' },
    { low: 100, high: 250, unit: 'µm' },
    { low: 0.004, high: 0.01, unit: 'in', reading: 0 },
    { unit: 'mm', reading: 40 },
  ] as const)('can be read for %j', (input) => {
    const drawing = drawEndFloat(input);
    expect(unreadable(drawing)).toEqual([]);
    expect(gap(drawing)).toBeLessThanOrEqual(30);
  });

  it('owns up to a gap that does not fit', () => {
    expect(wordsOf(drawEndFloat({ unit: 'mm', reading: 40 }))).toContain('Not to scale');
  });

  it('is end play in an American shop', () => {
    expect(drawEndFloat({ unit: 'mm' }, { dialect: 'american' }).title).toContain('end play');
  });
});
