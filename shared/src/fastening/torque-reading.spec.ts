import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { TorqueReadingRequest } from '../contracts/fastening.js';
import { InputError } from '../contracts/input-error.js';
import type { Quantity, Unit } from '../contracts/quantity.js';
import { torqueReading } from './torque-reading.js';

const torque = (value: number, unit: Unit = 'lbf·ft'): Quantity => ({ value, unit });
const tolerance = { low: torque(2), high: torque(2) };
// 27 lbf·ft on a water pump's studs: common practice, no source. ±4 % above 10 N·m: I6789.
const click: TorqueReadingRequest = {
  torque: torque(27),
  wrench: { kind: 'click', deviation: 0.04 },
  setting: torque(27),
};
const digital: TorqueReadingRequest = {
  torque: torque(27),
  wrench: { kind: 'digital', deviation: 0.04 },
  reading: torque(27),
};

describe('a click wrench', () => {
  it('proves its setting, and says so', () => {
    const { verdict, reason, rule } = torqueReading(click);
    expect(verdict).toBe('pass');
    expect(reason).toContain('pulled once to the click');
    expect(rule).toContain('setting is judged');
    expect(rule).toContain('±4 % alone');
  });

  it.each([
    // NIST SP 811: 27 lbf·ft is 36.607 N·m; 4 % of it is 1.46.
    [torque(36.6, 'N·m'), 'pass'],
    [torque(28), 'pass'],
    [torque(28.2), 'fail'],
    [torque(27, 'N·m'), 'fail'],
  ])('set to %o without a tolerance: %s', (setting, verdict) => {
    expect(torqueReading({ ...click, setting }).verdict).toBe(verdict);
  });

  it.each([
    [27.5, 'pass'],
    [28.5, 'doubtful'],
    [31, 'fail'],
  ])('set to %s lbf·ft between 25 and 29: %s', (value, verdict) => {
    expect(torqueReading({ ...click, tolerance, setting: torque(value) }).verdict).toBe(verdict);
  });
});

describe('a wrench that is read', () => {
  it.each([
    [25.9, 'doubtful'],
    [26.1, 'pass'],
    [27.8, 'pass'],
    [28, 'doubtful'],
    [30.3, 'fail'],
  ])('%s lbf·ft between 25 and 29 with 4 %%: %s', (value, verdict) => {
    const judged = torqueReading({ ...digital, tolerance, reading: torque(value) });
    expect(judged.verdict).toBe(verdict);
    expect(judged.rule).toContain('kept clear inside both');
  });

  it('is too coarse, not wrong, where no room is left between the limits', () => {
    const tight = { low: torque(1), high: torque(1) };
    const { verdict, reason } = torqueReading({ ...digital, tolerance: tight });
    expect(verdict).toBe('doubtful');
    expect(reason).toContain('too coarse');
  });

  it('is judged by its class alone where a single torque is printed', () => {
    expect(torqueReading({ ...digital, reading: torque(28) }).verdict).toBe('pass');
    const { verdict, rule } = torqueReading({ ...digital, reading: torque(28.2) });
    expect(verdict).toBe('fail');
    expect(rule).toContain('no limits are printed');
  });
});

it.each([
  // 4 % of 0.3 is 0.012, 6 % of 70 is 4.2: the allowance itself is good.
  [0.3, 0.04, 0.312, 'pass'],
  [70, 0.06, 74.2, 'pass'],
  [70, 0.06, 65.8, 'pass'],
  [70, 0.06, 74.3, 'fail'],
])('%s N·m by a dial of %s that shows %s without limits: %s', (wanted, deviation, shown, verdict) => {
  const judged = torqueReading({
    torque: torque(wanted, 'N·m'),
    wrench: { kind: 'dial', deviation },
    reading: torque(shown, 'N·m'),
  });
  expect(judged.verdict).toBe(verdict);
});

describe('input that cannot be used', () => {
  it.each([
    ['request', null],
    ['torque.value', { ...click, torque: torque(0) }],
    ['tolerance.low', { ...click, tolerance: { low: torque(27), high: torque(1) } }],
    ['tolerance.high', { ...click, tolerance: { low: torque(1) } }],
    ['wrench', { ...click, wrench: 'click' }],
    ['wrench.kind', { ...click, wrench: { kind: 'bar', deviation: 0.04 } }],
    ['wrench.deviation', { ...click, wrench: { kind: 'click' } }],
    ['wrench.deviation', { ...click, wrench: { kind: 'click', deviation: -0.04 } }],
    ['setting', { ...click, setting: undefined }],
    ['reading', { ...click, reading: torque(27) }],
    ['reading', { ...digital, reading: undefined }],
    ['setting', { ...digital, setting: torque(27) }],
    ['reading.unit', { ...digital, reading: { value: 27, unit: 'mm' } }],
  ])('%s', (field, request) => {
    expect(() => torqueReading(request as TorqueReadingRequest)).toThrow(InputError);
    expect(() => torqueReading(request as TorqueReadingRequest)).toThrow(expect.objectContaining({ field }));
  });
});

it('never passes what the wrench could not tell from outside the limits', () => {
  const value = fc.double({ min: 20, max: 34, noNaN: true });
  const deviation = fc.double({ min: 0, max: 0.1, noNaN: true });
  fc.assert(
    fc.property(value, deviation, (shown, share) => {
      const { verdict } = torqueReading({
        ...digital,
        tolerance,
        wrench: { kind: 'dial', deviation: share },
        reading: torque(shown),
      });
      if (verdict !== 'pass') return;
      expect(shown * (1 - share)).toBeGreaterThanOrEqual(25 - 1e-6);
      expect(shown * (1 + share)).toBeLessThanOrEqual(29 + 1e-6);
    }),
  );
});
