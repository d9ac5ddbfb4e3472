import { describe, expect, it } from 'vitest';
import { KeyFor, newKey } from './new-key';

describe('a key made on the device', () => {
  it('is a random UUID', () => {
    // RFC 9562, 5.4: version 4 in the 13th digit, variant 8 to b in the 17th.
    const uuid4 = /^[0-9a-f]{8}-[0-9a-f]{4}-4[0-9a-f]{3}-[89ab][0-9a-f]{3}-[0-9a-f]{12}$/;
    const keys = Array.from({ length: 200 }, newKey);
    expect(keys.every((key) => uuid4.test(key))).toBe(true);
    expect(new Set(keys).size).toBe(200);
  });

  it('stays the same while the same thing is sent again', () => {
    const keys = new KeyFor();
    const first = keys.of({ outcome: 'agree' });
    expect(keys.of({ outcome: 'agree' })).toBe(first);
    expect(keys.of({ outcome: 'dispute' })).not.toBe(first);
  });
});
