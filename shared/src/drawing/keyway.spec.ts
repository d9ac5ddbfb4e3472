import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { KeyFitRequest } from '../contracts/fits.js';
import type { Unit } from '../contracts/quantity.js';
import { keyFit } from '../fits/key-fit.js';
import { toSi } from '../quantities/convert.js';
import { partsOf, unreadable, wordsOf } from './drawing-case.js';
import { drawKeyway } from './keyway.js';
import type { Drawing, RectShape } from './shapes.js';

/** Width and height of the key, width and depth of the shaft's slot, of the hub's. */
type Sizes = readonly [number, number, number, number, number, number];

function drawn(
  [w, h, shaft, t1, hub, t2]: Sizes,
  unit: Unit = 'mm',
  more: Partial<KeyFitRequest> = {},
): Drawing {
  const of = (value: number) => ({ value, unit });
  const request: KeyFitRequest = {
    key: { width: of(w), height: of(h) },
    shaftKeyway: { width: of(shaft), depth: of(t1) },
    hubKeyway: { width: of(hub), depth: of(t2) },
    ...more,
  };
  return drawKeyway({ request, answer: keyFit(request) });
}

const part = (drawing: Drawing, name: string) => partsOf(drawing, name)[0] as RectShape | undefined;

describe('a key in its keyway', () => {
  const drawing = drawn([4.76, 4.76, 4.78, 2.9, 4.83, 2.01]);

  it('has both plays and the top as figures, and the same in its table', () => {
    expect(wordsOf(drawing)).toEqual(expect.arrayContaining(['0.02', '0.07', '0.15', '4.76', 'mm']));
    expect(drawing.table.rows).toEqual(
      expect.arrayContaining([
        ['Play in the shaft', '0.02 mm'],
        ['Play in the hub', '0.07 mm'],
        ['Free over the key', '0.15 mm'],
      ]),
    );
    expect(drawing.description).toContain('Play in the hub 0.07 mm.');
  });

  it('draws what is too tight as wide as it states', () => {
    // The key's drawn width over 5 mm is the scale; the overlap is 0.04 mm of it, so many times.
    const tight = drawn([5, 5, 4.96, 3, 5, 2.3]);
    const scale = (part(tight, 'key')?.width ?? NaN) / 5;
    const times = Number(/(?:Sides|Plays) ×(\d+)/.exec(wordsOf(tight).join(' '))?.[1]);
    expect(part(tight, 'tight:shaft')?.width).toBeCloseTo(0.04 * scale * times, 1);
    expect(wordsOf(tight)).toContain('tight in shaft');
  });

  it.each([
    ['plain', [5, 5, 5, 3, 5, 2.3], 'mm'],
    ['wide and flat', [20, 4, 20.1, 2.4, 20.05, 1.8], 'mm'],
    ['narrow and tall', [2, 9, 2.02, 5, 2.03, 4.2], 'mm'],
    ['sunk below the shaft', [5, 3, 5, 6, 5, 2.3], 'mm'],
    ['much too high', [5, 9, 5, 3, 5, 2.3], 'mm'],
    ['much too wide', [9, 5, 5, 3, 5, 2.3], 'mm'],
    ['much too narrow', [1, 5, 5, 3, 5, 2.3], 'mm'],
    ['in inches', [0.187, 0.1885, 0.1871, 0.112, 0.1893, 0.0841], 'in'],
    ['in metres', [0.005, 0.005, 0.0050123, 0.003, 0.004987, 0.0023], 'm'],
    ['a hair', [0.01, 0.01, 0.0101, 0.006, 0.0102, 0.005], 'mm'],
    ['a beam', [200, 90, 200.1, 50, 200.2, 41], 'mm'],
  ] as const)('can be read where it is %s', (_, sizes, unit) => {
    const one = drawn(sizes, unit);
    expect(unreadable(one)).toEqual([]);
    expect(part(one, 'key')?.width).toBeLessThanOrEqual(84);
  });

  it('owns up to depths that do not fit', () => {
    expect(wordsOf(drawn([5, 3, 5, 6, 5, 2.3])).join(' ')).toMatch(/not to scale/);
  });

  it('takes the shaft’s own curve', () => {
    const small = drawn([5, 5, 5, 2.6, 5, 2.3], 'mm', {
      depthFrom: 'edge',
      shaftDiameter: { value: 16, unit: 'mm' },
    });
    expect(unreadable(small)).toEqual([]);
  });

  it('stays inside its frame whatever the sizes', () => {
    const size = fc
      .integer({ min: -6, max: 5 })
      .chain((power) => fc.integer({ min: 1, max: 99 }).map((value) => value * 10 ** power));
    const unit = fc.constantFrom('mm', 'in', 'thou', 'm', 'µm', 'ft');
    fc.assert(
      fc.property(fc.tuple(size, size, size, size, size, size), unit, (sizes, of) => {
        fc.pre(toSi({ value: sizes[0], unit: of }) < 0.25);
        const one = drawn(sizes, of);
        expect(unreadable(one)).toEqual([]);
        expect(JSON.stringify(one)).not.toMatch(/null|NaN/);
      }),
    );
  });
});
