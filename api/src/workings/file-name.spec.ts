import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { fileName } from './file-name.js';

describe('the name of a PDF', () => {
  it.each([
    ['AT18, edition 2: head nuts', undefined, 'tightening-plan-at18-head-nuts.pdf'],
    ['', undefined, 'tightening-plan.pdf'],
    ['', 'LM-C01', 'tightening-plan-LM-C01.pdf'],
    ['AT18, edition 12: Kühlwasser/½"', 'LM C01', 'tightening-plan-at18-kuhlwasser-1-2-LM_C01.pdf'],
    ['漢', undefined, 'tightening-plan.pdf'],
  ])('of what was begun from %j with car %s is %s', (begunFrom, car, name) => {
    expect(fileName('tightening-plan', begunFrom, car)).toBe(name);
  });

  it('has safe characters only, and is short', () => {
    fc.assert(
      fc.property(fc.string({ unit: 'binary', maxLength: 120 }), (begunFrom) => {
        expect(fileName('convert', begunFrom)).toMatch(/^convert(-[a-z0-9-]{1,60})?\.pdf$/);
      }),
    );
  });
});
