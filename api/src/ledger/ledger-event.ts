import type { PersonName } from '@second-spanner/shared/contracts/people';
import type {
  Agreement,
  Settlement,
  SignatureMeaning,
  SnagView,
} from '@second-spanner/shared/contracts/sheets';
import type { EntryContent, SecondReadingContent } from '@second-spanner/shared/contracts/steps';
import type { Verdict } from '@second-spanner/shared/contracts/verdict';

/** What can happen to a sheet. Each is told whole, so that the ledger alone tells the sheet's story. */
export type LedgerEvent =
  | { readonly kind: 'laid-out'; readonly specHash: string; readonly steps: number }
  | { readonly kind: 'started' }
  | {
      readonly kind: 'entry';
      readonly step: string;
      readonly id: string;
      readonly round: number;
      readonly content: EntryContent;
      readonly verdict: Verdict;
      readonly reason: string;
      readonly replaces: string | null;
      readonly replaceReason: string | null;
    }
  | {
      readonly kind: 'second-reading';
      readonly step: string;
      readonly id: string;
      readonly round: number;
      readonly content: SecondReadingContent;
      readonly agreement: Agreement;
    }
  | {
      readonly kind: 'countersignature';
      readonly step: string;
      readonly id: string;
      readonly round: number;
      readonly outcome: 'agree' | 'dispute';
      readonly reason: string | null;
      readonly pullsWitnessed: readonly string[];
    }
  | {
      readonly kind: 'snag';
      readonly step: string;
      readonly id: string;
      readonly round: number;
      readonly cause: SnagView['cause'];
      readonly words: string;
      readonly parties: readonly string[];
      readonly entryId: string | null;
    }
  | {
      readonly kind: 'settlement';
      readonly step: string;
      readonly snagId: string;
      readonly cause: SnagView['cause'];
      readonly how: Settlement;
      readonly reason: string;
    }
  | { readonly kind: 'unmarked'; readonly step: string; readonly reason: string }
  | { readonly kind: 'called'; readonly step: string; readonly to: PersonName }
  | {
      readonly kind: 'signed';
      readonly meaning: SignatureMeaning;
      readonly contentHash: string;
      readonly binding: string;
    }
  | { readonly kind: 'sent-back'; readonly reason: string };

/** The body of a ledger line, as it is hashed. */
export type LedgerBody = LedgerEvent & {
  readonly seq: number;
  /** ISO time. */
  readonly at: string;
  readonly by: PersonName;
};
