import { encode } from 'uqr';
import { describe, expect, it } from 'vitest';
import { runsOf } from './quick-response.js';

describe('a quick response code on paper', () => {
  it('is dark where the code has dark modules, and only there', () => {
    const address = 'http://127.0.0.1:4300/v/7K3F-Q9TD';
    const { size, data } = encode(address, { border: 0 });
    const drawn = data.map((row) => row.map(() => false));
    for (const { x, y, width } of runsOf(address)) {
      const first = Math.round(x * size);
      drawn[Math.round(y * size)]?.fill(true, first, first + Math.round(width * size));
    }
    expect(drawn).toEqual(data);
  });
});
