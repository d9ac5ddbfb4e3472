import type { Cylinder, ValveTiming } from './calculations.js';
import type { Quantity } from './quantity.js';
import type { Judgement } from './verdict.js';

export const valveTypes = ['inlet', 'exhaust'] as const;
export type ValveType = (typeof valveTypes)[number];

export interface ListedValve {
  /** Its name, such as its number from the front. */
  readonly valve: string;
  readonly cylinder: Cylinder;
  readonly type: ValveType;
}

export interface LashOrderRequest {
  readonly firingOrder: readonly Cylinder[];
  readonly intervals?: readonly number[];
  readonly valveTiming: ValveTiming;
  /** Front to back. */
  readonly valves: readonly ListedValve[];
  /** Crank degrees either side of the base circle that clear the ramps (15). */
  readonly margin?: number;
}

export interface LashOrder {
  /** `whenFullyOpen` is null where no cylinder fires a turn apart. */
  readonly mates: readonly { readonly set: string; readonly whenFullyOpen: string | null }[];
  /** Crank degrees from the compression TDC of the first cylinder of the order, in the order they are turned to. */
  readonly stops: readonly { readonly crank: number; readonly set: readonly string[] }[];
}

/** What opening and closing were judged by: a lift at the valve or a lash on the base circle. */
export type QuotedAt = { readonly lift: Quantity } | { readonly lash: Quantity };

export interface TimingFiguresRequest {
  readonly timing: ValveTiming;
  readonly quotedAt: QuotedAt;
  /** The spec's figures to hold these against. */
  readonly spec?: { readonly timing: ValveTiming; readonly quotedAt: QuotedAt };
  /** Crank degrees that each event may differ from the spec (2). */
  readonly tolerance?: number;
  /** The lobes are symmetrical, so that the middle of the duration is the lobe centre (true). */
  readonly symmetrical?: boolean;
}

export interface TimingFigures extends Judgement {
  readonly duration: { readonly inlet: number; readonly exhaust: number };
  readonly overlap: number;
  /** Middles of the durations, crank degrees from TDC: inlet after, exhaust before. */
  readonly lobeCentre: { readonly inlet: number; readonly exhaust: number };
  /** Cam degrees. */
  readonly lobeSeparation: number;
  /** Crank degrees that the camshaft stands advanced (positive) of straight up. */
  readonly advance: number;
  /** Measured less spec, crank degrees, positive is late; only where both are quoted alike. */
  readonly late?: { readonly ivo: number; readonly ivc: number; readonly evo: number; readonly evc: number };
  readonly assumed: readonly string[];
}

export interface PositiveStopRequest {
  /** Degree wheel at the stop, turned the normal way and turned back: 0 to 360, counted the normal way. */
  readonly forward: number;
  readonly back: number;
}

export interface PositiveStop {
  /** What the wheel shows at true TDC, 0 to 360. */
  readonly tdc: number;
  /** Signed degrees that the pointer or wheel must be moved so that it shows 0 there, in (−180, 180]. */
  readonly correction: number;
  /** Crank degrees from the stop to TDC, either side. */
  readonly half: number;
}

export interface ShimRequest {
  readonly fitted: Quantity;
  readonly measured: Quantity;
  readonly wanted: { readonly low: Quantity; readonly high: Quantity };
  /** Thicknesses at hand. */
  readonly sizes?: readonly Quantity[];
}

export interface Shim extends Judgement {
  /** For the middle of what is wanted. */
  readonly shim: Quantity;
  /** Of the sizes at hand, the one that comes nearest, and the lash it leaves. */
  readonly choice?: { readonly shim: Quantity; readonly lash: Quantity };
}

export interface LifterPreloadRequest {
  /** Turns of the adjuster past zero lash. */
  readonly turns: number;
  readonly pitch: Quantity;
  /** Lift at the valve over lift at the follower, where the adjuster is at the rocker's pivot; 1 where it is at the push rod. */
  readonly adjuster?: 'push-rod' | 'pivot';
  readonly rockerRatio?: number;
  readonly limits?: { readonly low: Quantity; readonly high: Quantity };
}

export interface LifterPreload extends Judgement {
  readonly preload: Quantity;
  readonly assumed: readonly string[];
}

/** One of `crank` and `fromTop`. */
export interface PistonHeightRequest {
  readonly stroke: Quantity;
  readonly rodLength: Quantity;
  /** Crank degrees after TDC. */
  readonly crank?: number;
  readonly fromTop?: Quantity;
  /** Crank revolutions a minute. */
  readonly crankSpeed?: number;
}

export interface PistonHeight {
  /** Crank degrees from TDC, either side. */
  readonly crank: number;
  readonly fromTop: Quantity;
  /** Gudgeon pin's centre from the crank's centre. */
  readonly pinHeight: Quantity;
  /** Metres a second; only with a crank speed. */
  readonly meanSpeed?: number;
  readonly greatestSpeed?: number;
  /** Crank degrees after TDC where the piston is fastest. */
  readonly greatestSpeedAt: number;
}
