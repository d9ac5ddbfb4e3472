import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { WrenchSettingRequest } from '../contracts/calculations.js';
import { InputError } from '../contracts/input-error.js';
import { wrenchSetting } from './wrench-setting.js';

const mm = (value: number) => ({ value, unit: 'mm' }) as const;
const inches = (value: number) => ({ value, unit: 'in' }) as const;

describe('what the wrench must be set to', () => {
  it.each([
    // T4-124, CF-R: helicopter maintenance manual ch. 20, the adapter lengthens the wrench; prints 117.39 in.lb.
    [0, 117.3913043478261],
    // T4-125, CF-R: the adapter shortens the wrench; prints 158.82 in.lb.
    [180, 158.8235294117647],
  ])('135 lbf·in through 1.5 in on 10 in at %d°', (adapterAngle, expected) => {
    const torque = { value: 135, unit: 'lbf·in' } as const;
    const { setting } = wrenchSetting({
      torque,
      wrenchLength: inches(10),
      adapterLength: inches(1.5),
      adapterAngle,
    });
    expect(setting.unit).toBe('lbf·in');
    expect(setting.value).toBeCloseTo(expected, 9);
  });

  it.each([
    // T4-131, T4-133, T4-134, CF-254: TM 9-254 pp. 91–92, effective length l + a cos α; worked out from it.
    // The torque is 27 lbf·ft (T1-008, NIST-R: 36.60708460494781 N·m), which their titles round.
    [45, 32.747727864685956],
    [135, 41.49762682703917],
    [180, 43.92850152593737],
    // By the same formula: at a right angle the length does not change.
    [90, 36.60708460494781],
  ])('36.607 N·m through 50 mm on 300 mm at %d°', (adapterAngle, expected) => {
    const torque = { value: 36.60708460494781, unit: 'N·m' } as const;
    const lengths = { wrenchLength: mm(300), adapterLength: { value: 5, unit: 'cm' } } as const;
    expect(wrenchSetting({ torque, ...lengths, adapterAngle }).setting.value).toBeCloseTo(expected, 9);
    expect(wrenchSetting({ torque, ...lengths, adapterAngle: -adapterAngle }).setting.value).toBeCloseTo(
      expected,
      9,
    );
  });

  it('pulls the fastener to its torque: setting × effective length ÷ wrench length', () => {
    const positive = fc.double({ min: 1, max: 1000, noNaN: true });
    fc.assert(
      fc.property(
        positive,
        positive,
        fc.double({ min: 0, max: 0.98, noNaN: true }),
        fc.integer({ min: -360, max: 360 }),
        (torque, wrench, share, angle) => {
          const { setting } = wrenchSetting({
            torque: { value: torque, unit: 'N·m' },
            wrenchLength: mm(wrench),
            adapterLength: mm(wrench * share),
            adapterAngle: angle,
          });
          const force = setting.value / wrench;
          expect(force * (wrench + wrench * share * Math.cos((angle * Math.PI) / 180))).toBeCloseTo(
            torque,
            6,
          );
        },
      ),
    );
  });
});

describe('input that cannot be used', () => {
  const good = {
    torque: { value: 27, unit: 'lbf·ft' },
    wrenchLength: mm(300),
    adapterLength: mm(50),
    adapterAngle: 0,
  };

  it.each([
    ['request', 'all'],
    ['torque', { ...good, torque: 27 }],
    ['torque.value', { ...good, torque: { value: 0, unit: 'lbf·ft' } }],
    ['torque.value', { ...good, torque: { value: NaN, unit: 'lbf·ft' } }],
    ['torque.unit', { ...good, torque: mm(27) }],
    ['wrenchLength.value', { ...good, wrenchLength: mm(0) }],
    ['wrenchLength.value', { ...good, wrenchLength: mm(-300) }],
    ['adapterLength.value', { ...good, adapterLength: mm(-50) }],
    ['adapterLength.unit', { ...good, adapterLength: { value: 50, unit: 'furlong' } }],
    ['adapterAngle', { ...good, adapterAngle: Infinity }],
    ['adapterAngle', { ...good, adapterAngle: '0' }],
    ['adapterLength', { ...good, adapterLength: mm(300), adapterAngle: 180 }],
    ['adapterLength', { ...good, adapterLength: mm(900), adapterAngle: 120 }],
  ])('%s', (field, request) => {
    expect(() => wrenchSetting(request as WrenchSettingRequest)).toThrow(InputError);
    expect(() => wrenchSetting(request as WrenchSettingRequest)).toThrow(expect.objectContaining({ field }));
  });
});
