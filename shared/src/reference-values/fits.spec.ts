import { describe, expect, it } from 'vitest';
import { threadStack } from '../fastening/thread-stack.js';
import { nutHeights } from '../fastening/tables/nut-heights.js';
import { classLimits } from '../fits/class-limits.js';
import { fit as fitOf } from '../fits/fit.js';
import { keyFit } from '../fits/key-fit.js';
import { standardKeys } from '../fits/standard-keys.js';
import { standardTolerance, type Grade } from '../fits/standard-tolerance.js';
import { americanKeys } from '../fits/tables/american-keys.js';
import { britishKeys } from '../fits/tables/british-keys.js';
import { expansions } from '../fits/tables/expansion.js';
import { heatLimits } from '../fits/tables/heat-limits.js';
import { metricKeys } from '../fits/tables/metric-keys.js';
import { thermalGrowth } from '../fits/thermal-growth.js';
import { apart } from './apart.js';
import { checksOf } from './checks.js';

const checks = checksOf('Fits, keys, heat');
const mm = (value: number) => ({ value, unit: 'mm' }) as const;

/** Least and most in µm, at the upper end of the band. */
const fitOfClasses = (size: number, hole: string, shaft: string): readonly number[] => {
  const { least, most } = fitOf({
    hole: { size: mm(size), class: hole },
    shaft: { size: mm(size), class: shaft },
  });
  return [least.value * 1000, most.value * 1000];
};
const grades = (size: number) =>
  ([6, 7, 8, 9] as const).map((grade: Grade) => standardTolerance(size, grade));
const limits = (size: number, code: string) => {
  const { upper, lower } = classLimits(size, code, code < 'a' ? 'hole' : 'shaft', 'part');
  return [upper, lower];
};
const inBands = (code: string) => [6, 10, 18, 30, 50].map((size) => limits(size, code));
const slots = (size: number) => ({
  P9: limits(size, 'P9'),
  N9: limits(size, 'N9'),
  JS9: limits(size, 'JS9'),
});
const boltNeeded = (thread: string) =>
  [1, 2].map(
    (leastPitches) =>
      threadStack({ thread, boltLength: mm(100), grip: mm(20), washers: mm(1.6), into: { leastPitches } })
        .lengthNeeded.value,
  );
const overKey = ([width, height]: readonly [number, number]) => {
  const row = metricKeys.find((one) => one.width === width && one.height === height)!;
  return keyFit({
    key: { width: mm(width), height: mm(height) },
    shaftKeyway: { width: mm(width), depth: mm(row.shaftDepth) },
    hubKeyway: { width: mm(width), depth: mm(row.hubDepth) },
  }).play.top.value;
};

const run: Readonly<Record<string, () => unknown>> = {
  'T5-017': () => fitOfClasses(10, 'H7', 'g6'),
  'T5-018': () => fitOfClasses(18, 'H7', 'g6'),
  'T5-019': () => fitOfClasses(30, 'H7', 'g6'),
  'T5-020': () => fitOfClasses(50, 'H7', 'g6'),
  'T5-021': () => fitOfClasses(10, 'H7', 'h6'),
  'T5-024': () => fitOfClasses(50, 'H7', 'h6'),
  'T5-026': () => fitOfClasses(18, 'H7', 'k6'),
  'T5-027': () => fitOfClasses(30, 'H7', 'k6'),
  'T5-030': () => fitOfClasses(18, 'H7', 'n6'),
  'T5-031': () => fitOfClasses(30, 'H7', 'n6'),
  'T5-034': () => fitOfClasses(18, 'H7', 'p6'),
  'T5-036': () => fitOfClasses(50, 'H7', 'p6'),
  'T5-039': () => fitOfClasses(30, 'H7', 's6'),
  'T5-041': () => slots(6),
  'T5-043': () => Object.fromEntries(['P9', 'N9', 'JS9'].map((slot) => [slot, fitOfClasses(5, slot, 'h9')])),
  'T5-045': () =>
    (
      [
        [4, 4],
        [5, 5],
        [6, 6],
        [8, 7],
        [10, 8],
      ] as const
    ).map(overKey),
  'T5-046': () => 20 + (standardKeys(mm(20))[0]?.hubDepth?.value ?? NaN),
  'T5-055': () => thermalGrowth(0.03, 11.7, 85) * 1e6,
  'T5-056': () => (thermalGrowth(0.09, 23.6, 80) - thermalGrowth(0.09, 11.4, 80)) * 1e6,
  'T5-063': () => boltNeeded('M10x1.5'),
  'T5-067': () => boltNeeded('M16x2'),
};

const inchOf = (text: string): number =>
  text
    .split(' ')
    .map((part) => part.split('/').map(Number))
    .reduce((sum, [over = 0, under = 1]) => sum + over / under, 0);
const alloy = (material: string, name: string) =>
  expansions.find((one) => one.material === material && one.alloy === name)?.coefficient;

/** Printed figures that nobody worked out again: they stand beside our tables, and prove no formula. */
const transcribed: Readonly<Record<string, () => unknown>> = {
  'T5-001': () => grades(6),
  'T5-003': () => grades(10),
  'T5-005': () => grades(18),
  'T5-007': () => grades(30),
  'T5-009': () => grades(50),
  'T5-012': () => inBands('h6'),
  'T5-013': () => inBands('k6'),
  'T5-014': () => inBands('n6'),
  'T5-016': () => inBands('s6'),
  'T5-042': () => slots(10),
  'T5-048': () => {
    const row = britishKeys.find(({ key }) => key[0] === 0.25)!;
    return {
      shaft_slot: row.shaftSlot,
      hub_slot: row.hubSlot,
      key: row.key,
      shaft_dia_over_incl: [row.over, row.upTo],
    };
  },
  'T5-057': () => ({
    above_shaft_K: [heatLimits.bearingAboveShaft.low, heatLimits.bearingAboveShaft.high],
    never_above_C_A: heatLimits.bearingNeverAbove,
    open_bearing_max_C_B: heatLimits.openBearing,
    sealed_max_C_B: heatLimits.sealedBearing,
    housing_rise_K_B: [heatLimits.housingRise.low, heatLimits.housingRise.high],
  }),
};

/** As `transcribed`, where we hold only some of the figures or write them in another way. */
const transcribedInPart: Readonly<Record<string, () => unknown>> = {
  'T5-050': () => {
    const printed = checks.get('T5-050')!.expected as Readonly<Record<string, string>>;
    expect(americanKeys.slice(0, 6).map(({ over, upTo, side }) => [over, upTo, side])).toEqual(
      Object.entries(printed).map(([range, side]) => [...range.split('-').map(inchOf), inchOf(side)]),
    );
  },
  // Of copper nothing here is made.
  'T5-051': () => {
    expect(checks.get('T5-051')!.expected).toMatchObject({
      grey_iron: alloy('grey-iron', 'grey iron castings'),
      ductile_60_40_18: alloy('ductile-iron', '60-40-18'),
      Al_6061: alloy('aluminium', '6061'),
      Al_356: alloy('aluminium', '356, cast'),
      Al_1100: alloy('aluminium', '1100'),
      aluminium_generic: alloy('aluminium', 'generic'),
      grey_iron_generic: alloy('grey-iron', 'grey iron, generic'),
      brass: alloy('brass', 'generic'),
    });
  },
  // Of the two figures the height of the nut; its width across flats is not held.
  ...Object.fromEntries(
    (
      [
        ['T5-062', 10],
        ['T5-064', 12],
        ['T5-066', 16],
      ] as const
    ).map(([id, size]) => [
      id,
      () => {
        const [height] = checks.get(id)!.expected as readonly number[];
        expect(nutHeights.get(size)).toBe(height);
      },
    ]),
  ),
};

const notRun: Readonly<Record<string, string>> = {
  'T5-004': 'The formula behind IT7 before it is rounded; the product holds the standard’s rounded table.',
  'T5-006': 'The formula behind IT7 before it is rounded; the product holds the standard’s rounded table.',
  'T5-008': 'The formula behind IT7 before it is rounded; the product holds the standard’s rounded table.',
  'T5-068': 'Rules in words: the least of one thread is the default behind T5-063; no most is judged.',
};

describe('fits, keys and heat', () => {
  it.each(Object.keys(run))('%s', (id) => {
    expect(apart(run[id]!(), checks.get(id)!.expected)).toBeLessThan(1e-10);
  });
});

describe('tables beside print, transcribed and no evidence', () => {
  it.each(Object.keys(transcribed))('%s', (id) => {
    expect(checks.get(id)!.recomputed).toBe(false);
    expect(transcribed[id]!()).toEqual(checks.get(id)!.expected);
  });

  it.each(Object.keys(transcribedInPart))('%s, in part', (id) => {
    expect(checks.get(id)!.recomputed).toBe(false);
    transcribedInPart[id]!();
  });
});

it('leaves no value of the topic out', () => {
  const ids = [run, transcribed, transcribedInPart, notRun].flatMap((map) => Object.keys(map));
  expect(ids.sort()).toEqual([...checks.keys()].sort());
});
