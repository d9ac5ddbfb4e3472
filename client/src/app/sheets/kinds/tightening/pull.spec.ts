import { describe, expect, it } from 'vitest';
import { filledSlots } from '../../next-slot';
import { clickWrench, digitalWrench, entryOf, pumpNuts } from '../../testing/steps';
import { noAdapter, readAdapter } from './adapter-fields';
import { atFastener, fastenerStates, pullOf, settingFor, toGo } from './pull';

const pulled = (pass: number, fastener: string) => ({
  ...entryOf({
    kind: 'tightening',
    pass,
    fastener,
    toolId: 'digital',
    reading: { value: 18, unit: 'N·m' },
  }),
  inTray: null,
});

describe('a pull', () => {
  it('is read back from its slot, with its target', () => {
    // Half of 36 N·m.
    expect(pullOf(pumpNuts, 'pull/1/3')).toMatchObject({ pass: 1, fastener: '3', target: { value: 18 } });
    expect(pullOf(pumpNuts, 'pull/9/3')).toBeNull();
  });

  it('stands in the drawing as done, in hand, next or to come', () => {
    const slots = filledSlots(pumpNuts, [pulled(1, '1')]);
    expect(fastenerStates(pumpNuts, slots, 1, 'pull/1/2', 'pull/1/3')).toEqual({
      '1': 'done',
      '2': 'in-hand',
      '3': 'next',
      '4': 'to-come',
    });
    expect(toGo(slots, 1)).toBe(3);
  });
});

describe('what the wrench must be set to', () => {
  it('is the target itself without an adapter', () => {
    expect(settingFor({ value: 36, unit: 'N·m' }, clickWrench, undefined, 'N·m').setting?.value).toBe(36);
  });

  it('is less with an adapter that makes the wrench longer', () => {
    // T·L/(L + E): TM 9-254, pp. 91–92. 135 lbf·in on a 10 in wrench with 1.5 in in line is 117.39 lbf·in.
    const wrench = { ...clickWrench, length: { value: 10, unit: 'in' as const } };
    const adapter = { length: { value: 1.5, unit: 'in' as const }, angle: 0 };
    const { setting } = settingFor({ value: 135, unit: 'lbf·in' }, wrench, adapter, 'lbf·in');
    expect(setting?.value).toBeCloseTo(117.39, 2);
    expect(atFastener({ value: 117.39, unit: 'lbf·in' }, wrench, adapter).value).toBeCloseTo(135, 1);
  });

  it('can’t be said for a wrench whose length is not in the register', () => {
    const adapter = { length: { value: 60, unit: 'mm' as const }, angle: 0 };
    const found = settingFor(
      { value: 36, unit: 'N·m' },
      { ...digitalWrench, length: undefined },
      adapter,
      'N·m',
    );
    expect(found.setting).toBeNull();
    expect(found.error?.message).toContain('T-07');
  });
});

describe('an adapter as it is typed', () => {
  it('is left out while it is not ticked', () => {
    expect(readAdapter({ ...noAdapter, length: 'x' })).toMatchObject({ adapter: undefined, isWhole: true });
  });

  it('takes a bare length in millimetres, another unit where it is typed, comma or point', () => {
    const read = (length: string, angle = '0') => readAdapter({ isOn: true, length, angle }).adapter;
    expect(read('60')).toEqual({ length: { value: 60, unit: 'mm' }, angle: 0 });
    expect(read('1 1/2 in', '−45')).toEqual({ length: { value: 1.5, unit: 'in' }, angle: -45 });
    expect(read('62,5', '22,5')).toEqual({ length: { value: 62.5, unit: 'mm' }, angle: 22.5 });
  });

  it('says which field can’t be used', () => {
    expect(readAdapter({ isOn: true, length: '', angle: '0' })).toMatchObject({
      isWhole: false,
      lengthError: null,
    });
    expect(readAdapter({ isOn: true, length: '5 N·m', angle: '0' }).lengthError).toContain('length');
    expect(readAdapter({ isOn: true, length: '60', angle: 'left' }).angleError).toContain('degrees');
  });
});
