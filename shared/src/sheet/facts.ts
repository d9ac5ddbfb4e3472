import type { Verdict } from '../contracts/verdict.js';
import type { StepDefinition } from '../contracts/steps.js';
import { currentEntries, type RecordedEntry } from './current-entries.js';
import { slotKeyOf, slotsOf } from './slots.js';

/** What is known of one step: kept beside it, worked out again whenever something is recorded on it. */
export interface StepFacts {
  readonly done: number;
  readonly of: number;
  /** The worst of the current entries; null when there are none. */
  readonly verdict: Verdict | null;
  readonly recorders: readonly string[];
  readonly countersigned: boolean;
  readonly openSnags: number;
}

export interface StepRecord {
  readonly definition: StepDefinition;
  readonly entries: readonly RecordedEntry[];
  readonly entriesFromRound: number;
  /** Agreed by a second person in the step's present round. */
  readonly countersigned: boolean;
  readonly openSnags: number;
  /** Ids of entries whose fault the foreman accepted as it is. */
  readonly accepted: ReadonlySet<string>;
}

const severity: Record<Verdict, number> = { pass: 0, 'not-judged': 1, doubtful: 2, fail: 3 };

/** Counts a slot as done when its current entry passes, or its fault was accepted as it is. */
export function stepFacts(record: StepRecord): StepFacts {
  const current = currentEntries(record.entries, record.entriesFromRound);
  const good = new Set(
    current
      .filter((entry) => entry.verdict === 'pass' || record.accepted.has(entry.id))
      .map((entry) => slotKeyOf(entry.content)),
  );
  const slots = slotsOf(record.definition);
  const unaccepted = current.filter((entry) => !record.accepted.has(entry.id)).map(({ verdict }) => verdict);
  const worst = unaccepted.reduce<Verdict>((a, b) => (severity[b] > severity[a] ? b : a), 'pass');
  return {
    done: slots.filter(({ key }) => good.has(key)).length,
    of: slots.length,
    verdict: current.length === 0 ? null : worst,
    recorders: [...new Set(record.entries.map(({ by }) => by))],
    countersigned: record.countersigned,
    openSnags: record.openSnags,
  };
}

/** Everything that the step wants is recorded and good. */
export const isRecorded = (facts: Pick<StepFacts, 'done' | 'of'>): boolean =>
  facts.of > 0 && facts.done === facts.of;
