import { describe, expect, it } from 'vitest';
import { joinUnit, splitUnit, withUnit } from './split-unit';

describe('a figure and its unit', () => {
  // As a workshop writes them: the design's own list of spellings.
  it.each([
    ['27 lbf·ft', '27', 'lbf·ft'],
    ['27 lb ft', '27', 'lbf·ft'],
    ['27 ft-lb', '27', 'lbf·ft'],
    ['36,6 Nm', '36,6', 'N·m'],
    ['0.0015"', '0.0015', 'in'],
    ['1 1/2 in', '1 1/2', 'in'],
    ['3/8"', '3/8', 'in'],
    ['1½ in', '1½', 'in'],
    ['38 µm', '38', 'µm'],
    ['−12 °C', '−12', '°C'],
    ['4 cm3', '4', 'cm3'],
    ['1.5e-3 m', '1.5e-3', 'm'],
  ])('are parted in %s', (text, figure, unit) => {
    expect(splitUnit(text)).toEqual({ figure, unit });
  });

  it.each(['27', '27 furlongs', '', 'mm', '3/8', '−', '1,5'])(
    'are one where no unit is written: “%s”',
    (text) => {
      expect(splitUnit(text)).toEqual({ figure: text });
    },
  );

  it('are joined again, and nothing has no unit', () => {
    expect(joinUnit(' 27 ', 'lbf·ft')).toBe('27 lbf·ft');
    expect(joinUnit(' ', 'mm')).toBe('');
  });

  it.each([
    ['27.', '27. N·m'],
    ['1½', '1½ N·m'],
    ['27 lbf·ft', '27 lbf·ft'],
    ['27 l', '27 l'],
    ['−', '−'],
    ['', ''],
  ])('stand together as they are typed: “%s”', (text, typed) => {
    expect(withUnit(text, 'N·m')).toBe(typed);
  });
});
