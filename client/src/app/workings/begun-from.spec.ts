import { describe, expect, it } from 'vitest';
import { isBegun, readBegun, sayBegun } from './begun-from';

describe('what a case was begun from', () => {
  it('is said and read again', () => {
    const said = sayBegun('AT18,2', 'Head nuts');
    expect(said).toBe('AT18, edition 2: Head nuts');
    expect(readBegun(said)).toEqual({ edition: 'AT18,2', of: 'Head nuts' });
  });

  it('is no edition where the text says none', () => {
    expect(readBegun('')).toBeNull();
    expect(readBegun('the shed')).toBeNull();
  });

  it('is found again in the words of either side of the ocean, and cut to its length', () => {
    expect(isBegun({ edition: 'AT18,2', of: 'Inlet valves' }, '{Inlet} valves')).toBe(true);
    expect(isBegun({ edition: 'AT18,2', of: 'Head nuts' }, 'Cap nuts')).toBe(false);
    const long = 'x'.repeat(200);
    const begun = readBegun(sayBegun('AT18,2', long));
    expect(begun !== null && isBegun(begun, long)).toBe(true);
  });
});
