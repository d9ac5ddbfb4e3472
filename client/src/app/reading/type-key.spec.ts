import { describe, expect, it } from 'vitest';
import { typeKey, type KeypadKey, type Typed } from './type-key';

const empty: Typed = { text: '', start: 0, end: 0 };
const typed = (keys: readonly KeypadKey[], from = empty): Typed => keys.reduce(typeKey, from);

describe('a key of the keypad', () => {
  it('types digits with a point or a comma', () => {
    expect(typed(['5', '5', '.', '4']).text).toBe('55.4');
    expect(typed(['0', ',', '1', '8']).text).toBe('0,18');
  });

  it('types a mixed fraction', () => {
    expect(typed(['1', 'space', '1', 'fraction', '2']).text).toBe('1 1/2');
  });

  it('rubs out the figure before the caret, and nothing at the start', () => {
    expect(typed(['5', '5', 'back']).text).toBe('5');
    expect(typeKey({ text: '554', start: 2, end: 2 }, 'back')).toEqual({ text: '54', start: 1, end: 1 });
    expect(typed(['back'])).toEqual(empty);
  });

  it('replaces what is marked', () => {
    expect(typeKey({ text: '55.4', start: 0, end: 4 }, '6')).toEqual({ text: '6', start: 1, end: 1 });
    expect(typeKey({ text: '55.4', start: 2, end: 4 }, 'back')).toEqual({ text: '55', start: 2, end: 2 });
  });

  it('turns the sign of the whole figure and keeps the caret where it was in it', () => {
    expect(typed(['4', 'sign'])).toEqual({ text: '−4', start: 2, end: 2 });
    expect(typed(['4', 'sign', 'sign', '2']).text).toBe('42');
  });
});
