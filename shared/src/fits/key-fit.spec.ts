import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { KeyFitRequest } from '../contracts/fits.js';
import { InputError } from '../contracts/input-error.js';
import type { Quantity } from '../contracts/quantity.js';
import { keyFit } from './key-fit.js';
import { standardKeys } from './standard-keys.js';

const mm = (value: number) => ({ value, unit: 'mm' }) as const;
const inches = (value: number) => ({ value, unit: 'in' }) as const;

interface Sizes {
  readonly width?: number;
  readonly height?: number;
  readonly shaft?: number;
  readonly t1?: number;
  readonly hub?: number;
  readonly t2?: number;
}

/** A 5 × 5 key of DIN 6885-1 (t1 3.0, t2 2.3) unless something else is said. */
const five = (
  { width = 5, height = 5, shaft = 5, t1 = 3, hub = 5, t2 = 2.3 }: Sizes = {},
  unit: (value: number) => Quantity = mm,
): KeyFitRequest => ({
  key: { width: unit(width), height: unit(height) },
  shaftKeyway: { width: unit(shaft), depth: unit(t1) },
  hubKeyway: { width: unit(hub), depth: unit(t2) },
});

describe('plays of a key', () => {
  it('are the whole differences', () => {
    const { play, verdict, reason } = keyFit(
      five({ width: 4.76, shaft: 4.78, hub: 4.83, height: 4.76, t2: 1.91 }),
    );
    expect(play.shaft.value).toBeCloseTo(0.02, 9);
    expect(play.hub.value).toBeCloseTo(0.07, 9);
    expect(play.top.value).toBeCloseTo(0.15, 9);
    expect(verdict).toBe('pass');
    expect(reason).toMatch(/0\.07\smm/);
  });

  it('come in the unit of the key’s width', () => {
    const { play } = keyFit({ ...five(), key: { width: inches(0.197), height: mm(5) } });
    expect(play.top.unit).toBe('in');
    expect(play.shaft.value).toBeCloseTo(5 / 25.4 - 0.197, 9);
  });
});

describe('the limits of width', () => {
  it.each([
    // T5-043 (ISO 286, key h9): the tightest P9 slot of a 5 mm key is 0.042 mm tight, the loosest JS9 0.045 free.
    [{ shaft: 5 - 0.042 }, 'pass'],
    [{ hub: 5 - 0.042 }, 'pass'],
    // Free fit over 3 to 6 mm at its most: H9 +30 and key −30; D10 +78 (DIN ISO 286) and key −30 µm.
    [{ shaft: 5.06 }, 'pass'],
    [{ shaft: 5.0601 }, 'fail'],
    [{ hub: 5.108 }, 'pass'],
    [{ hub: 5.1081 }, 'fail'],
    // The contract's own limits: 0.045 and 0.08 mm.
    [{ shaft: 4.955 }, 'pass'],
    [{ shaft: 4.954 }, 'doubtful'],
    [{ hub: 4.92 }, 'doubtful'],
    [{ hub: 4.919 }, 'fail'],
  ] as const)('%j is %s', (sizes, verdict) => {
    expect(keyFit(five(sizes)).verdict).toBe(verdict);
  });

  it('follows the width: over 6 to 10 mm a free fit has 0.072 mm in the shaft', () => {
    // H9 +36 and key h9 −36 µm (T5-003: IT9 is 36 µm).
    const eight = { width: 8, height: 7, t1: 4, t2: 3.3, hub: 8 };
    expect(keyFit(five({ ...eight, shaft: 8.072 })).verdict).toBe('pass');
    expect(keyFit(five({ ...eight, shaft: 8.0725 })).verdict).toBe('fail');
  });

  it('says what the fault does', () => {
    expect(keyFit(five({ shaft: 5.2 })).reason).toMatch(/falls out on assembly/);
    expect(keyFit(five({ hub: 5.2 })).reason).toMatch(/rocks/);
    expect(keyFit(five({ hub: 4.8 })).reason).toMatch(/will not enter the hub: it is 0\.2\smm wider/);
    // D10 +108 µm and key h9 −30 µm leave 0.108 mm over 3 to 6 mm: a little more must not print as just that.
    expect(keyFit(five({ hub: 5.10804 })).reason).toMatch(/has 0\.10804\smm of play .* at most 0\.108\smm/);
    expect(keyFit(five({ t2: 2 })).reason).not.toContain('too high');
    expect(keyFit(five({ height: 3 })).reason).toMatch(/ends at the shaft’s top/);
  });
});

describe('the height', () => {
  it('is free by 0.3 mm in the standard slots', () => {
    // T5-045: t1 + t2 − h of DIN 6885-1.
    expect(keyFit(five()).play.top.value).toBeCloseTo(0.3, 9);
  });

  it.each([
    [{ t2: 2 }, 'parallel', 'fail', /touches at the top/],
    [{ t2: 1.9 }, 'parallel', 'fail', /0\.1\smm too high/],
    [{ t2: 1.9 }, 'woodruff', 'fail', /touches at the top/],
    [{ height: 3 }, 'parallel', 'fail', /does not reach the hub/],
    [{ t2: 1.9 }, 'taper', 'pass', /bears on its top/],
    [{ t2: 2 }, 'taper', 'pass', /bears on its top/],
    [{ t2: 2.3 }, 'taper', 'fail', /does not bear on its top/],
  ] as const)('%j of a %s key: %s', (sizes, form, verdict, words) => {
    const answer = keyFit({ ...five(sizes), form });
    expect(answer.verdict).toBe(verdict);
    expect(answer.reason).toMatch(words);
  });

  it('adds the shaft’s curve to a depth from the edge', () => {
    // 6 mm slot in 20 mm: 10 − √(10² − 3²) = 10 − 9.539 392 mm, worked by hand.
    const key = { width: 6, height: 6, shaft: 6, hub: 6, t1: 3.5, t2: 2.8 };
    const { play } = keyFit({ ...five(key), depthFrom: 'edge', shaftDiameter: mm(20) });
    expect(play.top.value).toBeCloseTo(0.3 + 0.4606079858, 9);
    expect(keyFit({ ...five(key), depthFrom: 'centre', shaftDiameter: mm(20) }).play.top.value).toBeCloseTo(
      0.3,
      9,
    );
  });
});

it('keeps its verdict when every size is said in another unit', () => {
  const near = (nominal: number) => fc.double({ min: nominal - 0.2, max: nominal + 0.2, noNaN: true });
  const sizes = fc.record({ shaft: near(5), hub: near(5), t1: near(3), t2: near(2.3) });
  fc.assert(
    fc.property(sizes, (some) => {
      const metric = keyFit(five(some));
      const thou = keyFit(five(some, (value) => ({ value: value / 0.0254, unit: 'thou' })));
      expect(thou.verdict).toBe(metric.verdict);
      expect(thou.play.hub.value * 0.0254).toBeCloseTo(metric.play.hub.value, 9);
    }),
  );
});

describe('the standard keys', () => {
  it('of a 20 mm shaft', () => {
    // DIN 6885-1 in print: 6 × 6, t1 3.5, t2 2.8; 20 mm is 0.787 in: BS 46 1/4 in, B17.1 3/16 in.
    expect(standardKeys(mm(20)).map(({ standard, width }) => [standard, width])).toEqual([
      ['DIN 6885-1', mm(6)],
      ['BS 46:Part 1', inches(0.25)],
      ['ANSI B17.1', inches(3 / 16)],
    ]);
    expect(standardKeys(mm(20))[0]).toMatchObject({ shaftDepth: mm(3.5), hubDepth: mm(2.8) });
  });

  it('of a shaft beyond the tables are none', () => {
    expect(standardKeys(mm(3))).toEqual([]);
  });
});

describe('input that cannot be used', () => {
  const good = five();
  it.each([
    ['request', 7],
    ['key', { ...good, key: undefined }],
    ['key.width', { ...good, key: {} }],
    ['key.width.value', { ...good, key: { width: mm(0), height: mm(5) } }],
    ['key.width.value', { ...good, key: { width: mm(300), height: mm(5) } }],
    ['key.height.value', { ...good, key: { width: mm(5), height: mm(-5) } }],
    ['shaftKeyway.depth.unit', { ...good, shaftKeyway: { width: mm(5), depth: { value: 3, unit: 's' } } }],
    ['hubKeyway.width', { ...good, hubKeyway: { depth: mm(2) } }],
    ['form', { ...good, form: 'gib' }],
    ['depthFrom', { ...good, depthFrom: 'top' }],
    ['shaftDiameter', { ...good, depthFrom: 'edge' }],
    ['shaftDiameter', { ...good, depthFrom: 'edge', shaftDiameter: mm(5) }],
    ['shaftDiameter.value', { ...good, shaftDiameter: mm(Infinity) }],
  ])('%s', (field, request) => {
    expect(() => keyFit(request as KeyFitRequest)).toThrow(InputError);
    expect(() => keyFit(request as KeyFitRequest)).toThrow(expect.objectContaining({ field }));
  });
});
