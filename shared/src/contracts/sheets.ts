import type { PersonName } from './people.js';
import type {
  EntryContent,
  SecondCheckKind,
  SecondReadingContent,
  StepDefinition,
  StepKind,
} from './steps.js';
import type { Verdict } from './verdict.js';

export const sheetStates = ['planned', 'on-the-stand', 'countersigning', 'signed-off', 'released'] as const;
export type SheetState = (typeof sheetStates)[number];

/**
 * Where a step is:
 * - waiting: what it rests on is not done, or a hold point before it stands
 * - open: may be worked; in-hand: begun
 * - to-countersign: recorded, waits for the second person
 * - snag: something on it is wrong and not settled
 * - done
 */
export const stepStatuses = ['waiting', 'open', 'in-hand', 'to-countersign', 'snag', 'done'] as const;
export type StepStatus = (typeof stepStatuses)[number];

export interface SheetSummary {
  readonly id: string;
  /** `LM-0147` */
  readonly code: string;
  readonly state: SheetState;
  readonly carId: string;
  readonly carName: string;
  readonly engineCode: string;
  readonly specEdition: number;
  readonly builder: PersonName;
  readonly countersigner: PersonName;
  readonly stepsDone: number;
  readonly stepsTotal: number;
  readonly openSnags: number;
  readonly changedAt: string;
}

/** Why a step can't be worked yet, and who can change that. */
export interface WaitsFor {
  readonly what: 'step' | 'hold' | 'second-check' | 'snag' | 'sheet';
  readonly code?: string;
  readonly sentence: string;
  readonly person?: string;
}

/** A step in the sheet's list. */
export interface StepLine {
  readonly code: string;
  readonly stage: number;
  readonly kind: StepKind;
  readonly title: string;
  readonly status: StepStatus;
  readonly hold: boolean;
  readonly critical: boolean;
  readonly secondCheck: SecondCheckKind | null;
  readonly done: number;
  readonly of: number;
  readonly openSnags: number;
}

export interface StageLine {
  readonly stage: number;
  readonly title: string;
  readonly hold: boolean;
  readonly cautions: readonly string[];
  readonly steps: readonly StepLine[];
}

export interface Signature {
  readonly meaning: SignatureMeaning;
  readonly person: PersonName;
  readonly at: string;
  /** Hash over signer, meaning, time and the hash of the canonical sheet. */
  readonly binding: string;
  readonly contentHash: string;
}

export const signatureMeanings = ['built', 'countersigned', 'released'] as const;
export type SignatureMeaning = (typeof signatureMeanings)[number];

export interface Sheet extends SheetSummary {
  readonly engineNumber: string;
  readonly ownerName: string | null;
  readonly specId: string;
  readonly specTitle: string;
  readonly specEditionId: string;
  /** Rises with every change. */
  readonly version: number;
  readonly stages: readonly StageLine[];
  readonly signatures: readonly Signature[];
  readonly contentHash: string | null;
  readonly verificationCode: string | null;
  /** What the person who asks may do now; the api decides again. */
  readonly canSign: SignatureMeaning | null;
  readonly nextStep: string | null;
}

export interface EntryView {
  readonly id: string;
  readonly content: EntryContent;
  readonly verdict: Verdict;
  readonly reason: string;
  readonly by: PersonName;
  readonly at: string;
  readonly round: number;
  readonly replaces: string | null;
  readonly replacedBy: string | null;
  /** Why it replaces an older entry. */
  readonly replaceReason: string | null;
  /** Counts for the step now: neither replaced nor undone by a settled snag. */
  readonly current: boolean;
}

export interface SecondReadingView {
  readonly id: string;
  readonly content: SecondReadingContent;
  readonly by: PersonName;
  readonly at: string;
  readonly round: number;
  readonly agreement: Agreement;
}

/** First and second side by side. */
export interface Agreement {
  readonly verdict: Verdict;
  readonly reason: string;
  readonly rows: readonly {
    readonly label: string;
    readonly first: string;
    readonly second: string;
    /** Normalised error, where the two were measured. */
    readonly en: number | null;
    readonly agrees: boolean;
  }[];
}

export interface CountersignatureView {
  readonly by: PersonName;
  readonly at: string;
  readonly round: number;
  readonly outcome: 'agree' | 'dispute';
  readonly reason: string | null;
  readonly pullsWitnessed: readonly string[];
}

export const settlements = ['redone', 'replaced', 'accepted-as-it-is'] as const;
export type Settlement = (typeof settlements)[number];

export interface SnagView {
  readonly id: string;
  readonly stepCode: string;
  readonly cause: 'failed' | 'disagreement' | 'raised';
  readonly words: string;
  readonly by: PersonName;
  readonly at: string;
  readonly settled: {
    readonly how: Settlement;
    readonly reason: string;
    readonly by: PersonName;
    readonly at: string;
  } | null;
  /** Whether the person who asks may settle it. */
  readonly maySettle: boolean;
}

export interface StepDetail extends StepLine {
  readonly sheetId: string;
  readonly version: number;
  readonly definition: StepDefinition;
  readonly round: number;
  readonly waitsFor: readonly WaitsFor[];
  /** The first figures are kept from the person who asks until theirs are in. */
  readonly covered: boolean;
  /** Empty while covered. Oldest first. */
  readonly entries: readonly EntryView[];
  readonly secondReadings: readonly SecondReadingView[];
  readonly countersignatures: readonly CountersignatureView[];
  readonly snags: readonly SnagView[];
  readonly calls: readonly { readonly to: PersonName; readonly at: string }[];
  readonly uncriticalReason: string | null;
  readonly can: {
    readonly record: boolean;
    /** Give the second reading now. */
    readonly readAgain: boolean;
    readonly countersign: boolean;
    readonly raiseSnag: boolean;
    readonly unmarkCritical: boolean;
    readonly call: boolean;
  };
}

/** A step after the second person was called to it. The call counts even where the mail could not be sent. */
export interface CallAnswer extends StepDetail {
  readonly mailed: boolean;
}

export interface NewSheetRequest {
  readonly carId: string;
  readonly specEditionId: string;
  readonly builderId: string;
  readonly countersignerId: string;
}
export interface NewEntryRequest {
  readonly content: EntryContent;
  /** The entry that this one corrects. */
  readonly replaces?: string;
  readonly reason?: string;
}
export interface NewSecondReadingRequest {
  readonly content: SecondReadingContent;
}
export interface NewCountersignatureRequest {
  readonly outcome: 'agree' | 'dispute';
  readonly reason?: string;
  readonly pullsWitnessed?: readonly string[];
}
export interface NewSnagRequest {
  readonly words: string;
}
export interface SettleSnagRequest {
  readonly how: Settlement;
  readonly reason: string;
}
export interface UnmarkCriticalRequest {
  readonly reason: string;
}
export interface SignRequest {
  readonly meaning: SignatureMeaning;
  readonly password: string;
}
export interface SendBackRequest {
  readonly reason: string;
}

/** One line of a sheet's history, from the ledger. */
export interface HistoryLine {
  readonly seq: number;
  readonly at: string;
  readonly by: PersonName;
  readonly stepCode: string | null;
  readonly sentence: string;
  readonly verdict: Verdict | null;
}

/** Sent to everybody who looks at a sheet when something on it changed. */
export interface SheetChanged {
  readonly sheetId: string;
  readonly version: number;
}

export interface BenchItem {
  readonly kind: 'snag' | 'second-check' | 'next-step' | 'sign' | 'release' | 'read';
  readonly sheetId: string;
  readonly sheetCode: string;
  readonly stepCode: string | null;
  readonly stepKind: StepKind | null;
  readonly carName: string;
  readonly title: string;
  readonly sentence: string;
  readonly since: string;
}
export interface Bench {
  /** What waits for the person, most pressing first; at most 50. */
  readonly items: readonly BenchItem[];
  readonly onTheStand: readonly SheetSummary[];
}

/** What anyone with the code on the paper may see. */
export interface Verification {
  readonly sheetCode: string;
  readonly verificationCode: string;
  readonly carName: string;
  readonly engineNumber: string;
  readonly specTitle: string;
  readonly specEdition: number;
  readonly releasedAt: string;
  readonly contentHash: string;
  readonly signatures: readonly {
    readonly meaning: SignatureMeaning;
    readonly name: string;
    readonly at: string;
  }[];
  /** The frozen record was hashed again just now, and every signature checked. */
  readonly verdict: Verdict;
  readonly reason: string;
}

export interface StoredFile {
  readonly id: string;
  readonly width: number;
  readonly height: number;
}
