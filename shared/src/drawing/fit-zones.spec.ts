import { describe, expect, it } from 'vitest';
import type { FitRequest } from '../contracts/fits.js';
import type { Unit } from '../contracts/quantity.js';
import { fit as fitOf } from '../fits/fit.js';
import { partsOf, unreadable, wordsOf } from './drawing-case.js';
import { drawFitZones } from './fit-zones.js';
import type { Drawing, LineShape, RectShape } from './shapes.js';

const drawn = (request: FitRequest): Drawing => drawFitZones({ request, answer: fitOf(request) });
const classes = (size: number, hole: string, shaft: string): FitRequest => ({
  hole: { size: { value: size, unit: 'mm' }, class: hole },
  shaft: { size: { value: size, unit: 'mm' }, class: shaft },
});
const limits = (low: number, high: number, unit: Unit) => ({
  low: { value: low, unit },
  high: { value: high, unit },
});
const zone = (drawing: Drawing, part: string) => partsOf(drawing, part)[0] as RectShape;

describe('the zones of a fit', () => {
  // T5-036: 50 mm H7/p6 is −42 to −1 µm; H7 0 to +25, p6 +26 to +42 µm (T5-009 and tables of print).
  const drawing = drawn(classes(50, 'H7', 'p6'));

  it('are on one scale, which the bar states', () => {
    const [hole, shaft] = [zone(drawing, 'hole'), zone(drawing, 'shaft')];
    const perMicrometre = hole.height / 25;
    expect(shaft.height).toBeCloseTo(16 * perMicrometre, 1);
    expect(shaft.y + shaft.height).toBeCloseTo(hole.y - perMicrometre, 1);
    const bar = partsOf(drawing, 'bar')[0] as LineShape;
    const stated = Number(/(\d+) µm/.exec(wordsOf(drawing).join(' '))?.[1]);
    expect(bar.to.x - bar.from.x).toBeCloseTo(stated * perMicrometre, 1);
  });

  it('have their limits, the least and the most in the table and the picture', () => {
    expect(drawing.table.rows).toEqual([
      ['Hole', '50.000 mm', '50.025 mm'],
      ['Shaft', '50.026 mm', '50.042 mm'],
      ['Between them', '0.042 mm interference', '0.001 mm interference'],
    ]);
    expect(wordsOf(drawing)).toEqual(expect.arrayContaining(['50.025', '50.026', '0.042 mm interference']));
  });

  it.each([
    ['a clearance fit', classes(20, 'H7', 'g6')],
    ['a least of nothing', classes(20, 'H7', 'h6')],
    ['one size for all', { hole: limits(20, 20, 'mm'), shaft: limits(20, 20, 'mm') }],
    ['sizes far apart', { hole: limits(20, 20.01, 'mm'), shaft: limits(2, 180, 'mm') }],
    ['inches', { hole: limits(0.6255, 0.6263, 'in'), shaft: limits(0.623, 0.6238, 'in') }],
    ['metres', { hole: limits(0.02, 0.020021, 'm'), shaft: limits(0.019987, 0.02, 'm') }],
    ['a thin zone', { hole: limits(20, 20.001, 'mm'), shaft: limits(19, 19.0001, 'mm') }],
  ] as const)('can be read for %s', (_, request) => {
    expect(unreadable(drawn(request))).toEqual([]);
  });
});
