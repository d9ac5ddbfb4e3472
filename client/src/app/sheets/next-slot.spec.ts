import { describe, expect, it } from 'vitest';
import type { EntryView } from '@second-spanner/shared/contracts/sheets';
import type { EntryContent } from '@second-spanner/shared/contracts/steps';
import { failingSlot, filledSlots, nextSlot, slotAfter } from './next-slot';
import { entryOf, mainClearance, pumpNuts } from './testing/steps';

const shown = (entry: EntryView) => ({ ...entry, inTray: null });
const read = (at: string, over: Partial<EntryView> = {}) =>
  shown(entryOf({ kind: 'measurement', at, value: { value: 0.05, unit: 'mm' }, toolId: 'gauge' }, over));
const pull = (pass: number, fastener: string, over: Partial<EntryView> = {}) => {
  const content: EntryContent = {
    kind: 'tightening',
    pass,
    fastener,
    toolId: 'digital',
    reading: { value: 18, unit: 'N·m' },
  };
  return shown(entryOf(content, over));
};

describe('the slot at hand', () => {
  it('is the first empty one, in the order of the step', () => {
    expect(nextSlot(filledSlots(mainClearance, []))?.label).toBe('Main 1');
    expect(nextSlot(filledSlots(mainClearance, [read('Main 1')]))?.label).toBe('Main 2');
  });

  it('goes on behind the one just kept, and comes back to what was passed over', () => {
    const slots = filledSlots(mainClearance, [read('Main 2')]);
    expect(nextSlot(slots, 'at/Main 2')?.label).toBe('Main 3');
    const more = filledSlots(mainClearance, [read('Main 2'), read('Main 3')]);
    expect(nextSlot(more, 'at/Main 3')?.label).toBe('Main 1');
  });

  it('counts a replaced entry as gone, and leaves a failing one for the end', () => {
    const replaced = read('Main 1', { current: false, replacedBy: 'other' });
    expect(nextSlot(filledSlots(mainClearance, [replaced]))?.label).toBe('Main 1');
    const slots = filledSlots(mainClearance, [
      read('Main 1', { verdict: 'fail' }),
      read('Main 2'),
      read('Main 3'),
    ]);
    expect(nextSlot(slots)).toBeNull();
    expect(failingSlot(slots)?.label).toBe('Main 1');
  });

  it('stays in its pass until every fastener of it is good', () => {
    const jumped = filledSlots(pumpNuts, [pull(1, '1'), pull(1, '4')]);
    expect(nextSlot(jumped, 'pull/1/4')?.key).toBe('pull/1/2');
    const oneFailed = filledSlots(
      pumpNuts,
      ['1', '2', '3'].map((nut) => pull(1, nut)).concat(pull(1, '4', { verdict: 'fail' })),
    );
    expect(nextSlot(oneFailed)).toBeNull();
    const allGood = filledSlots(
      pumpNuts,
      ['1', '2', '3', '4'].map((nut) => pull(1, nut)),
    );
    expect(nextSlot(allGood, 'pull/1/4')?.key).toBe('pull/2/1');
  });

  it('takes a fault that was accepted for good, as the api counts it', () => {
    const pulls = ['1', '2', '3'].map((nut) => pull(1, nut)).concat(pull(1, '4', { verdict: 'fail' }));
    expect(nextSlot(filledSlots(pumpNuts, pulls, 3))).toBeNull();
    expect(nextSlot(filledSlots(pumpNuts, pulls, 4))?.key).toBe('pull/2/1');
  });

  it('says beforehand what follows: the next fastener, then the next pass, then nothing', () => {
    const followingOf = (done: readonly ReturnType<typeof pull>[], key: string) => {
      const slots = filledSlots(pumpNuts, done);
      const atHand = slots.find((slot) => slot.key === key);
      return atHand === undefined ? undefined : (slotAfter(slots, atHand)?.key ?? null);
    };
    expect(followingOf([], 'pull/1/1')).toBe('pull/1/2');
    const three = ['1', '2', '3'].map((nut) => pull(1, nut));
    expect(followingOf(three, 'pull/1/4')).toBe('pull/2/1');
    const all = [1, 2].flatMap((pass) => ['1', '2', '3', '4'].map((nut) => pull(pass, nut)));
    expect(followingOf(all.slice(0, 7), 'pull/2/4')).toBeNull();
  });
});
