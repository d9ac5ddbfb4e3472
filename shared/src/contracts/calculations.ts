import type { Quantity } from './quantity.js';
import type { Judgement, Verdict } from './verdict.js';

/** Cylinders are numbered 1…n, or all are text labels. */
export type Cylinder = number | string;
export type Rotation = 'clockwise' | 'anticlockwise';
export type Side = 'cap' | 'drive';

export interface ConvertRequest {
  readonly quantity: Quantity;
  readonly to: string;
}
export interface ConvertAnswer {
  readonly quantity: Quantity;
}

export interface CapPost {
  readonly post: string;
  /** Degrees clockwise from the cap's reference mark, looking at the outside of the cap. */
  readonly angle: number;
}

export interface CapMapRequest {
  readonly firingOrder: readonly Cylinder[];
  readonly rotation: Rotation;
  readonly rotationSeenFrom?: Side;
  readonly posts?: readonly CapPost[];
  readonly firstPost?: string;
  /** Crank degrees from each cylinder of the order to the next; the last one leads back to the first. */
  readonly intervals?: readonly number[];
  readonly strokesPerCycle?: 2 | 4;
  /** Which outlet each post is joined to inside the cap. */
  readonly trace?: Readonly<Record<string, string>>;
}

export interface CapMapRow {
  readonly step: number;
  readonly post: string;
  readonly angle: number;
  readonly cylinder: Cylinder;
  /** Crank degrees after the first cylinder of the order. */
  readonly firesAt: number;
  readonly outlet: string;
}

export interface CapLead {
  readonly cylinder: Cylinder;
  readonly post: string;
  readonly outlet: string;
}

export interface CapMap extends Judgement {
  readonly rows: readonly CapMapRow[];
  readonly leads: readonly CapLead[];
  readonly companions: readonly (readonly [Cylinder, Cylinder])[];
  readonly crankInterval: number | null;
  readonly distributorInterval: number | null;
}

/** Degrees of crank at the valve's quoted lift or lash; any may be negative. */
export interface ValveTiming {
  /** Inlet opens, before TDC. */
  readonly ivo: number;
  /** Inlet closes, after BDC. */
  readonly ivc: number;
  /** Exhaust opens, before BDC. */
  readonly evo: number;
  /** Exhaust closes, after TDC. */
  readonly evc: number;
}

export const strokes = ['power', 'exhaust', 'inlet', 'compression'] as const;
export type Stroke = (typeof strokes)[number];

export const wiringCauses = [
  'right',
  'whole-set-moved',
  'outlets-read-as-posts',
  'wired-against-the-rotor',
  'two-leads-swapped',
  'other-firing-order',
  'mixed',
] as const;
export type WiringCause = (typeof wiringCauses)[number];

export interface CapDiagnosisRequest {
  readonly cap: CapMapRequest;
  readonly fitted: Readonly<Record<string, Cylinder>>;
  readonly fittedBy?: 'post' | 'outlet';
  readonly valveTiming?: ValveTiming;
  /** Ignition advance at the spark, crank degrees. */
  readonly advance?: number;
}

export interface CylinderSpark {
  readonly cylinder: Cylinder;
  /** The post whose spark this cylinder gets as fitted. */
  readonly post: string;
  /** Crank degrees in (−360, 360]; positive is late. */
  readonly late: number;
  readonly stroke: Stroke;
  /** Null where no valve timing was given. */
  readonly inletOpen: boolean | null;
  readonly exhaustOpen: boolean | null;
}

export interface LeadSwap {
  readonly between: readonly [string, string];
  readonly outlets: readonly [string, string];
}

export interface CapDiagnosis extends Judgement {
  readonly cause: WiringCause;
  readonly alsoFits: readonly WiringCause[];
  readonly movedBy?: number;
  readonly asFitted: readonly Cylinder[];
  readonly cylinders: readonly CylinderSpark[];
  readonly swaps: readonly LeadSwap[];
  readonly cautions: readonly string[];
}

export interface ValveClockRequest {
  readonly firingOrder: readonly Cylinder[];
  readonly intervals?: readonly number[];
  readonly valveTiming: ValveTiming;
  /** Crank degrees; 0 is the compression TDC of the first cylinder of the order. */
  readonly crank: number;
  readonly stroke?: Quantity;
  readonly rodLength?: Quantity;
}

export const valveStates = ['shut', 'opening', 'full', 'closing'] as const;
export type ValveState = (typeof valveStates)[number];

export interface CylinderClock {
  readonly cylinder: Cylinder;
  /** 0–720, 0 is this cylinder's compression TDC. */
  readonly phase: number;
  readonly stroke: Stroke;
  readonly inlet: ValveState;
  readonly exhaust: ValveState;
  readonly pistonFromTop?: Quantity;
}

export interface ValveClock {
  readonly cylinders: readonly CylinderClock[];
  readonly duration: { readonly inlet: number; readonly exhaust: number };
  readonly overlap: number;
  readonly lobeCentre: { readonly inlet: number; readonly exhaust: number };
  readonly lobeSeparation: number;
}

export interface Sighting {
  readonly cylinder: Cylinder;
  readonly inlet?: ValveState;
  readonly exhaust?: ValveState;
  readonly piston?: 'top' | 'bottom';
  readonly rocking?: true;
  readonly pressure?: true;
}

export interface WhichTdcRequest {
  readonly firingOrder: readonly Cylinder[];
  readonly intervals?: readonly number[];
  readonly valveTiming: ValveTiming;
  readonly cylinder: Cylinder;
  /** One list a crank position, in the order the crank was turned the normal way. */
  readonly sightings: readonly (readonly Sighting[])[];
  /** Which position is asked about, from 0; by default the last. */
  readonly about?: number;
  /** The timing marks stand together, and which TDC of `cylinder` they then mean. */
  readonly marksTogether?: 'compression' | 'exhaust';
  /** Crank degrees on each thing seen. */
  readonly tolerance?: number;
}

export type TdcAnswer = 'compression-tdc' | 'exhaust-tdc' | 'cannot-tell' | 'contradiction';

export interface WhichTdc {
  readonly answer: TdcAnswer;
  readonly reason: string;
  readonly next?: string;
  readonly windows: readonly (readonly [number, number])[];
}

export interface FastenerPosition {
  readonly fastener: string;
  readonly x: number;
  readonly y: number;
}

export type FastenerLayout =
  | { readonly pattern: 'grid'; readonly rows: number; readonly columns: number }
  | { readonly pattern: 'circle'; readonly count: number }
  | { readonly pattern: 'line'; readonly count: number }
  | { readonly positions: readonly FastenerPosition[] };

export type TighteningPass =
  | { readonly fraction: number }
  | { readonly torque: Quantity }
  | { readonly angle: number }
  | { readonly check: true };

export interface TighteningPlanRequest {
  readonly fasteners: FastenerLayout;
  readonly sequence?: readonly string[];
  readonly final?: Quantity;
  readonly finals?: Readonly<Record<string, Quantity>>;
  /** Absolute limits round the final torque: how far below and above it. */
  readonly tolerance?: { readonly low: Quantity; readonly high: Quantity };
  readonly passes: readonly TighteningPass[];
  readonly unit?: string;
}

export interface TighteningStep {
  readonly pass: number;
  readonly order: number;
  readonly fastener: string;
  readonly target?: Quantity;
  readonly angle?: number;
  readonly low?: Quantity;
  readonly high?: Quantity;
}

export interface TighteningPlan extends Judgement {
  readonly basis: 'maker' | 'general-practice';
  readonly sequence: readonly string[];
  readonly loosening: readonly string[];
  readonly steps: readonly TighteningStep[];
}

export interface WrenchSettingRequest {
  readonly torque: Quantity;
  readonly wrenchLength: Quantity;
  readonly adapterLength: Quantity;
  /** Degrees between adapter and wrench axis; 0 is in line, away from the hand. */
  readonly adapterAngle: number;
}
export interface WrenchSetting {
  readonly setting: Quantity;
}

export interface LimitDecisionRequest {
  readonly value: Quantity;
  readonly low?: Quantity;
  readonly high?: Quantity;
  /** Expanded uncertainty (k = 2), half width. */
  readonly uncertainty?: Quantity;
}
export type LimitDecision = Judgement;

export interface ReadingWithUncertainty {
  readonly value: Quantity;
  readonly uncertainty: Quantity;
}
export interface TwoReadingsRequest {
  readonly first: ReadingWithUncertainty;
  readonly second: ReadingWithUncertainty;
}
export interface TwoReadings {
  readonly verdict: Verdict;
  readonly reason: string;
  readonly en: number;
}
