import { describe, expect, it } from 'vitest';
import type { Quantity, Unit } from '../contracts/quantity.js';
import { compressionRatio } from '../measuring/compression-ratio.js';
import { formula } from '../measuring/formula/formula.js';
import { plasticStrip } from '../measuring/plastic-strip.js';
import { ringGap } from '../measuring/ring-gap.js';
import { roundReadings } from '../measuring/round-readings.js';
import { sweptVolume } from '../measuring/swept-volume.js';
import { convert } from '../quantities/convert.js';
import { pistonHeight } from '../valve-train/piston-position.js';
import { apart } from './apart.js';
import { checksOf } from './checks.js';

const checks = checksOf('Clearances and engine geometry');
const of = (value: number, unit: Unit): Quantity => ({ value, unit });
const total = (bore: Quantity, stroke: Quantity, cylinders: number): Quantity =>
  sweptVolume({ bore, stroke, cylinders }).total;

const ofJournal = (share: number): number =>
  formula({ formula: `${share} * d`, readings: { d: of(60, 'mm') }, unit: 'µm' }).value.value;
const gapFor = (perBore: number): number =>
  ringGap({ bore: of(4.03, 'in'), gap: of(0.02, 'in'), perBore: { low: perBore } }).wanted.low!.value;

const meanSpeed = (crankSpeed: number): number | undefined =>
  pistonHeight({ stroke: of(90, 'mm'), rodLength: of(150, 'mm'), crank: 0, crankSpeed }).meanSpeed;

/** A bore of 10 cm², so that a stroke in cm sweeps ten times as many cm³. */
const tenSquare = of(Math.sqrt(40 / Math.PI), 'cm');

/** Ovality and taper of the readings as they stand in the file. */
function ovalityAndTaper(): readonly number[] {
  const inputs = checks.get('T7-014')!.inputs as Readonly<Record<string, readonly number[]>>;
  const readings = Object.entries(inputs).flatMap(([axis, values]) =>
    values.map((value, i) => ({ height: `${i}`, axis, value: of(value, 'mm') })),
  );
  const { ovality, taper } = roundReadings({ of: 'bore', readings });
  return [ovality!.value, taper!.value];
}

const run: Readonly<Record<string, { readonly actual: () => unknown; readonly expected?: unknown }>> = {
  'T7-002': { actual: () => [ofJournal(0.00075), ofJournal(0.001)] },
  'T7-004': { actual: () => [gapFor(0.0045), gapFor(0.005)] },
  'T7-009': {
    actual: () =>
      ringGap({ bore: of(86, 'mm'), gap: of(1, 'mm'), ringHotterBy: of(200, 'K') }).closesBy?.value,
  },
  'T7-013': {
    actual: () => plasticStrip({ diameter: of(0.2, 'mm'), width: of(0.6, 'mm') }).clearance.value,
  },
  'T7-014': { actual: ovalityAndTaper },
  'T7-019': { actual: () => convert(total(of(100, 'mm'), of(83, 'mm'), 1), 'mm3').value },
  'T7-020': { actual: () => total(of(65.5, 'mm'), of(44.5, 'mm'), 4).value },
  'T7-022': { actual: () => total(of(10, 'cm'), of(5, 'cm'), 4).value },
  'T7-023': { actual: () => total(of(4, 'in'), of(3.52, 'in'), 8).value },
  'T7-024': { actual: () => total(of(4.5, 'cm'), of(10, 'cm'), 4).value },
  // Backwards: the bore that was worked out for 200 in³ sweeps them.
  'T7-025': {
    actual: () => total(of(checks.get('T7-025')!.expected as number, 'in'), of(3.75, 'in'), 6).value,
    expected: 200,
  },
  // Backwards: what was worked out for a ratio of 9.5 has it.
  'T7-026': {
    actual: () => {
      const stroke = of((checks.get('T7-026')!.expected as number) / 10, 'cm');
      const clearanceVolume = of(80, 'cm3');
      return sweptVolume({ bore: tenSquare, stroke, cylinders: 1, clearanceVolume }).compressionRatio;
    },
    expected: 9.5,
  },
  'T7-027': {
    actual: () =>
      compressionRatio({
        ...{ bore: tenSquare, stroke: of(30, 'cm'), chamber: of(20, 'cm3'), deck: of(0, 'mm'), wanted: 11 },
        gasket: { bore: tenSquare, thickness: of(0, 'mm') },
      }).chamberFor?.value,
  },
  'T7-030': { actual: () => meanSpeed(3000) },
  'T7-031': { actual: () => meanSpeed(7200) },
  'T7-029': {
    actual: () =>
      compressionRatio({
        ...{ bore: of(86, 'mm'), stroke: of(86, 'mm'), chamber: of(40, 'cm3'), dish: of(4, 'cm3') },
        ...{ deck: of(0.5, 'mm'), gasket: { bore: of(88, 'mm'), thickness: of(1.2, 'mm') } },
      }).compressionRatio,
  },
};

const notRun: Readonly<Record<string, string>> = {
  'T7-011':
    'Transcribed, no evidence. The ranges of one make of strip; the scale on the packet in hand counts, so no table is kept.',
};

describe('clearances and engine geometry', () => {
  it.each(Object.keys(run))('%s', (id) => {
    const { actual, expected = checks.get(id)!.expected } = run[id]!;
    expect(apart(actual(), expected)).toBeLessThan(1e-12);
  });
});

it('leaves no value of the topic out', () => {
  expect([...Object.keys(run), ...Object.keys(notRun)].sort()).toEqual([...checks.keys()].sort());
});
