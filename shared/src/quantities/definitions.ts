import type { Measure } from 'convert-units';
import time from 'convert-units/definitions/time';
import type { Kind } from '../contracts/quantity.js';

type System = 'SI';
export type UnitMeasure = Measure<System, string>;

const named = (anchor: number, shift?: number) => ({
  name: { singular: '', plural: '' },
  to_anchor: anchor,
  ...(shift === undefined ? {} : { anchor_shift: shift }),
});

const measure = (factors: Record<string, number>): UnitMeasure => ({
  systems: {
    SI: Object.fromEntries(Object.entries(factors).map(([symbol, factor]) => [symbol, named(factor)])),
  },
});

/**
 * The one place where units are defined, for the conversion library.
 *
 * The library's own tables round (1 lbf·ft = 1.355818 N·m), so only its table of times is used. Each
 * measure here is counted in a unit so small that every factor is a whole number that a double holds
 * exactly; a conversion is then one multiplication and one division, right to the last digit or two.
 *
 * Exact definitions, NIST SP 811 (2008), App. B.8 and its footnotes: 1 in = 25.4 mm, 1 lb = 0.453 592 37 kg,
 * g = 9.806 65 m/s², hence 1 lbf = 4.448 221 615 260 5 N.
 */
export const measures: Record<Kind, UnitMeasure> = {
  /** In 10⁻¹⁶ N·m. 1 lbf·in = 0.112 984 829 027 616 7 N·m. */
  torque: measure({
    'N·m': 1e16,
    'lbf·ft': 13_558_179_483_314_004,
    'lbf·in': 1_129_848_290_276_167,
    'kgf·m': 98_066_500_000_000_000,
    'kgf·cm': 980_665_000_000_000,
  }),
  /** In 0.1 µm. */
  length: measure({ m: 1e7, cm: 1e5, mm: 1e4, µm: 10, in: 254_000, thou: 254, ft: 3_048_000 }),
  /** In 0.01 mm². Square metres only for the way to SI. */
  area: measure({ m2: 1e8, mm2: 100, cm2: 1e4, in2: 64_516 }),
  /** In 10⁻¹³ N. */
  force: measure({ N: 1e13, kN: 1e16, lbf: 44_482_216_152_605, kgf: 98_066_500_000_000 }),
  /** In 1/1 290 320 000 Pa: 1 psi = 8 896 443 230 521 / 1 290 320 000 Pa. */
  pressure: measure({
    Pa: 1_290_320_000,
    kPa: 1_290_320_000e3,
    MPa: 1_290_320_000e6,
    bar: 1_290_320_000e5,
    psi: 8_896_443_230_521,
  }),
  /** In 0.001 mm³. */
  volume: measure({ m3: 1e12, l: 1e9, cm3: 1e6, mm3: 1e3, in3: 16_387_064 }),
  /** In 1/180 K: 273.15 K × 180 = 49 167, 459.67 °F × 100 = 45 967. */
  temperature: { systems: { SI: { K: named(180), '°C': named(180, -49_167), '°F': named(100, -45_967) } } },
  time,
  resistance: measure({ Ω: 1, kΩ: 1e3, MΩ: 1e6 }),
  /** In 10⁻⁵ g. */
  mass: measure({ kg: 1e8, g: 1e5, lb: 45_359_237 }),
};

/** Degrees of one size, without their zero points: what a difference of temperatures converts by. */
export const temperatureDegrees: UnitMeasure = measure({ K: 180, '°C': 180, '°F': 100 });

/** The unit in which everything inside is counted. */
export const siUnits: Record<Kind, string> = {
  torque: 'N·m',
  length: 'm',
  area: 'm2',
  force: 'N',
  pressure: 'Pa',
  volume: 'm3',
  temperature: 'K',
  time: 's',
  resistance: 'Ω',
  mass: 'kg',
};
