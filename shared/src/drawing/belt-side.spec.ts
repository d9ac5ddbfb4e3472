import { describe, expect, it } from 'vitest';
import { beltLength } from '../belt-drive/belt-length.js';
import type { BeltLengthRequest } from '../contracts/belt-drive.js';
import { drawBeltSide } from './belt-side.js';
import { partsOf, unreadable, wordsOf } from './drawing-case.js';
import type { Drawing, PathShape } from './shapes.js';

const mm = (value: number) => ({ value, unit: 'mm' }) as const;

function drawn(driver: number, driven: number, centres: number, deflection?: number): Drawing {
  const request: BeltLengthRequest = {
    driverDiameter: mm(driver),
    drivenDiameter: mm(driven),
    centres: mm(centres),
  };
  return drawBeltSide({
    request,
    answer: beltLength(request),
    ...(deflection === undefined ? {} : { deflection: mm(deflection) }),
  });
}

describe('a belt from the side', () => {
  it('has its figures in the table', () => {
    // T6-006: 891.14 mm.
    expect(drawn(132, 71, 284.5).table.rows).toEqual(
      expect.arrayContaining([
        ['Between centres', '284.5 mm'],
        ['Belt', '891.14 mm'],
      ]),
    );
  });

  it('draws its run as long as it is', () => {
    // T6-029 in tenths: run of 8, 4 and 16 is 15.8745; all along is 4 + 16 + 2 = 22 on 300 units.
    const [, a = '', b = '', c = '', d = ''] =
      /^M([\d.]+) ([\d.]+)L([\d.]+) ([\d.]+)/.exec((partsOf(drawn(80, 40, 160), 'belt')[0] as PathShape).d) ??
      [];
    expect(Math.hypot(Number(c) - Number(a), Number(d) - Number(b))).toBeCloseTo((158.745 * 300) / 220, 1);
  });

  it('shows what the belt gives, to scale', () => {
    const drawing = drawn(138, 112, 318, 11.5);
    expect(wordsOf(drawing)).toContain('gives 11.5 mm');
  });

  it.each([
    [150, 150, 400],
    [20, 400, 260],
    [400, 20, 260],
    [100, 100, 100],
    [10, 10, 90000],
    [0.1, 0.2, 1],
  ])('can be read for %d and %d mm, %d mm apart', (driver, driven, centres) => {
    expect(unreadable(drawn(driver, driven, centres, centres / 64))).toEqual([]);
  });
});
