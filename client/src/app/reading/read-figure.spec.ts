import { describe, expect, it } from 'vitest';
import { readFigure } from './read-figure';

describe('a typed figure', () => {
  it('is read with comma and with point, in the field’s unit', () => {
    expect(readFigure('0,18', 'mm').quantity).toEqual({ value: 0.18, unit: 'mm' });
    expect(readFigure('55.4', 'N·m').quantity).toEqual({ value: 55.4, unit: 'N·m' });
  });

  it('is read as typed on the keypad: fraction and sign', () => {
    expect(readFigure('1 1/2', 'in').quantity).toEqual({ value: 1.5, unit: 'in' });
    expect(readFigure('−4', 'mm').quantity).toEqual({ value: -4, unit: 'mm' });
  });

  it('takes a unit that is typed too', () => {
    expect(readFigure('1.5 thou', 'mm').quantity).toEqual({ value: 1.5, unit: 'thou' });
  });

  it('is neither figure nor error while nothing is typed', () => {
    expect(readFigure('  ', 'mm')).toEqual({ quantity: null, error: null });
  });

  it('says in a sentence why it is none', () => {
    const { quantity, error } = readFigure('about right', 'mm');
    expect(quantity).toBeNull();
    expect(error).toContain('about right');
  });
});
