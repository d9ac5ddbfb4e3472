import { describe, expect, it } from 'vitest';
import { beltAlignment } from '../belt-drive/belt-alignment.js';
import { beltLength } from '../belt-drive/belt-length.js';
import { beltTension } from '../belt-drive/belt-tension.js';
import { apart } from './apart.js';
import { checksOf, type Check } from './checks.js';

const checks = checksOf('Belt drives');
const mm = (value: number) => ({ value, unit: 'mm' }) as const;
const inches = (value: number) => ({ value, unit: 'in' }) as const;
const printed = (id: string): readonly number[] => checks.get(id)!.expected as readonly number[];

const belt = (driver: number, driven: number, centres: number) =>
  beltLength({ driverDiameter: mm(driver), drivenDiameter: mm(driven), centres: mm(centres) });
/** Driven speed over driver speed, of pulleys far enough apart for any belt. */
const ratio = (driver: number, driven: number): number => belt(driver, driven, driver + driven).ratio;

/** Degrees between two pulleys of which the driven one leans by a gap over its diameter. */
const leanOf = (gap: number, diameter: number, length: typeof mm | typeof inches): number =>
  beltAlignment({
    span: length(500),
    driverDiameter: length(100),
    drivenDiameter: length(diameter),
    gaps: { driverNear: length(0), driverFar: length(0), drivenNear: length(gap), drivenFar: length(0) },
  }).angle;
/** The printed gaps of an angle, in mm per 100 mm and mil per inch, as angles again. */
const angles = (id: string): readonly number[] => {
  const [millimetres = NaN, mils = NaN] = printed(id);
  return [leanOf(millimetres, 100, mm), leanOf(mils / 1000, 1, inches)];
};

const run: Readonly<Record<string, { readonly actual: () => unknown; readonly expected?: unknown }>> = {
  'T6-002': { actual: () => belt(1600, 500, 12000).length.value / 1000 },
  'T6-003': { actual: () => belt(1600, 500, 12000).length.value / 1000 },
  // Of exact, approximate and their difference the first.
  'T6-004': { actual: () => belt(150, 150, 400).length.value, expected: printed('T6-004')[0] },
  'T6-006': { actual: () => belt(132, 71, 284.5).length.value, expected: printed('T6-006')[0] },
  'T6-007': { actual: () => belt(180, 60, 130).length.value, expected: printed('T6-007')[0] },
  'T6-010': { actual: () => 300 * ratio(48, 12) },
  'T6-011': { actual: () => 1500 / ratio(46, 11) },
  'T6-014': { actual: () => 200 * ratio(80, 40) * ratio(100, 20) },
  'T6-019': { actual: () => angles('T6-019'), expected: [0.2, 0.2] },
  'T6-021': { actual: () => angles('T6-021'), expected: [0.5, 0.5] },
  'T6-022': { actual: () => angles('T6-022'), expected: [1, 1] },
  // A driver that leans 0.5°, carried over 500 mm; the driven pulley lies flat on the edge's line.
  'T6-026': {
    actual: () => {
      const gap = 100 * Math.tan(Math.PI / 360);
      return beltAlignment({
        span: mm(500),
        driverDiameter: mm(100),
        drivenDiameter: mm(100),
        gaps: { driverNear: mm(-gap / 2), driverFar: mm(gap / 2), drivenNear: mm(0), drivenFar: mm(0) },
      }).offset.value;
    },
  },
  'T6-029': {
    actual: () =>
      beltTension({ driverDiameter: inches(8), drivenDiameter: inches(4), centres: inches(16) }).freeSpan
        .value,
  },
};

const notRun: Readonly<Record<string, string>> = {
  'T6-015': 'Slip of a belt a stage: nothing in the product works it out.',
};

describe('belt drives', () => {
  it.each(Object.keys(run))('%s', (id) => {
    const { actual, expected = (checks.get(id) as Check).expected } = run[id]!;
    expect(apart(actual(), expected)).toBeLessThan(1e-10);
  });
});

// The source's own approximation, 2C + π/2 (D + d) + (D − d)²/4C; the product works out the exact length, and the
// series goes on with a term in (D − d)⁴/C³, here 4.4 µm.
it('T6-001: the exact length is the approximate one but for the next term of its series', () => {
  const exact = belt(1600, 500, 12000).length.value / 1000;
  expect(Math.abs(exact - Number(checks.get('T6-001')!.expected))).toBeLessThan(1.1 ** 4 / 12 ** 3);
});

it('leaves no value of the topic out', () => {
  expect(['T6-001', ...Object.keys(run), ...Object.keys(notRun)].sort()).toEqual([...checks.keys()].sort());
});
