import { describe, expect, it } from 'vitest';
import { partsOf, unreadable, wordsOf } from './drawing-case.js';
import { drawToleranceBand, type BandInput, type BandReading } from './tolerance-band.js';
import type { CircleShape, Drawing, LineShape, PathShape } from './shapes.js';

const first: BandReading = { value: 0.17, uncertainty: 0.012, role: 'first', label: 'first' };
const second: BandReading = { value: 0.18, uncertainty: 0.01, role: 'second', label: 'second' };
const both: BandInput = { low: 0.1, high: 0.25, unit: 'mm', readings: [first, second], decimals: 2 };

function xOf(drawing: Drawing, part: string): number {
  const [shape] = partsOf(drawing, part) as readonly (CircleShape | LineShape)[];
  return shape?.kind === 'circle' ? shape.centre.x : (shape?.from.x ?? NaN);
}

/** Left and right end of a hatched zone. */
function zone(drawing: Drawing, part: string): readonly [number, number] {
  const d = (partsOf(drawing, part)[0] as PathShape).d;
  const xs = [...d.matchAll(/[ML]([\d.-]+)/g)].map((match) => Number(match[1]));
  return [Math.min(...xs), Math.max(...xs)];
}

describe('two readings', () => {
  const drawing = drawToleranceBand(both);
  const [low, high] = [xOf(drawing, 'limit:least'), xOf(drawing, 'limit:most')];
  const perUnit = (high - low) / 0.15;

  it('stand at their values on a linear axis', () => {
    expect(xOf(drawing, 'reading:first')).toBeCloseTo(low + 0.07 * perUnit, 1);
    expect(xOf(drawing, 'reading:second')).toBeCloseTo(low + 0.08 * perUnit, 1);
  });

  it('are told apart by a solid and an outlined dot', () => {
    expect(partsOf(drawing, 'reading:first')[0]).toMatchObject({ fill: 'ink' });
    expect(partsOf(drawing, 'reading:second')[0]).toMatchObject({ fill: 'paper', pen: 'outline' });
  });

  it('have guard zones inside the limits, as wide as the larger uncertainty', () => {
    const [lowFrom, lowTo] = zone(drawing, 'guard:low');
    expect(lowFrom).toBeCloseTo(low, 1);
    expect(lowTo).toBeCloseTo(low + 0.012 * perUnit, 1);
    const [highFrom, highTo] = zone(drawing, 'guard:high');
    expect(highFrom).toBeCloseTo(high - 0.012 * perUnit, 1);
    expect(highTo).toBeCloseTo(high, 1);
  });

  it('say the same in words and in the table', () => {
    expect(wordsOf(drawing)).toEqual(
      expect.arrayContaining(['0.10', '0.25', 'first', '0.17', 'second', '0.18', 'mm']),
    );
    expect(drawing.description).toBe(
      'Limits 0.10 to 0.25 mm. First 0.17 mm, uncertainty 0.012. Second 0.18 mm, uncertainty 0.010.',
    );
    expect(drawing.table.rows).toEqual([
      ['least', '0.10 mm', ''],
      ['most', '0.25 mm', ''],
      ['first', '0.17 mm', '±0.012 mm'],
      ['second', '0.18 mm', '±0.010 mm'],
    ]);
    expect(unreadable(drawing)).toEqual([]);
  });
});

const reading = (value: number, uncertainty: number, failed = false): BandReading => ({
  ...{ value, uncertainty, failed },
  role: 'first',
  label: 'reading',
});

describe('a single limit', () => {
  it('has one line, and its guard zone on the good side', () => {
    const most = drawToleranceBand({ high: 0.05, unit: 'mm', readings: [reading(0.02, 0.006)] });
    expect(partsOf(most, 'limit:least')).toEqual([]);
    expect(partsOf(most, 'guard:low')).toEqual([]);
    expect(zone(most, 'guard:high')[1]).toBeCloseTo(xOf(most, 'limit:most'), 1);
    expect(xOf(most, 'reading:first')).toBeLessThan(zone(most, 'guard:high')[0]);
    const least = drawToleranceBand({ low: 9.5, unit: 'bar', readings: [reading(9.6, 0.2)] });
    expect(zone(least, 'guard:low')[0]).toBeCloseTo(xOf(least, 'limit:least'), 1);
    expect([...unreadable(most), ...unreadable(least)]).toEqual([]);
  });
});

describe('a reading outside', () => {
  it('is red oxide when it failed, and keeps the band readable however far out it lies', () => {
    const drawing = drawToleranceBand({
      low: 53,
      high: 57,
      unit: 'N·m',
      readings: [reading(554, 1.4, true)],
    });
    expect(partsOf(drawing, 'reading:first')[0]).toMatchObject({ fill: 'oxide' });
    expect(partsOf(drawing, 'off-the-scale')).toHaveLength(1);
    expect(xOf(drawing, 'limit:most') - xOf(drawing, 'limit:least')).toBeGreaterThan(80);
    expect(unreadable(drawing)).toEqual([]);
  });

  it('is drawn at its value when it lies near', () => {
    const drawing = drawToleranceBand({ low: 53, high: 57, unit: 'N·m', readings: [reading(58, 0)] });
    const perUnit = (xOf(drawing, 'limit:most') - xOf(drawing, 'limit:least')) / 4;
    expect(xOf(drawing, 'reading:first')).toBeCloseTo(xOf(drawing, 'limit:most') + perUnit, 1);
    expect(partsOf(drawing, 'off-the-scale')).toEqual([]);
  });
});

it('is hatched all over where the tool is too coarse for the band', () => {
  const drawing = drawToleranceBand({ low: 0.1, high: 0.14, unit: 'mm', readings: [reading(0.12, 0.03)] });
  expect(partsOf(drawing, 'guard:all')).toHaveLength(1);
  expect(partsOf(drawing, 'guard:low')).toEqual([]);
});

it.each<BandInput>([
  { low: 0.1, high: 0.25, unit: 'mm', readings: [] },
  { high: 0.05, unit: 'mm', readings: [] },
  { unit: 'mm', readings: [reading(0.02, 0.006)] },
  { low: 0, high: 0, unit: 'mm', readings: [reading(0, 0)] },
  { low: 0.0015, high: 0.0035, unit: 'in', readings: [reading(0.0001, 0.0002)] },
])('can be read when little is known: %j', (input) => {
  const drawing = drawToleranceBand(input);
  expect(unreadable(drawing)).toEqual([]);
  expect(JSON.stringify(drawing.shapes)).not.toMatch(/null|NaN/);
});

it('prints figures as the person wants them', () => {
  const drawing = drawToleranceBand(both, {
    figure: (value, decimals) => value.toFixed(decimals).replace('.', ','),
  });
  expect(wordsOf(drawing)).toContain('0,17');
});
