import { describe, expect, it } from 'vitest';
import { units, type Unit } from '../contracts/quantity.js';
import { readUnit } from './unit-names.js';

/** Common practice, no source: what manuals, tool scales and people write. */
const spellings: [Unit, readonly string[]][] = [
  ['N·m', ['Nm', 'N m', 'N.m', 'N-m', 'N⋅m', 'NM', 'nm', 'newton metres', 'N\u2009m']],
  [
    'lbf·ft',
    ['lbf ft', 'lb ft', 'lb-ft', 'ft-lb', 'ft lbs', 'ft.lb.', 'ftlb', 'foot-pounds', 'lbf-ft', 'FT-LB'],
  ],
  ['lbf·in', ['in-lb', 'lb in', 'in lbs', 'inch-pounds', 'lbf.in', 'in‑lb']],
  ['kgf·m', ['mkg', 'kgm', 'kg m', 'kg·m', 'm·kg', 'kgf m', 'mkp']],
  ['kgf·cm', ['kgcm', 'cmkg', 'kg-cm', 'kgf cm']],
  ['µm', ['um', '\u00b5m', '\u03bcm', 'micron']],
  ['in', ['"', '″', '”', "''", 'inch', 'inches', 'IN']],
  ['ft', ["'", '′', 'foot', 'feet']],
  ['thou', ['mil', 'mils', 'Thou']],
  ['mm', ['MM', 'millimetres']],
  ['mm2', ['mm²', 'mm^2', 'sq mm']],
  ['in2', ['sq in', 'in²', 'sq.in.']],
  ['psi', ['PSI', 'lb/in²', 'lbf/sq in']],
  ['MPa', ['MPA', 'N/mm²']],
  ['kPa', ['KPA', 'kpa']],
  ['cm3', ['cc', 'cm³', 'ml', 'CC']],
  ['in3', ['cu in', 'cu.in.', 'in³']],
  ['l', ['L', 'litre', 'liters']],
  ['°C', ['C', 'degC', 'deg. C', '℃', 'ºC', '˚C']],
  ['°F', ['F', '℉', 'deg F']],
  ['h', ['hr', 'hours']],
  ['Ω', ['\u2126', '\u03a9', 'ohm', 'Ohms']],
  ['kΩ', ['k\u2126', 'kohm', 'KΩ']],
  ['MΩ', ['M\u2126', 'Mohm', 'megohms', 'Megohm']],
  ['lb', ['lbs', 'pounds']],
  ['kgf', ['kp']],
];

describe('readUnit', () => {
  it.each(spellings)('reads the spellings of %s', (unit, texts) => {
    for (const text of texts) expect([text, readUnit(text)]).toEqual([text, unit]);
  });

  it('reads every canonical symbol as itself', () => {
    for (const unit of Object.values(units).flat()) expect(readUnit(unit)).toBe(unit);
  });

  it.each([
    '',
    ' ',
    'mPa',
    'mΩ',
    'mohm',
    'M',
    'k',
    'S',
    'furlong',
    'lb/in',
    '__proto__',
    'constructor',
    'N·mm',
  ])('does not guess at %j', (text) => expect(readUnit(text)).toBeUndefined());

  it('finds no unit in hostile texts', () => {
    expect(readUnit('·'.repeat(1_000_000))).toBeUndefined();
    expect(readUnit(27 as unknown as string)).toBeUndefined();
  });
});
