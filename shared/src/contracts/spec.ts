import type { CapMapRequest, FastenerLayout, TighteningPass, ValveTiming } from './calculations.js';
import type { Quantity } from './quantity.js';

/** Where a value comes from. */
export type Source =
  | {
      readonly kind: 'document';
      readonly document: string;
      readonly edition?: string;
      readonly page?: string;
    }
  | { readonly kind: 'measured'; readonly by?: string }
  | { readonly kind: 'data-sheet'; readonly document: string }
  | { readonly kind: 'common-practice' };

/** One value of a spec. A value without a source is allowed and marked plainly everywhere. */
export interface Sourced<T> {
  readonly value: T;
  readonly source?: Source;
  readonly note?: string;
}

/** Limits belong to the good side; one of the two may be missing. */
export interface Limits {
  readonly low?: Quantity;
  readonly high?: Quantity;
}

export const engineLayouts = ['in-line', 'vee', 'flat'] as const;
export type EngineLayout = (typeof engineLayouts)[number];

export interface EngineSection {
  readonly name: Sourced<string>;
  readonly layout: Sourced<EngineLayout>;
  readonly cylinders: Sourced<number>;
  /** Cylinder numbers by bank, each from the front; one bank for an in-line engine. */
  readonly banks: Sourced<readonly (readonly number[])[]>;
  readonly numberedFrom: Sourced<string>;
  readonly crankTurns: Sourced<'clockwise' | 'anticlockwise'>;
  readonly crankSeenFrom: Sourced<'front' | 'flywheel'>;
  readonly firingOrder: Sourced<readonly number[]>;
  readonly bore: Sourced<Quantity>;
  readonly stroke: Sourced<Quantity>;
  readonly rodLength: Sourced<Quantity>;
  readonly compressionRatio: Sourced<number>;
  readonly undersizes: Sourced<readonly Quantity[]>;
  readonly oversizes: Sourced<readonly Quantity[]>;
  readonly followers: Sourced<'flat' | 'mushroom' | 'hydraulic'>;
}

export interface IgnitionSection {
  readonly rotation: Sourced<'clockwise' | 'anticlockwise'>;
  readonly rotationSeenFrom: Sourced<'cap' | 'drive'>;
  readonly posts: Sourced<NonNullable<CapMapRequest['posts']>>;
  readonly firstPost: Sourced<string>;
  /** Which outlet each post is joined to inside the cap. */
  readonly trace?: Sourced<Readonly<Record<string, string>>>;
  readonly outletsAt: Sourced<'top' | 'side'>;
  /** Crank degrees before TDC. */
  readonly staticTiming: Sourced<number>;
  readonly pointsGap: Sourced<Limits>;
  readonly plugGap: Sourced<Limits>;
  readonly leadResistance: Sourced<Limits>;
  readonly leadKind: Sourced<'wire-core' | 'resistive'>;
  readonly coilPolarity: Sourced<'positive-earth' | 'negative-earth'>;
}

export interface ValveTrainSection {
  readonly timing: Sourced<ValveTiming>;
  readonly timingQuotedAt: Sourced<{ readonly lift?: Quantity; readonly lash?: Quantity }>;
  readonly lash: Sourced<{
    readonly inlet: Quantity;
    readonly exhaust: Quantity;
    readonly engine: 'cold' | 'hot';
  }>;
  /** Front to back: which valve is which. */
  readonly valveLayout: Sourced<readonly ('inlet' | 'exhaust')[]>;
  /** What the timing marks mean when they stand together. */
  readonly marksTogether: Sourced<'compression' | 'exhaust'>;
}

export const fastenerPlaces = [
  'main-caps',
  'big-ends',
  'cam-thrust',
  'cam-sprocket',
  'oil-pump',
  'rear-seal',
  'front-cover',
  'crank-pulley',
  'sump',
  'drain-plug',
  'head',
  'valley-cover',
  'rocker-gear',
  'rocker-cover',
  'inlet-manifold',
  'exhaust-manifold',
  'water-pump',
  'thermostat-housing',
  'fan-pulley',
  'fuel-pump',
  'distributor-clamp',
  'spark-plugs',
  'flywheel',
  'dynamo-bracket',
  'core-plugs',
] as const;
export type FastenerPlace = (typeof fastenerPlaces)[number];

/** A set of fasteners that is tightened together. */
export interface FastenerGroup {
  readonly key: string;
  readonly place: FastenerPlace;
  /** What a builder calls it, lower case, plural: `head nuts`. Trade-word tokens allowed. */
  readonly name: string;
  /** `nut`, `bolt`, `stud nut`, `plug`: one fastener, for the page's sentences. */
  readonly noun: string;
  readonly layout: FastenerLayout;
  /** What is drawn round the positions. */
  readonly outline: 'head' | 'plain' | 'circle';
  /** Repeats of the group with its own fasteners, such as one a main cap or a bank: `Bank 1`, `Cap 1`. */
  readonly repeats?: readonly string[];
  readonly thread: Sourced<string>;
  readonly grade: Sourced<string>;
  readonly condition: Sourced<'dry' | 'oiled' | 'moly' | 'sealant' | 'thread-lock'>;
  readonly torque: Sourced<Quantity>;
  /** The other figure that the same page prints. */
  readonly alsoPrinted?: Sourced<Quantity>;
  /** How far below and above the torque a reading may be. */
  readonly tolerance?: Sourced<{ readonly low: Quantity; readonly high: Quantity }>;
  readonly passes: Sourced<readonly TighteningPass[]>;
  readonly sequence?: Sourced<readonly string[]>;
  readonly singleUse?: Sourced<boolean>;
  readonly locking?: Sourced<string>;
}

/** How a clearance or size is read, so that the second person's check can be named. */
export const readingMethods = [
  'micrometer',
  'bore-gauge',
  'feeler',
  'dial-gauge',
  'plastic-gauge',
  'depth-gauge',
  'spring-balance',
  'straight-edge',
  'burette',
  'other',
] as const;
export type ReadingMethod = (typeof readingMethods)[number];

export const measurementPlaces = [
  'bores',
  'tunnels',
  'journals',
  'cam',
  'mains',
  'end-float',
  'rings',
  'pistons',
  'big-ends',
  'deck',
  'timing',
  'oil-pump',
  'pulley',
  'valves',
  'head-face',
  'rockers',
  'belt',
  'distributor',
  'ignition',
  'running-torque',
  'pressures',
] as const;
export type MeasurementPlace = (typeof measurementPlaces)[number];

export interface MeasurementSpec {
  readonly key: string;
  readonly place: MeasurementPlace;
  readonly name: string;
  readonly method: ReadingMethod;
  readonly limits: Sourced<Limits>;
  /** Where it is read: one reading a place. `Main 1`, `Cylinder 2, top`. */
  readonly at: readonly string[];
  /** A clearance that is critical; sizes on the way to one are not. */
  readonly critical: boolean;
}

export interface KeySpec {
  readonly key: string;
  readonly name: string;
  readonly keyWidth: Sourced<Limits>;
  readonly keyHeight: Sourced<Limits>;
  readonly shaftKeywayWidth: Sourced<Limits>;
  readonly shaftKeywayDepth: Sourced<Limits>;
  readonly hubKeywayWidth: Sourced<Limits>;
  readonly hubKeywayDepth: Sourced<Limits>;
  readonly shaftDiameter: Sourced<Limits>;
  readonly hubBore: Sourced<Limits>;
}

export interface BeltSpec {
  readonly span: Sourced<Quantity>;
  readonly driverDiameter: Sourced<Quantity>;
  readonly drivenDiameter: Sourced<Quantity>;
  readonly deflection: Sourced<Limits>;
  readonly offset: Sourced<Limits>;
}

export interface CompoundSpec {
  readonly key: string;
  readonly name: string;
  readonly use: string;
  /** The data sheet's figures: times at a temperature. */
  readonly curePoints: Sourced<
    readonly {
      readonly temperature: Quantity;
      readonly gap?: Quantity;
      readonly toHandle?: Quantity;
      readonly toLoad: Quantity;
      readonly full: Quantity;
    }[]
  >;
  readonly openTime: Sourced<Quantity>;
}

export interface PartSpec {
  readonly name: string;
  readonly maker: Sourced<string>;
  readonly note?: string;
}

/** One edition of an engine spec, whole, as it is hashed and kept. */
export interface SpecDocument {
  readonly format: 1;
  readonly code: string;
  readonly title: string;
  readonly engine: EngineSection;
  readonly ignition: IgnitionSection;
  readonly valveTrain: ValveTrainSection;
  readonly fastenerGroups: readonly FastenerGroup[];
  readonly measurements: readonly MeasurementSpec[];
  readonly keys: readonly KeySpec[];
  readonly belt: BeltSpec;
  readonly compounds: readonly CompoundSpec[];
  readonly consumables: readonly Sourced<string>[];
  readonly parts: readonly PartSpec[];
  /** What this engine asks care for, beside the usual cautions of each stage. */
  readonly cautions: readonly { readonly stage: number; readonly text: Sourced<string> }[];
}

export const editionStates = ['draft', 'approved', 'superseded'] as const;
export type EditionState = (typeof editionStates)[number];

export interface EditionSummary {
  readonly id: string;
  readonly edition: number;
  readonly state: EditionState;
  readonly valueCount: number;
  readonly approvedBy: string | null;
  readonly approvedAt: string | null;
  readonly restsOn: string;
  readonly hash: string;
}

export interface SpecSummary {
  readonly id: string;
  readonly code: string;
  readonly title: string;
  readonly editions: readonly EditionSummary[];
}

export interface SpecEdition extends EditionSummary {
  readonly specId: string;
  readonly code: string;
  readonly title: string;
  readonly document: SpecDocument;
}
