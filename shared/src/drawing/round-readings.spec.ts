import { describe, expect, it } from 'vitest';
import type { RoundReading, RoundReadingsRequest } from '../contracts/measuring.js';
import type { Quantity, Unit } from '../contracts/quantity.js';
import { roundReadings } from '../measuring/round-readings.js';
import { partsOf, unreadable, wordsOf } from './drawing-case.js';
import { drawRoundReadings } from './round-readings.js';
import type { CircleShape, Drawing, PathShape } from './shapes.js';

const of = (value: number, unit: Unit): Quantity => ({ value, unit });
const on = (axis: string, unit: Unit, ...values: readonly number[]): readonly RoundReading[] =>
  values.map((value, i) => ({ height: `height ${i + 1}`, axis, value: of(value, unit) }));
const draw = (request: RoundReadingsRequest) => drawRoundReadings(request, roundReadings(request));

/** The farthest and the nearest of a wall from the centre line, right side. */
function wall(drawing: Drawing, part: string): readonly [number, number] {
  const { d } = partsOf(drawing, part)[0] as PathShape;
  const xs = [...d.matchAll(/[ML]([\d.-]+)/g)].map((match) => Number(match[1]) - 92);
  return [Math.min(...xs), Math.max(...xs)];
}

describe('readings of a bore', () => {
  const drawing = draw({
    of: 'bore',
    readings: [...on('along', 'mm', 88.012, 88.01, 88.006), ...on('across', 'mm', 88.004, 88.003, 88.004)],
    limits: { high: of(88.01, 'mm') },
  });

  it('are drawn to the exaggeration that is stated', () => {
    const times = Number(/Differences ×(\d+)/.exec(wordsOf(drawing)[0]!)![1]);
    // The smallest reading, 88.003 mm, is drawn 84 wide; each wall bulges by half of a difference.
    const bulge = ((88.012 - 88.003) / 2) * (84 / 88.003) * times;
    expect(wall(drawing, 'wall:A')[1]).toBeCloseTo(42 + bulge, 1);
    expect(wall(drawing, 'wall:B')[0]).toBeCloseTo(42, 1);
    const [across] = partsOf(drawing, 'read:A') as readonly CircleShape[];
    expect(102 - across!.centre.y).toBeCloseTo(42 + bulge, 1);
  });

  it('mark the worst as wrong where it fails', () => {
    expect(partsOf(drawing, 'worst')[0]).toMatchObject({ fill: 'oxide' });
  });

  it('have a table that says the same', () => {
    expect(drawing.table).toEqual({
      columns: ['Height', 'A, along', 'B, across'],
      rows: [
        ['height 1', '88.012 mm', '88.004 mm'],
        ['height 2', '88.010 mm', '88.003 mm'],
        ['height 3', '88.006 mm', '88.004 mm'],
      ],
    });
    expect(drawing.description).toContain('88.012 mm at height 1, along');
  });
});

it.each<[string, RoundReadingsRequest]>([
  ['one reading', { of: 'bore', readings: on('along', 'mm', 88) }],
  ['no differences', { of: 'journal', readings: [...on('a', 'in', 2, 2), ...on('b', 'in', 2, 2)] }],
  ['a difference past all scale', { of: 'bore', readings: on('a', 'mm', 1, 9000) }],
  ['a difference of an atom', { of: 'bore', readings: on('a', 'mm', 88, 88.0000001) }],
  [
    'a hundred heights',
    { of: 'bore', readings: on('a', 'mm', ...Array.from({ length: 100 }, (_, i) => 80 + i / 999)) },
  ],
  [
    'six axes with long names, one of them not read everywhere',
    {
      of: 'shell',
      splitAxis: 'axis number 0 with a long name',
      readings: Array.from({ length: 6 }, (_, i) =>
        on(`axis number ${i} with a long name`, 'µm', 50010 + i),
      ).flat(),
    },
  ],
])('can be read with %s', (_what, request) => {
  const drawing = draw(request);
  expect(unreadable(drawing)).toEqual([]);
  expect(JSON.stringify(drawing.shapes)).not.toMatch(/null|NaN/);
});
