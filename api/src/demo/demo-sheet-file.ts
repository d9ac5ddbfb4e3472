import type { Sighting, TdcAnswer } from '@second-spanner/shared/contracts/calculations';
import type { Quantity, Unit } from '@second-spanner/shared/contracts/quantity';
import type { Settlement, SheetState } from '@second-spanner/shared/contracts/sheets';

/** Figures by the place where they were read. */
export type Values = Readonly<Record<string, number>>;

export interface Pull {
  readonly pass: number;
  readonly fastener: string;
}

export interface DemoSettlement {
  /** Key of a person. */
  readonly by: string;
  readonly how: Settlement;
  readonly reason: string;
}

/** What went otherwise than usual on a step. */
export type DemoEvent = { readonly step: string } & (
  | { readonly what: 'note'; readonly note: string }
  | { readonly what: 'uncritical'; readonly by: string; readonly reason: string }
  | { readonly what: 'wired-wrong'; readonly exchanged: readonly [number, number]; readonly reason: string }
  | { readonly what: 'left-open'; readonly first: Values; readonly unit: Unit }
  | {
      readonly what: 'raised';
      readonly by: string;
      readonly words: string;
      readonly settled?: DemoSettlement;
    }
  | {
      readonly what: 'disagreement';
      readonly by: string;
      readonly first: Values;
      readonly second: Values;
      readonly unit: Unit;
      readonly settled: DemoSettlement;
      readonly again: Values;
    }
  | {
      readonly what: 'correction';
      readonly at?: string;
      readonly pull?: Pull;
      readonly first: Quantity;
      readonly then: Quantity;
      readonly reason: string;
    }
);

export interface DemoReadings {
  readonly step: string;
  readonly unit: Unit;
  readonly values?: Values;
  readonly pulls?: readonly (Pull & { readonly value: number })[];
}

/** A sheet of the demo: how far it is, and what went otherwise than usual. */
export interface DemoSheet {
  readonly code: string;
  readonly car: string;
  readonly spec: string;
  readonly edition: number;
  readonly builder: string;
  readonly countersigner: string;
  readonly state: SheetState;
  readonly begunDaysAgo: number;
  readonly lastWorkedDaysAgo: number;
  readonly upTo: { readonly step: string; readonly pull?: Pull } | null;
  readonly notDone?: readonly string[];
  readonly notCountersigned?: readonly string[];
  readonly readings: readonly DemoReadings[];
  readonly events: readonly DemoEvent[];
}

/** Tools of the first and of the second person. */
type Pair = readonly string[];

export interface DemoWork {
  readonly readWith: Readonly<Record<string, Pair>>;
  readonly pullWith: { readonly withTolerance: Pair; readonly withoutTolerance: Pair };
  readonly sheets: readonly DemoSheet[];
}

/** What is seen at each TDC. */
export type DemoSightings = Readonly<
  Record<
    Extract<TdcAnswer, 'compression-tdc' | 'exhaust-tdc'>,
    { readonly about: number; readonly sightings: readonly (readonly Sighting[])[] }
  >
>;
