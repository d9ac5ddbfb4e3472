import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { InputError } from '../contracts/input-error.js';
import {
  requireAnyQuantity,
  requireList,
  requireNumber,
  requireOneOf,
  requireQuantity,
  requireRecord,
  requireText,
} from './require.js';

const refusal = (field: string) => expect.objectContaining({ name: 'InputError', field });

describe('requireQuantity', () => {
  it('makes the unit canonical', () => {
    expect(requireQuantity({ value: 27, unit: 'ft-lb' }, 'torque', 'final')).toEqual({
      value: 27,
      unit: 'lbf·ft',
    });
  });

  it.each<[string, unknown, string]>([
    ['nothing', undefined, 'final'],
    ['null', null, 'final'],
    ['a bare number', 27, 'final'],
    ['a list', [27, 'Nm'], 'final'],
    ['a text', '27 Nm', 'final'],
    ['no value', { unit: 'Nm' }, 'final.value'],
    ['a value in words', { value: '27', unit: 'Nm' }, 'final.value'],
    ['not a number', { value: NaN, unit: 'Nm' }, 'final.value'],
    ['infinity', { value: Infinity, unit: 'Nm' }, 'final.value'],
    ['an absurd size', { value: 1e16, unit: 'Nm' }, 'final.value'],
    ['a negative torque', { value: -1, unit: 'Nm' }, 'final.value'],
    ['no unit', { value: 27 }, 'final.unit'],
    ['an unknown unit', { value: 27, unit: 'x'.repeat(1_000_000) }, 'final.unit'],
    ['another kind', { value: 27, unit: 'mm' }, 'final.unit'],
    ['an inherited name', { value: 27, unit: 'constructor' }, 'final.unit'],
  ])('refuses %s', (_what, input, field) => {
    expect(() => requireQuantity(input, 'torque', 'final')).toThrow(refusal(field));
  });

  it('takes negative figures where told, and refuses zero where told', () => {
    expect(requireQuantity({ value: -1, unit: 'mm' }, 'length', 'gap', { negative: true }).value).toBe(-1);
    expect(() => requireQuantity({ value: 0, unit: 'mm' }, 'length', 'bore', { zero: false })).toThrow(
      refusal('bore.value'),
    );
    expect(() => requireQuantity({ value: 1e-300, unit: 'mm' }, 'length', 'bore', { zero: false })).toThrow(
      refusal('bore.value'),
    );
    expect(requireQuantity({ value: 1e-300, unit: 'mm' }, 'length', 'gap').value).toBe(1e-300);
  });

  it('takes temperatures down to absolute zero, and no negative difference of them', () => {
    expect(requireQuantity({ value: -20, unit: '°C' }, 'temperature', 't').value).toBe(-20);
    // Absolute zero is −459.67 °F by the definition of the scales.
    expect(() => requireQuantity({ value: -460, unit: '°F' }, 'temperature', 't')).toThrow(
      refusal('t.value'),
    );
    expect(() => requireQuantity({ value: -1, unit: '°C' }, 'temperature', 't', { interval: true })).toThrow(
      refusal('t.value'),
    );
  });

  it('answers anything at all with a quantity or an InputError', () => {
    fc.assert(
      fc.property(fc.oneof(fc.anything(), fc.record({ value: fc.double(), unit: fc.string() })), (input) => {
        try {
          requireAnyQuantity(input, 'q');
        } catch (error) {
          expect(error).toBeInstanceOf(InputError);
        }
      }),
    );
  });
});

describe('requireNumber', () => {
  it('keeps to its bounds and says them', () => {
    expect(requireNumber(3, 'n', { min: 1, max: 5, integer: true })).toBe(3);
    expect(() => requireNumber(6, 'n', { min: 1, max: 5 })).toThrow('from 1 to 5');
    expect(() => requireNumber(2.5, 'n', { integer: true })).toThrow(refusal('n'));
    expect(() => requireNumber('3', 'n')).toThrow(refusal('n'));
    expect(() => requireNumber(NaN, 'n')).toThrow(refusal('n'));
    expect(() => requireNumber(-Infinity, 'n')).toThrow(refusal('n'));
  });
});

describe('requireText, requireList, requireOneOf', () => {
  it('take what fits', () => {
    expect(requireText('post 1', 't')).toBe('post 1');
    expect(requireList([1, 2], 'l', { min: 1, max: 2 })).toEqual([1, 2]);
    expect(requireList(new Array(2), 'l', { max: 2 }).map(() => 'seen')).toEqual(['seen', 'seen']);
    expect(requireOneOf('cap', ['cap', 'drive'], 'seenFrom')).toBe('cap');
  });

  it('refuse what does not', () => {
    expect(() => requireText(' ', 't')).toThrow(refusal('t'));
    expect(() => requireText('x'.repeat(1_000_000), 't')).toThrow(refusal('t'));
    expect(() => requireList({ length: 1 }, 'l', { max: 2 })).toThrow(refusal('l'));
    expect(() => requireList([], 'l', { min: 1, max: 2 })).toThrow(refusal('l'));
    expect(() => requireList(new Array(1_000_000), 'l', { max: 2 })).toThrow(refusal('l'));
    expect(() => requireOneOf('toString', ['cap', 'drive'], 'seenFrom')).toThrow('cap, drive');
  });
});

describe('requireRecord', () => {
  it.each(['{"__proto__": {"a": 1}}', '{"constructor": 1}', '{"prototype": 1}'])('refuses %s', (json) => {
    expect(() => requireRecord(JSON.parse(json), 'fitted')).toThrow(refusal('fitted'));
  });

  it('answers a copy in which only what was sent means anything', () => {
    const record = requireRecord({ a: 1 }, 'fitted');
    expect(record['a']).toBe(1);
    expect(record['toString']).toBeUndefined();
  });

  it('refuses lists, null and too many names', () => {
    expect(() => requireRecord([], 'fitted')).toThrow(refusal('fitted'));
    expect(() => requireRecord(null, 'fitted')).toThrow(refusal('fitted'));
    expect(() => requireRecord({ a: 1, b: 2 }, 'fitted', { max: 1 })).toThrow(refusal('fitted'));
    expect(() => requireRecord({ ['x'.repeat(1_000_000)]: 1 }, 'fitted')).toThrow(refusal('fitted'));
  });
});
