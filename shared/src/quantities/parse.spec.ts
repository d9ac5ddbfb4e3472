import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { InputError } from '../contracts/input-error.js';
import { units, type Unit } from '../contracts/quantity.js';
import { parseQuantity } from './parse.js';
import { printQuantity } from './print.js';

/** What the words say; common practice, no source. */
const readings: [string, number, Unit][] = [
  ['27 lbf·ft', 27, 'lbf·ft'],
  ['27 lb ft', 27, 'lbf·ft'],
  ['27 ft-lb', 27, 'lbf·ft'],
  ['36.6 Nm', 36.6, 'N·m'],
  ['36,6 Nm', 36.6, 'N·m'],
  ['0.0015"', 0.0015, 'in'],
  ['.0015 in', 0.0015, 'in'],
  ['1.5 thou', 1.5, 'thou'],
  ['38 µm', 38, 'µm'],
  ['10 kgf·m', 10, 'kgf·m'],
  ['60 psi', 60, 'psi'],
  ['4.1 bar', 4.1, 'bar'],
  ['3/8"', 0.375, 'in'],
  ['3⁄8 in', 0.375, 'in'],
  ['1 1/2 in', 1.5, 'in'],
  ['1-1/2"', 1.5, 'in'],
  ['1½ in', 1.5, 'in'],
  ['⅜ in', 0.375, 'in'],
  ['-1 1/2 in', -1.5, 'in'],
  ['−5 °C', -5, '°C'],
  ['– 5 °C', -5, '°C'],
  ['+5 °C', 5, '°C'],
  ['27\u2009N·m', 27, 'N·m'],
  ['1\u2009500 psi', 1500, 'psi'],
  ['1\u00a0234,5 N', 1234.5, 'N'],
  ['1,234.5 N', 1234.5, 'N'],
  ['1.234,5 N', 1234.5, 'N'],
  ['1,234,567 Pa', 1234567, 'Pa'],
  ['88,012 mm', 88.012, 'mm'],
  ['2e3 Pa', 2000, 'Pa'],
  ['27.Nm', 27, 'N·m'],
  ['0', 0, 'mm'],
];

describe('parseQuantity', () => {
  it.each(readings)('reads %j', (text, value, unit) => {
    expect(parseQuantity(text, 'mm')).toEqual({ value, unit });
  });

  it.each([
    '',
    'mm',
    'twelve mm',
    '1/0 in',
    '1..5 mm',
    '1.5.2 mm',
    '1,23,456 Pa',
    '10-12 mm',
    '5 furlongs',
    '5',
    '1e99 mm',
    '±5 mm',
    '0x10 mm',
    'NaN mm',
    'Infinity mm',
  ])('refuses %j and names the field', (text) => {
    expect(() => parseQuantity(text)).toThrow(
      expect.objectContaining({ name: 'InputError', field: 'quantity' }),
    );
  });

  it('names the field that it was given', () => {
    expect(() => parseQuantity('x', 'mm', 'low')).toThrow(expect.objectContaining({ field: 'low' }));
  });

  it.each([' ', '1', '1,', '1 ', '1/', '-', '½', '['])('refuses a megabyte of %j', (part) => {
    const text = part.repeat(Math.ceil(1_000_000 / part.length));
    expect(() => parseQuantity(text, 'mm', 'low')).toThrow(
      expect.objectContaining({ name: 'InputError', field: 'low' }),
    );
  });

  it('answers any text with a finite figure or an InputError', () => {
    const text = fc.oneof(
      fc.string(),
      fc.string({ unit: fc.constantFrom(...'0123456789.,/ -−eE½"'), maxLength: 40 }),
    );
    fc.assert(
      fc.property(text, (written) => {
        try {
          expect(Number.isFinite(parseQuantity(written, 'mm').value)).toBe(true);
        } catch (error) {
          expect(error).toBeInstanceOf(InputError);
        }
      }),
    );
  });

  it('reads back what printQuantity prints', () => {
    const unit = fc.constantFrom(...Object.values(units).flat());
    const hundredths = fc.integer({ min: -999_999, max: 999_999 });
    fc.assert(
      fc.property(hundredths, unit, (figure, symbol) => {
        const quantity = { value: figure / 100, unit: symbol };
        expect(parseQuantity(printQuantity(quantity, { digits: 2 }))).toEqual(quantity);
      }),
    );
  });
});
