import type { PersonName } from '@second-spanner/shared/contracts/people';
import type { Agreement, Settlement, SnagView } from '@second-spanner/shared/contracts/sheets';
import type {
  EntryContent,
  SecondReadingContent,
  StepDefinition,
} from '@second-spanner/shared/contracts/steps';
import type { Verdict } from '@second-spanner/shared/contracts/verdict';

/** What people recorded on a step, as one query gives it. Times are ISO texts: they come out of JSON. */
export interface EntryRow {
  readonly id: string;
  readonly round: number;
  readonly content: EntryContent;
  readonly verdict: Verdict;
  readonly reason: string;
  readonly replaces: string | null;
  readonly replaceReason: string | null;
  readonly by: PersonName;
  readonly at: string;
}

export interface SecondReadingRow {
  readonly id: string;
  readonly round: number;
  readonly content: SecondReadingContent;
  readonly agreement: Agreement;
  readonly by: PersonName;
  readonly at: string;
}

export interface CountersignatureRow {
  readonly id: string;
  readonly round: number;
  readonly outcome: 'agree' | 'dispute';
  readonly reason: string | null;
  readonly pullsWitnessed: readonly string[];
  readonly by: PersonName;
  readonly at: string;
}

export interface SettlementRow {
  readonly how: Settlement;
  readonly reason: string;
  readonly by: PersonName;
  readonly at: string;
}

export interface SnagRow {
  readonly id: string;
  readonly round: number;
  readonly cause: SnagView['cause'];
  readonly words: string;
  /** The people who disagree. */
  readonly parties: readonly string[];
  /** The failing entry that raised it. */
  readonly entryId: string | null;
  readonly by: PersonName;
  readonly at: string;
  readonly settled: SettlementRow | null;
}

export interface CallRow {
  readonly to: PersonName;
  readonly at: string;
}

/** All records of one step, each oldest first. */
export interface StepRecords {
  readonly definition: StepDefinition;
  readonly entries: readonly EntryRow[];
  readonly secondReadings: readonly SecondReadingRow[];
  readonly countersignatures: readonly CountersignatureRow[];
  readonly snags: readonly SnagRow[];
  readonly calls: readonly CallRow[];
}
