import type {
  CapMapRequest,
  Cylinder,
  Sighting,
  TdcAnswer,
  TighteningPlanRequest,
  ValveTiming,
} from './calculations.js';
import type { Quantity, Unit } from './quantity.js';
import type { FastenerGroup, Limits, ReadingMethod, Source } from './spec.js';

export const stepKinds = ['check', 'measurement', 'tightening', 'wiring', 'valve-timing', 'photo'] as const;
export type StepKind = (typeof stepKinds)[number];

/**
 * How the second person checks a critical step.
 * - measured-again: own tool, blind reading, compared by En
 * - strip-read-again: the same crushed plastic gauge strip, blind
 * - read-again: leads or valves looked at again, blind, and compared as they stand
 * - setting-and-pull-witnessed: the wrench's setting read blind, each pull watched
 * - inspected: seen, with what to look for
 */
export const secondCheckKinds = [
  'measured-again',
  'strip-read-again',
  'read-again',
  'setting-and-pull-witnessed',
  'inspected',
] as const;
export type SecondCheckKind = (typeof secondCheckKinds)[number];

interface StepBase {
  /** Stage and place in it: `8.6`. */
  readonly code: string;
  readonly stage: number;
  readonly title: string;
  /** How it is done, in a builder's words. Trade-word tokens such as `{sump}` allowed in title and instruction. */
  readonly instruction: string;
  /** Codes of the steps that must be done before this one opens. */
  readonly restsOn: readonly string[];
  /** Nothing after a hold point may start until a second person has countersigned it. */
  readonly hold: boolean;
  readonly critical: boolean;
  /** Named on every critical step. */
  readonly secondCheck?: SecondCheckKind;
  /** What an inspecting person looks for. */
  readonly lookFor?: readonly string[];
  readonly source?: Source;
}

export interface CheckStep extends StepBase {
  readonly kind: 'check';
}
export interface MeasurementStep extends StepBase {
  readonly kind: 'measurement';
  readonly method: ReadingMethod;
  readonly limits: Limits;
  /** The unit that the limits are printed in, and the field starts with. */
  readonly unit: Unit;
  /** One reading a place. */
  readonly at: readonly string[];
}
export interface TighteningStepDefinition extends StepBase {
  readonly kind: 'tightening';
  readonly group: Pick<FastenerGroup, 'key' | 'name' | 'noun' | 'outline' | 'thread' | 'condition' | 'grade'>;
  readonly plan: TighteningPlanRequest;
  readonly torque: Quantity;
}
export interface WiringStep extends StepBase {
  readonly kind: 'wiring';
  readonly cap: CapMapRequest;
  readonly outletsAt: 'top' | 'side';
  readonly valveTiming: ValveTiming;
  /** Static timing, crank degrees before TDC. */
  readonly advance: number;
}
export interface ValveTimingStep extends StepBase {
  readonly kind: 'valve-timing';
  readonly firingOrder: readonly Cylinder[];
  readonly valveTiming: ValveTiming;
  readonly cylinder: Cylinder;
  readonly wanted: Extract<TdcAnswer, 'compression-tdc' | 'exhaust-tdc'>;
}
export interface PhotoStep extends StepBase {
  readonly kind: 'photo';
  /** What each photo must show. */
  readonly shows: readonly string[];
}

/** What a step asks for, frozen with the sheet. */
export type StepDefinition =
  CheckStep | MeasurementStep | TighteningStepDefinition | WiringStep | ValveTimingStep | PhotoStep;

export interface Adapter {
  readonly length: Quantity;
  /** Degrees between adapter and wrench axis. */
  readonly angle: number;
}

/** What was recorded, by kind of step. One reading, one pull, one look: never an "all done". */
export type EntryContent =
  | { readonly kind: 'check'; readonly outcome: 'pass' | 'fail'; readonly note?: string }
  | { readonly kind: 'measurement'; readonly at: string; readonly value: Quantity; readonly toolId: string }
  | {
      readonly kind: 'tightening';
      readonly pass: number;
      readonly fastener: string;
      readonly toolId: string;
      /** What a click wrench was set to. */
      readonly setting?: Quantity;
      /** What a dial or digital wrench showed. */
      readonly reading?: Quantity;
      /** Degrees turned, on an angle pass. */
      readonly angle?: number;
      readonly adapter?: Adapter;
    }
  | { readonly kind: 'wiring'; readonly fitted: Readonly<Record<string, Cylinder>> }
  | {
      readonly kind: 'valve-timing';
      readonly sightings: readonly (readonly Sighting[])[];
      readonly about?: number;
    }
  | { readonly kind: 'photo'; readonly shows: string; readonly fileId: string };

/** The second person's own reading, kept before the first is shown. */
export type SecondReadingContent =
  | {
      readonly kind: 'measured-again' | 'strip-read-again';
      readonly toolId: string;
      readonly readings: readonly { readonly at: string; readonly value: Quantity }[];
    }
  | { readonly kind: 'read-again'; readonly fitted: Readonly<Record<string, Cylinder>> }
  | {
      readonly kind: 'read-again';
      readonly sightings: readonly (readonly Sighting[])[];
      readonly about?: number;
    }
  | { readonly kind: 'setting-and-pull-witnessed'; readonly toolId: string; readonly setting: Quantity }
  | {
      readonly kind: 'inspected';
      readonly outcome: 'pass' | 'fail';
      readonly seen: readonly string[];
      readonly note?: string;
    };
