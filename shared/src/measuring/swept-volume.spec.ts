import { describe, expect, it } from 'vitest';
import type { CompressionRatioRequest, SweptVolumeRequest } from '../contracts/measuring.js';
import type { Quantity, Unit } from '../contracts/quantity.js';
import { compressionRatio } from './compression-ratio.js';
import { sweptVolume } from './swept-volume.js';

const of = (value: number, unit: Unit = 'mm'): Quantity => ({ value, unit });

describe('sweptVolume', () => {
  it.each<[string, Quantity, Quantity, number, Unit, number]>([
    ['T7-020, SV2', of(65.5), of(44.5), 4, 'cm3', 599.7806957518306],
    ['T7-022, SV3', of(10, 'cm'), of(5, 'cm'), 4, 'cm3', 1570.7963267948967],
    ['T7-023, SV4', of(4, 'in'), of(3.52, 'in'), 8, 'in3', 353.8689965003543],
  ])('of %s', (_from, bore, stroke, cylinders, unit, expected) => {
    const { each, total } = sweptVolume({ bore, stroke, cylinders });
    expect(total.unit).toBe(unit);
    expect(total.value).toBeCloseTo(expected, 8);
    expect(each.value).toBeCloseTo(expected / cylinders, 8);
  });

  it('has a ratio where the clearance volume is known', () => {
    // T7-026, CR1: ratio 9.5 with 80 cm³ sweeps 680 cm³. A bore of 10 cm² and 68 cm of stroke sweep that.
    const bore = of(Math.sqrt(40 / Math.PI), 'cm');
    const answer = sweptVolume({ bore, stroke: of(68, 'cm'), cylinders: 1, clearanceVolume: of(80, 'cm3') });
    expect(answer.compressionRatio).toBeCloseTo(9.5, 12);
  });

  it.each<[string, unknown]>([
    ['bore.value', { bore: of(0), stroke: of(80), cylinders: 4 }],
    ['stroke.unit', { bore: of(80), stroke: of(80, 'psi'), cylinders: 4 }],
    ['cylinders', { bore: of(80), stroke: of(80), cylinders: 4000 }],
    ['cylinders', { bore: of(80), stroke: of(80), cylinders: 2.5 }],
    ['clearanceVolume.value', { bore: of(80), stroke: of(80), cylinders: 4, clearanceVolume: of(0, 'cm3') }],
  ])('is refused on %s', (field, request) => {
    expect(() => sweptVolume(request as SweptVolumeRequest)).toThrow(expect.objectContaining({ field }));
  });
});

describe('compressionRatio', () => {
  const request: CompressionRatioRequest = {
    ...{ bore: of(86), stroke: of(86), chamber: of(40, 'cm3'), deck: of(0.5), dish: of(4, 'cm3') },
    gasket: { bore: of(88), thickness: of(1.2) },
  };

  it('adds up what is left above the piston', () => {
    // T7-029, SV1 and definition.
    const answer = compressionRatio(request);
    expect(answer.compressionRatio).toBeCloseTo(10.216421061373437, 12);
    expect(answer.squish.value).toBeCloseTo(1.7, 12);
    expect(answer.cautions).toEqual([]);
  });

  it('says what the chamber must hold', () => {
    // T7-027, CR2: ratio 11 with 300 cm³ leaves 30 cm³. A bore of 10 cm² and 30 cm of stroke; no gasket.
    const bore = of(Math.sqrt(40 / Math.PI), 'cm');
    const { chamberFor } = compressionRatio({
      ...{ bore, stroke: of(30, 'cm'), chamber: of(25, 'cm3'), deck: of(0), wanted: 11 },
      gasket: { bore, thickness: of(0) },
    });
    expect(chamberFor?.value).toBeCloseTo(30, 9);
    const again = compressionRatio({ ...request, wanted: 10.216421061373437 });
    expect(again.chamberFor?.value).toBeCloseTo(40, 9);
  });

  it('takes a piston that stands proud, and a dome', () => {
    const proud = compressionRatio({ ...request, deck: of(-0.5), dish: of(-4, 'cm3') });
    expect(proud.squish.value).toBeCloseTo(0.7, 12);
    expect(proud.compressionRatio).toBeGreaterThan(10.22);
    expect(proud.cautions[0]).toContain('0.7');
    expect(compressionRatio({ ...request, deck: of(-1.5) }).cautions[0]).toContain('would meet');
  });

  it('says that the gasket stands in the bore', () => {
    const small = compressionRatio({ ...request, gasket: { bore: of(85), thickness: of(1.2) } });
    expect(small.cautions).toHaveLength(1);
  });

  it.each<[string, unknown]>([
    ['gasket', { ...request, gasket: 1.2 }],
    ['gasket.bore.value', { ...request, gasket: { bore: of(0), thickness: of(1) } }],
    ['chamber.value', { ...request, chamber: of(-1, 'cm3') }],
    ['dish', { ...request, dish: of(-100, 'cm3') }],
    ['wanted', { ...request, wanted: 1 }],
    ['wanted', { ...request, wanted: 40, dish: of(20, 'cm3') }],
  ])('is refused on %s', (field, one) => {
    expect(() => compressionRatio(one as CompressionRatioRequest)).toThrow(
      expect.objectContaining({ field }),
    );
  });
});
