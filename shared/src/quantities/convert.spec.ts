import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { InputError } from '../contracts/input-error.js';
import { units, type Kind, type Quantity, type Unit } from '../contracts/quantity.js';
import { convert, convertInterval, fromSi, intervalToSi, kindOf, toSi } from './convert.js';

interface Factor {
  readonly id: string;
  readonly from: readonly [number, Unit];
  readonly to: Unit;
  readonly expected: number;
}

/**
 * Reference values, topic unit factors. Sources: NIST SP 811 (2008) App. B.8 as read in the open data set
 * NISTunits 1.0.1; where it prints seven figures, the product of the exact definitions (1 in = 25.4 mm,
 * 1 lb = 0.453 592 37 kg, g = 9.806 65 m/s², 1 bar = 100 kPa) that agrees with the printed figure.
 */
const factors: readonly Factor[] = [
  { id: 'T1-001', from: [1, 'lbf'], to: 'N', expected: 4.4482216152605 },
  { id: 'T1-002', from: [1, 'lbf·ft'], to: 'N·m', expected: 1.3558179483314004 },
  { id: 'T1-003', from: [1, 'lbf·in'], to: 'N·m', expected: 0.1129848290276167 },
  { id: 'T1-005', from: [1, 'kgf·m'], to: 'N·m', expected: 9.80665 },
  { id: 'T1-006', from: [1, 'kgf·cm'], to: 'N·m', expected: 0.0980665 },
  { id: 'T1-008', from: [27, 'lbf·ft'], to: 'N·m', expected: 36.6070846049478108 },
  { id: 'T1-009', from: [27, 'lbf·ft'], to: 'lbf·in', expected: 324 },
  { id: 'T1-010', from: [27, 'lbf·ft'], to: 'kgf·m', expected: 3.732883768152 },
  { id: 'T1-011', from: [27, 'N·m'], to: 'lbf·ft', expected: 22500000000000000 / 1129848290276167 },
  { id: 'T1-012', from: [1, 'psi'], to: 'Pa', expected: 8896443230521 / 1290320000 },
  { id: 'T1-013', from: [1, 'bar'], to: 'kPa', expected: 100 },
  { id: 'T1-014', from: [1, 'bar'], to: 'psi', expected: 129032000000000 / 8896443230521 },
  { id: 'T1-017', from: [1, 'in'], to: 'mm', expected: 25.4 },
  { id: 'T1-019', from: [0.002, 'in'], to: 'mm', expected: 0.0508 },
  { id: 'T1-020', from: [1, 'in3'], to: 'cm3', expected: 16.387064 },
  { id: 'T1-021', from: [100, 'cm3'], to: 'in3', expected: 12500000 / 2048383 },
  { id: 'T1-027', from: [20, 'N·m'], to: 'kgf·m', expected: 2.0394324259558565 },
  { id: 'T1-029', from: [25, 'N·m'], to: 'lbf·ft', expected: 18.439053731931637 },
];

/**
 * The same table, from memory of NIST SP 811 App. B.8 and of the definitions it rests on: 1 ft = 304.8 mm,
 * 1 thou = 25.4 µm, 1 in² = 645.16 mm², 1 lb = 453.592 37 g, 1 kgf = 9.806 65 N, 1 l = 1 dm³, SI prefixes.
 */
const fromMemory: readonly Omit<Factor, 'id'>[] = [
  { from: [1, 'ft'], to: 'mm', expected: 304.8 },
  { from: [1.5, 'thou'], to: 'µm', expected: 38.1 },
  { from: [1, 'm'], to: 'cm', expected: 100 },
  { from: [1, 'in2'], to: 'mm2', expected: 645.16 },
  { from: [1, 'cm2'], to: 'mm2', expected: 100 },
  { from: [1, 'kgf'], to: 'N', expected: 9.80665 },
  { from: [1, 'kN'], to: 'N', expected: 1000 },
  { from: [1, 'lb'], to: 'g', expected: 453.59237 },
  { from: [1, 'kg'], to: 'g', expected: 1000 },
  { from: [1, 'MPa'], to: 'bar', expected: 10 },
  { from: [1, 'l'], to: 'cm3', expected: 1000 },
  { from: [1, 'm3'], to: 'l', expected: 1000 },
  { from: [1, 'cm3'], to: 'mm3', expected: 1000 },
  { from: [1, 'h'], to: 'min', expected: 60 },
  { from: [1, 'd'], to: 's', expected: 86400 },
  { from: [1, 'MΩ'], to: 'kΩ', expected: 1000 },
  { from: [1, 'kΩ'], to: 'Ω', expected: 1000 },
];

const relative = (actual: number, expected: number): number => Math.abs(actual / expected - 1);

describe('convert', () => {
  it.each(factors)('$id: $from is $expected $to', ({ from: [value, unit], to, expected }) => {
    const answer = convert({ value, unit }, to);
    expect(answer.unit).toBe(to);
    expect(relative(answer.value, expected)).toBeLessThan(1e-15);
  });

  it.each(fromMemory)('$from is $expected $to', ({ from: [value, unit], to, expected }) => {
    expect(relative(convert({ value, unit }, to).value, expected)).toBeLessThan(1e-15);
  });

  it('shifts temperatures by their zero points', () => {
    // T1-023: 125 °C = 257 °F, a bearing mounting note. T8-009: 300 °F = (300 + 459.67)/1.8 K.
    expect(convert({ value: 125, unit: '°C' }, '°F').value).toBe(257);
    expect(convert({ value: 300, unit: '°F' }, 'K').value).toBeCloseTo(422.0388888888889, 12);
    // The definition of the Celsius scale: 0 °C = 273.15 K.
    expect(convert({ value: 0, unit: '°C' }, 'K').value).toBe(273.15);
  });

  it('takes any spelling as the target and answers with the canonical symbol', () => {
    expect(convert({ value: 27, unit: 'lbf·ft' }, 'Nm').unit).toBe('N·m');
  });

  const refused: [string, Quantity, string, string][] = [
    ['another kind', { value: 1, unit: 'mm' }, 'N·m', 'to'],
    ['an unknown target', { value: 1, unit: 'mm' }, 'furlong', 'to'],
    ['an unknown unit', { value: 1, unit: 'ell' as Unit }, 'mm', 'quantity.unit'],
    ['not a number', { value: NaN, unit: 'mm' }, 'in', 'quantity.value'],
    ['infinity', { value: Infinity, unit: 'mm' }, 'in', 'quantity.value'],
    ['an absurd size', { value: 1e16, unit: 'mm' }, 'in', 'quantity.value'],
    ['colder than absolute zero', { value: -500, unit: '°F' }, '°C', 'quantity.value'],
    ['a megabyte of target', { value: 1, unit: 'mm' }, 'x'.repeat(1_000_000), 'to'],
  ];

  it.each(refused)('refuses %s', (_what, quantity, to, field) => {
    expect(() => convert(quantity, to)).toThrow(expect.objectContaining({ name: 'InputError', field }));
  });

  it('comes back to where it set out, between any two units of a kind', () => {
    const twoUnits = fc
      .constantFrom(...(Object.keys(units) as Kind[]))
      .chain((kind) =>
        fc.tuple(fc.constantFrom<Unit>(...units[kind]), fc.constantFrom<Unit>(...units[kind])),
      );
    fc.assert(
      fc.property(twoUnits, fc.double({ min: 1e-3, max: 1e6, noNaN: true }), ([from, to], value) => {
        const back = convert(convert({ value, unit: from }, to), from).value;
        // A temperature loses the digits that its zero point pushes out: 460 degrees of 10⁻¹⁶.
        expect(Math.abs(back - value)).toBeLessThanOrEqual(1e-15 * (value + 1000 * Number(from !== to)));
      }),
    );
  });
});

describe('convertInterval', () => {
  it('leaves the zero points out', () => {
    // T1-025: a difference of 80 to 90 K is 144 to 162 °F, a bearing mounting note.
    expect(convertInterval({ value: 80, unit: 'K' }, '°F').value).toBe(144);
    expect(convertInterval({ value: 90, unit: '°C' }, '°F').value).toBe(162);
  });

  it('is as convert for every other kind', () => {
    // T1-017.
    expect(convertInterval({ value: 1, unit: 'in' }, 'mm').value).toBe(25.4);
  });
});

describe('SI and back', () => {
  it('counts in N·m, m, m², m³, Pa and K', () => {
    // T1-002, T1-017, T1-020, T1-012 and the definition of the Celsius scale.
    expect(toSi({ value: 1, unit: 'lbf·ft' })).toBe(1.3558179483314004);
    expect(toSi({ value: 1, unit: 'in' })).toBe(0.0254);
    expect(toSi({ value: 1, unit: 'in2' })).toBe(0.00064516);
    expect(toSi({ value: 1, unit: 'in3' })).toBe(0.000016387064);
    expect(toSi({ value: 1, unit: 'psi' })).toBeCloseTo(8896443230521 / 1290320000, 10);
    expect(toSi({ value: 20, unit: '°C' })).toBe(293.15);
  });

  it('gives a difference of temperatures in kelvins', () => {
    // T1-025.
    expect(intervalToSi({ value: 144, unit: '°F' })).toBe(80);
  });

  it('comes back from SI', () => {
    // T1-017.
    expect(fromSi(0.0254, 'mm')).toEqual({ value: 25.4, unit: 'mm' });
    expect(() => fromSi(NaN, 'mm')).toThrow(InputError);
  });
});

describe('kindOf', () => {
  it('knows every unit and refuses the rest', () => {
    for (const kind of Object.keys(units) as Kind[]) {
      for (const unit of units[kind]) expect(kindOf(unit)).toBe(kind);
    }
    expect(() => kindOf('__proto__' as Unit)).toThrow(expect.objectContaining({ field: 'unit' }));
  });
});
