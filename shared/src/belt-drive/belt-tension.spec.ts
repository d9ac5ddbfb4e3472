import { describe, expect, it } from 'vitest';
import type { BeltTensionRequest } from '../contracts/belt-drive.js';
import { InputError } from '../contracts/input-error.js';
import { beltTension } from './belt-tension.js';

const inches = (value: number) => ({ value, unit: 'in' }) as const;
const mm = (value: number) => ({ value, unit: 'mm' }) as const;
const belt: BeltTensionRequest = {
  driverDiameter: inches(8),
  drivenDiameter: inches(4),
  centres: inches(16),
};

describe('how far a belt should give', () => {
  it('is 1/64 of its free span', () => {
    // T6-029: √(16² − 2²) in.
    const answer = beltTension(belt);
    expect(answer.freeSpan.value).toBeCloseTo(15.874507866387544, 10);
    expect(answer.deflection.value).toBeCloseTo(15.874507866387544 / 64, 10);
    expect(answer.verdict).toBe('not-judged');
    expect(answer.assumed.join(' ')).toMatch(/1\/64/);
  });

  it.each([
    // 15.8745 in / 64 = 0.24804 in = 6.3002 mm; ± 10 % is 5.670 to 6.930 mm.
    [mm(5.66), 'fail', /too tight/],
    [mm(5.68), 'pass', /gives 5\.68\smm/],
    [mm(6.92), 'pass', /5\.67\smm to 6\.93\smm/],
    [mm(6.94), 'fail', /too slack/],
  ] as const)('measured %j: %s', (measured, verdict, words) => {
    const answer = beltTension({ ...belt, measured });
    expect(answer.verdict).toBe(verdict);
    expect(answer.reason).toMatch(words);
    expect(answer.deflection.unit).toBe('mm');
  });

  it.each([
    [10, 'pass'],
    [13, 'pass'],
    [9.9, 'fail'],
    [13.1, 'fail'],
  ] as const)('by the maker’s own limits of 10 to 13 mm, measured %d: %s', (value, verdict) => {
    const answer = beltTension({ ...belt, limits: { low: mm(10), high: mm(13) }, measured: mm(value) });
    expect(answer.verdict).toBe(verdict);
    expect(answer.deflection.value).toBeCloseTo(11.5, 9);
  });
});

describe('input that cannot be used', () => {
  it.each([
    ['request', 1],
    ['centres', { ...belt, centres: inches(5) }],
    ['deflectionPerSpan', { ...belt, deflectionPerSpan: 2 }],
    ['tolerance', { ...belt, tolerance: -0.1 }],
    ['measured.value', { ...belt, measured: mm(-1) }],
    ['limits.low', { ...belt, limits: { low: mm(5), high: mm(4) } }],
    ['limits.high', { ...belt, limits: { low: mm(5) } }],
  ])('%s', (field, request) => {
    expect(() => beltTension(request as BeltTensionRequest)).toThrow(InputError);
    expect(() => beltTension(request as BeltTensionRequest)).toThrow(expect.objectContaining({ field }));
  });
});
