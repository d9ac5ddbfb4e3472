import type { EntryContent } from '../contracts/steps.js';
import type { Verdict } from '../contracts/verdict.js';
import { slotKeyOf } from './slots.js';

/** What the rules need of an entry. */
export interface RecordedEntry {
  readonly id: string;
  readonly content: EntryContent;
  readonly verdict: Verdict;
  readonly round: number;
  readonly replaces: string | null;
  readonly by: string;
}

/**
 * The entries that count: not replaced, and not older than the round from which the step was done again.
 * @param entriesFromRound rounds before this one were undone by a settled snag
 */
export function currentEntries<E extends RecordedEntry>(
  entries: readonly E[],
  entriesFromRound: number,
): readonly E[] {
  const replaced = new Set(entries.map(({ replaces }) => replaces));
  return entries.filter((entry) => entry.round >= entriesFromRound && !replaced.has(entry.id));
}

/** The entry that holds a slot, if one does. */
export function entryAt<E extends RecordedEntry>(current: readonly E[], slotKey: string): E | undefined {
  return current.find((entry) => slotKeyOf(entry.content) === slotKey);
}
