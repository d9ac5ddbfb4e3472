import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { beltLine } from '../belt-drive/belt-line.js';
import type { BeltLineRequest } from '../contracts/belt-drive.js';
import type { Unit } from '../contracts/quantity.js';
import { drawBeltLine } from './belt-line.js';
import { partsOf, unreadable, wordsOf } from './drawing-case.js';
import type { Drawing, LineShape } from './shapes.js';

type Rims = readonly [number, number, number, number];

function drawn(
  rims: Rims,
  sizes: { d1?: number; d2?: number; span?: number; unit?: Unit; f1?: number; f2?: number } = {},
): Drawing {
  const { d1 = 138, d2 = 92, span = 318, unit = 'mm', f1, f2 } = sizes;
  const of = (value: number) => ({ value, unit });
  const [driverNear, driverFar, drivenNear, drivenFar] = rims.map(of) as never as Record<
    number,
    { value: number; unit: Unit }
  >[];
  const request = {
    driver: { name: 'pump pulley', diameter: of(d1), ...(f1 === undefined ? {} : { faceToGroove: of(f1) }) },
    driven: [
      {
        name: 'dynamo pulley',
        diameter: of(d2),
        span: of(span),
        gaps: { driverNear, driverFar, drivenNear, drivenFar },
        ...(f2 === undefined ? {} : { faceToGroove: of(f2) }),
      },
    ],
  } as unknown as BeltLineRequest;
  return drawBeltLine({ request, answer: beltLine(request), driven: 0 });
}

const times = (drawing: Drawing): number => Number(/drawn ×(\d+)/.exec(wordsOf(drawing).join(' '))?.[1]);
const offset = (drawing: Drawing): number => {
  const mark = partsOf(drawing, 'offset')[0] as LineShape;
  return mark.to.y - mark.from.y;
};
/** Drawing units to a millimetre along the belt: 300 units for both radii and the span. */
const along = 300 / (138 / 2 + 318 + 92 / 2);

describe('a belt line from above', () => {
  const drawing = drawn([0, 0, 1.2, 1.6]);

  it('draws gaps and offset to the exaggeration that it states', () => {
    expect(offset(drawing)).toBeCloseTo(1.4 * along * times(drawing), 1);
    const gaps = partsOf(drawing, 'gap') as readonly LineShape[];
    expect(gaps.map(({ from, to }) => to.y - from.y)).toEqual(
      [0, 0, 1.2, 1.6].map((gap) => expect.closeTo(gap * along * times(drawing), 1) as number),
    );
  });

  it('has the gaps, the offset and the angle in figures and table', () => {
    expect(wordsOf(drawing)).toEqual(expect.arrayContaining(['1.2', '1.6', '1.4 mm back', '0.25° turned']));
    expect(drawing.table.rows).toEqual(
      expect.arrayContaining([
        ['Gap, dynamo pulley, near rim', '1.2 mm'],
        ['Grooves', '1.4 mm back'],
        ['Turned', '−0.25°'],
      ]),
    );
  });

  it('compares grooves, not rims', () => {
    // Rims level, the driven groove 3 mm further back.
    const grooves = drawn([0, 0, 0, 0], { f1: 9, f2: 12 });
    expect(offset(grooves)).toBeCloseTo(3 * along * times(grooves), 1);
  });

  it.each([
    ['straight', [0, 0, 0, 0], {}],
    ['forward', [0.2, -0.2, -3, -3.4], {}],
    ['leaning hard', [0, 0, 30, -30], {}],
    ['far out', [0, 0, 500, 500], {}],
    ['short', [0, 0.1, 1, 1.2], { d1: 100, d2: 100, span: 101 }],
    ['long', [0, 0.1, 1, 1.2], { d1: 20, d2: 10, span: 5000 }],
    ['of unlike pulleys', [0, 0, 1, 1], { d1: 20, d2: 400, span: 260 }],
    ['in inches', [0, 0.005, 0.0625, 0.0725], { d1: 5.6, d2: 4.8, span: 13.1, unit: 'in' }],
    ['in metres', [0, 0.0001, 0.0012, 0.0016], { d1: 0.14, d2: 0.09, span: 0.3, unit: 'm' }],
  ] as const)('can be read where it is %s', (_, rims, sizes) => {
    expect(unreadable(drawn(rims, sizes))).toEqual([]);
  });

  it('stays inside its frame whatever the sizes', () => {
    const size = fc
      .integer({ min: -6, max: 6 })
      .chain((power) => fc.integer({ min: 1, max: 99 }).map((value) => value * 10 ** power));
    const gap = fc.tuple(size, fc.constantFrom(-1, 1)).map(([value, sign]) => value * sign);
    fc.assert(
      fc.property(fc.tuple(gap, gap, gap, gap), size, size, size, (rims, d1, d2, span) => {
        fc.pre(Math.abs(rims[0] - rims[1]) <= d1 && Math.abs(rims[2] - rims[3]) <= d2);
        const one = drawn(rims, { d1, d2, span });
        expect(unreadable(one)).toEqual([]);
        expect(one.height).toBeLessThan(400);
        expect(JSON.stringify(one)).not.toMatch(/null|NaN/);
      }),
    );
  });
});
