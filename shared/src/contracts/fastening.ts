import type { Quantity } from './quantity.js';
import type { Judgement, Verdict } from './verdict.js';

export type ThreadCondition = 'dry' | 'oiled' | 'moly' | { readonly nutFactor: number };
/** What may be screwed into. */
export const tappedMaterials = ['steel', 'cast-iron', 'aluminium', 'brass'] as const;
export type TappedMaterial = (typeof tappedMaterials)[number];
/** What the fastener does: only a clamping bolt, stud or nut can be judged by its clamp load. */
export const fastenerUses = ['clamp', 'plug', 'union', 'gasket-cover', 'to-yield', 'by-angle'] as const;
export type FastenerUse = (typeof fastenerUses)[number];

export interface TorqueDoubtRequest {
  readonly torque: Quantity;
  /** The other figure that the same page prints. */
  readonly alsoPrinted?: Quantity;
  /** `M10x1.5`, `3/8-16 UNC`, `3/8-24 UNF`, `3/8 BSF`, `3/8 BSW`. */
  readonly thread: string;
  readonly grade: string;
  readonly condition: ThreadCondition;
  /** Share that the nut factor may be off, either way (0.3). */
  readonly nutFactorSpread?: number;
  readonly use?: FastenerUse;
  /** The condition that the torque is printed for, where it is used in another. */
  readonly printedFor?: ThreadCondition;
  /** What the fastener is screwed into, where it is no nut: the female thread may govern. */
  readonly tapped?: { readonly material: TappedMaterial; readonly engagement?: Quantity };
}

export interface TorqueDoubt extends Judgement {
  /** Newtons; null where the fastener cannot be judged by its clamp load. */
  readonly preload: Quantity | null;
  readonly preloadRange: { readonly low: Quantity; readonly high: Quantity } | null;
  readonly stressArea: Quantity;
  /** 0.75 is 75 %; null where the grade is not known. */
  readonly shareOfProof: number | null;
  readonly readAs?: 'N·m' | 'lbf·ft' | 'lbf·in' | 'kgf·m';
  /** The clamp load in the condition used, over that in the condition printed for. */
  readonly clampChange?: number;
  /** Of the female thread. */
  readonly tapped?: Judgement;
}

export interface ThreadFiguresRequest {
  readonly thread: string;
}

export interface ThreadFigures {
  readonly name: string;
  readonly series: 'metric-coarse' | 'metric-fine' | 'UNC' | 'UNF' | 'BSW' | 'BSF';
  readonly diameter: Quantity;
  readonly pitch: Quantity;
  readonly pitchDiameter: Quantity;
  /** Of the bolt, at the root of its thread. */
  readonly minorDiameter: Quantity;
  readonly stressArea: Quantity;
  /** Threads an inch, of inch threads. */
  readonly perInch?: number;
}

export interface WrenchSuitsRequest {
  readonly torque: Quantity;
  /** Absolute, below and above the torque. */
  readonly tolerance?: { readonly low: Quantity; readonly high: Quantity };
  readonly wrench: {
    readonly kind: 'click' | 'dial' | 'digital';
    readonly range: { readonly low: Quantity; readonly high: Quantity };
    readonly resolution?: Quantity;
    /** Permissible deviation as a share, 0.04 is ±4 %; by default that of the kind and size in ISO 6789-1. */
    readonly deviation?: number;
    /** Dates, counted to their end, UTC. */
    readonly calibrationDue?: string;
  };
  /** The day it is used, as a date. Needed with `calibrationDue`. */
  readonly on?: string;
}

export interface WrenchSuits extends Judgement {
  /** What the wrench may deliver at this torque. */
  readonly delivers: { readonly low: Quantity; readonly high: Quantity };
  readonly deviation: number;
  /** Whole tolerance over whole uncertainty; null without a tolerance. */
  readonly ratio: number | null;
  readonly checks: readonly {
    readonly of: 'range' | 'deviation' | 'resolution' | 'calibration';
    readonly verdict: Verdict;
    readonly reason: string;
  }[];
  readonly assumed: readonly string[];
}

export interface TorqueReadingRequest {
  readonly torque: Quantity;
  readonly tolerance?: { readonly low: Quantity; readonly high: Quantity };
  readonly wrench: { readonly kind: 'click' | 'dial' | 'digital'; readonly deviation: number };
  /** What a click wrench was set to. */
  readonly setting?: Quantity;
  /** What a dial or digital wrench showed. */
  readonly reading?: Quantity;
}

export interface TorqueReading extends Judgement {
  /** What of it was judged, and by which rule: printed with the verdict. */
  readonly rule: string;
}

export interface ThreadStackRequest {
  readonly thread: string;
  /** Under the head to the end of the thread. */
  readonly boltLength: Quantity;
  /** What is clamped, without washers. */
  readonly grip: Quantity;
  /** All washers together. */
  readonly washers?: Quantity;
  readonly into:
    | {
        /** By default the greatest height of an ISO 4032 nut; needed for inch threads. */
        readonly nutHeight?: Quantity;
        /** Least pitches that must show past the nut (1). */
        readonly leastPitches?: number;
      }
    | {
        readonly material: TappedMaterial;
        /** Full thread in the hole, from its mouth. */
        readonly threadDepth: Quantity;
        /** To the bottom of the drilled hole; left out for a through hole. */
        readonly holeDepth?: Quantity;
      };
}

export interface ThreadStack extends Judgement {
  readonly engagement: Quantity;
  /** Engagement over nominal diameter. */
  readonly engagementInDiameters: number;
  /** Past the nut: length and pitches; negative where it does not come through. */
  readonly protrusion?: { readonly length: Quantity; readonly pitches: number };
  /** From the end of the bolt to the end of the full thread of a blind hole; negative where it jams. */
  readonly spare?: Quantity;
  /** As given, or as taken from the table. */
  readonly nutHeight?: Quantity;
  readonly lengthNeeded: Quantity;
  readonly assumed: readonly string[];
}
