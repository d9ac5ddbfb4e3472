import type { CapMapRequest, Cylinder, Rotation, Side } from './calculations.js';
import type { Quantity } from './quantity.js';
import type { Judgement } from './verdict.js';

/** How far before TDC the spark is set: crank degrees, or the piston's travel. */
export type StaticTiming =
  | { readonly advance: number }
  | { readonly pistonBeforeTdc: Quantity; readonly stroke: Quantity; readonly rodLength: Quantity };

export interface RotorCheckRequest {
  /** `rotation` is the rotor's, or the armature's where `rotationOf` says so. */
  readonly cap: CapMapRequest;
  /** Where the rotor points: degrees clockwise from the cap's mark. */
  readonly rotorAngle: number;
  /** The side that `rotorAngle` was seen from (cap). */
  readonly rotorSeenFrom?: Side;
  readonly timing: StaticTiming;
  /** Where the crank stands (static-mark). */
  readonly crankAt?: 'static-mark' | 'tdc';
  /** The cylinder at its mark (the first of the order). */
  readonly cylinder?: Cylinder;
  /** What the rotation was read from (rotor): a magneto's stamp is its armature's. */
  readonly rotationOf?: 'rotor' | 'armature';
  /** Needed with `armature`: the way the distributor rotor is geared to turn beside it. */
  readonly gearedRotor?: 'same-way' | 'other-way';
  /** Distributor degrees that the rotor may be off (5). */
  readonly tolerance?: number;
}

export interface RotorCheck extends Judgement {
  /** Seen on the cap, after the gearing. */
  readonly rotorTurns: Rotation;
  readonly nearestPost: string;
  readonly nearestCylinder: Cylinder;
  readonly outlet: string;
  readonly wantedPost: string;
  /** Signed distributor degrees from where it should point, in (−180, 180]; positive is past it. */
  readonly error: number;
  /** The same in crank degrees. */
  readonly crankError: number;
  /** The rotor stands at the companion's post: exhaust TDC, or the distributor half a turn out. */
  readonly atCompanion: boolean;
  /** How to tell which of the two it is, where it is half a turn out; also without a companion. */
  readonly howToTell?: string;
  readonly assumed: readonly string[];
}

export interface LeadTestRequest {
  readonly reading: Quantity | 'open' | 'short';
  readonly kind: 'resistive' | 'wire-core';
  readonly length: Quantity;
  /** The maker's figure for a resistive lead: a resistance from `low` to `high` for each `per` of length. */
  readonly nominal?: { readonly low: Quantity; readonly high: Quantity; readonly per: Quantity };
  /** The maker's limits for a whole lead with its fittings, whatever its length. */
  readonly whole?: { readonly low?: Quantity; readonly high: Quantity };
  /** Both end fittings together, added to the length's figure. */
  readonly endFittings?: Quantity;
  readonly uncertainty?: Quantity;
  /** The connection was pierced or clamped again since it was tested. */
  readonly disturbed?: boolean;
}

export interface LeadTest extends Judgement {
  /** What a sound lead of this length may read; null for a resistive lead without a maker's figure. */
  readonly limits: { readonly low: Quantity; readonly high: Quantity } | null;
  readonly cautions: readonly string[];
  readonly assumed: readonly string[];
}

/** One of `angle` and `arc`. */
export interface TimingMarksRequest {
  /** Of the pulley or damper, where the marks are. */
  readonly diameter: Quantity;
  /** Crank degrees. */
  readonly angle?: number;
  readonly arc?: Quantity;
}

export interface TimingMarks {
  readonly angle: number;
  readonly arc: Quantity;
  readonly arcPerDegree: Quantity;
}

export interface DwellRequest {
  readonly cylinders: number;
  /** Distributor degrees that the points stay closed. */
  readonly dwell: number;
  /** Crank revolutions a minute. */
  readonly crankSpeed?: number;
  readonly strokesPerCycle?: 2 | 4;
}

export interface Dwell {
  /** Distributor degrees from one spark to the next. */
  readonly interval: number;
  /** Distributor degrees that the points stay open. */
  readonly openAngle: number;
  /** 0.6 is 60 %. */
  readonly share: number;
  readonly betweenSparks?: Quantity;
  readonly closedFor?: Quantity;
}
