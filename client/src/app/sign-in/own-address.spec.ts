import { describe, expect, it } from 'vitest';
import { ownAddress } from './own-address';

describe('the address after signing in', () => {
  it('is where the person wanted to go', () => {
    expect(ownAddress('/sheets/one?from=two')).toBe('/sheets/one?from=two');
  });

  it.each([undefined, 'https://elsewhere.example', '//elsewhere.example', '/\\elsewhere.example', ''])(
    'is the bench for %s',
    (to) => {
      expect(ownAddress(to)).toBe('/');
    },
  );
});
