import { describe, expect, it } from 'vitest';
import { codesOf, readCode } from './verification-code.js';

describe('a verification code', () => {
  // Crockford's base 32, from its own table: 0 is 0, A is 10, H 17, J 18, M 20, N 21, P 22, T 26, V 27, Z 31.
  it('is the first forty bits in Crockford’s base 32', () => {
    expect(codesOf('00'.repeat(32))[0]).toBe('0000-0000');
    expect(codesOf('ff'.repeat(32))[0]).toBe('ZZZZ-ZZZZ');
    // 0x0123456789: 00000 00100 10001 10100 01010 11001 11100 01001 = 0 4 17 20 10 25 28 9.
    expect(codesOf(`0123456789${'00'.repeat(27)}`)[0]).toBe('04HM-ASW9');
  });

  it('has five more to follow, should it be taken', () => {
    expect(codesOf('00'.repeat(32))).toHaveLength(6);
  });

  it.each([
    ['04hm-asw9', '04HM-ASW9'],
    [' 04HM ASW9 ', '04HM-ASW9'],
    ['O4HMASW9', '04HM-ASW9'],
    ['il00-0000', '1100-0000'],
  ])('is read as people type it: %s', (typed, code) => {
    expect(readCode(typed)).toBe(code);
  });

  it.each(['', '04HM-ASW', '04HM-ASW99', 'U000-0000', '04HM_ASW9', '0'.repeat(5000)])(
    'is not taken for one: %s',
    (typed) => {
      expect(readCode(typed)).toBeNull();
    },
  );
});
