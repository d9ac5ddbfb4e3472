import type { StepDefinition } from '@second-spanner/shared/contracts/steps';
import { slotKeyOf, slotsOf, type Slot } from '@second-spanner/shared/sheet/slots';
import type { ShownEntry } from './shown-step';

/** A thing the step wants recorded, with the entry that fills it now. */
export interface FilledSlot extends Slot {
  readonly entry: ShownEntry | null;
  /** Recorded, and it passes or was accepted as it is. */
  readonly isGood: boolean;
}

/**
 * Every slot of a step in its order, with its current entry.
 * @param done how many the api counts as good: one more than pass are those whose fault was accepted
 */
export function filledSlots(
  definition: StepDefinition,
  entries: readonly ShownEntry[],
  done = 0,
): readonly FilledSlot[] {
  const current = new Map(
    entries.filter((entry) => entry.current).map((entry) => [slotKeyOf(entry.content), entry]),
  );
  const atApi = [...current.values()].filter(({ inTray }) => inTray === null);
  const areAllAccepted = done > 0 && done === atApi.length;
  return slotsOf(definition).map((slot) => {
    const entry = current.get(slot.key) ?? null;
    const isAccepted = areAllAccepted && entry?.inTray === null;
    return { ...slot, entry, isGood: entry?.verdict === 'pass' || isAccepted };
  });
}

/** The pass of a pull's slot; every other slot stands in one group with its like. */
const groupOf = (key: string): string => (key.startsWith('pull/') ? key.split('/', 2).join('/') : '');

/** The slots that may be recorded now: a tightening's next pass opens when the one before is complete. */
function openSlots(slots: readonly FilledSlot[]): readonly FilledSlot[] {
  const first = slots.find(({ isGood }) => !isGood);
  return first === undefined ? [] : slots.filter(({ key }) => groupOf(key) === groupOf(first.key));
}

/** The slot to record next: the first empty one behind `after`, else the first empty one; null when none is empty. */
export function nextSlot(slots: readonly FilledSlot[], after: string | null = null): FilledSlot | null {
  const open = openSlots(slots);
  const at = open.findIndex(({ key }) => key === after);
  return (
    [...open.slice(at + 1), ...open.slice(0, Math.max(0, at))].find(({ entry }) => entry === null) ?? null
  );
}

/** The slot that follows the one at hand when that one is recorded and passes. */
export function slotAfter(slots: readonly FilledSlot[], atHand: FilledSlot): FilledSlot | null {
  const isFirstOfPass = (slot: FilledSlot): boolean => groupOf(slot.key) !== groupOf(atHand.key);
  const others = openSlots(slots).filter(({ key }) => key !== atHand.key);
  const inGroup = nextSlot(slots, atHand.key);
  if (inGroup !== null || others.some(({ isGood }) => !isGood)) return inGroup;
  return (
    slots.slice(slots.indexOf(atHand)).find((slot) => isFirstOfPass(slot) && slot.entry === null) ?? null
  );
}

/** The first slot whose entry does not pass: to be put right when nothing is empty any more. */
export function failingSlot(slots: readonly FilledSlot[]): FilledSlot | null {
  return slots.find(({ entry, isGood }) => entry !== null && !isGood) ?? null;
}
