import type { Quantity } from './quantity.js';
import type { Judgement } from './verdict.js';

/**
 * Signed gaps from a straight edge laid along the driver to each rim, positive where the rim lies back from it.
 * Near is the rim towards the other pulley.
 */
export interface BeltGaps {
  readonly driverNear: Quantity;
  readonly driverFar: Quantity;
  readonly drivenNear: Quantity;
  readonly drivenFar: Quantity;
}

export interface BeltLimit {
  /** Degrees (0.5). */
  readonly angle?: number;
  /** Share of the span (0.0087). */
  readonly offsetPerSpan?: number;
}

export interface BeltAlignmentRequest {
  /** Between shaft centres. */
  readonly span: Quantity;
  readonly gaps: BeltGaps;
  readonly driverDiameter: Quantity;
  readonly drivenDiameter: Quantity;
  /** From each pulley's rim face back to the middle of its groove. */
  readonly faceToGroove?: { readonly driver: Quantity; readonly driven: Quantity };
  readonly limit?: BeltLimit;
}

export interface BeltAlignment extends Judgement {
  /** How far the driven pulley's middle lies back of the driver's plane carried to it. */
  readonly offset: Quantity;
  /** Signed degrees. */
  readonly angle: number;
}

export interface DrivenPulley {
  readonly name: string;
  readonly diameter: Quantity;
  readonly span: Quantity;
  readonly gaps: BeltGaps;
  /** The same gaps with both pulleys turned a quarter: tells run-out of a pulley from the tilt of its shaft. */
  readonly quarterTurn?: BeltGaps;
  readonly faceToGroove?: Quantity;
  /** Thickness of one shim, where the pulley or its bracket is shimmed. */
  readonly shim?: Quantity;
  /** Free room behind the pulley, and in front of it. */
  readonly roomBehind?: Quantity;
  readonly roomInFront?: Quantity;
}

export interface BeltLineRequest {
  readonly driver: { readonly name: string; readonly diameter: Quantity; readonly faceToGroove?: Quantity };
  /** One or two. */
  readonly driven: readonly DrivenPulley[];
  readonly limit?: BeltLimit;
}

export interface PulleyLine extends BeltAlignment {
  readonly name: string;
  /** Offset over span. */
  readonly offsetPerSpan: number;
  /** The angle that turns with the pulley: half the difference of the two sets; null without a second set. */
  readonly runOut: number | null;
  /** The angle of the shaft itself: the mean of the two sets. */
  readonly tilt: number;
  readonly cure: {
    /** Positive: forward, towards the straight edge. */
    readonly move: Quantity;
    readonly shims?: number;
    readonly words: string;
  };
  /** Whether the move is free of what stands behind or in front; null where no room was given. */
  readonly clears: boolean | null;
}

export interface BeltLine extends Judgement {
  readonly pulleys: readonly PulleyLine[];
  readonly assumed: readonly string[];
}

export interface BeltLengthRequest {
  readonly driverDiameter: Quantity;
  readonly drivenDiameter: Quantity;
  readonly centres: Quantity;
}

export interface BeltLength {
  readonly length: Quantity;
  /** Driven speed over driver speed. */
  readonly ratio: number;
  /** Degrees of each pulley that the belt lies on. */
  readonly wrap: { readonly driver: number; readonly driven: number };
}

export interface BeltTensionRequest extends BeltLengthRequest {
  /** Deflection for each unit of free span, as the maker states it (1/64). */
  readonly deflectionPerSpan?: number;
  /** Measured at mid-span under the maker's force. */
  readonly measured?: Quantity;
  /** Allowed share of the wanted deflection either way (0.1). */
  readonly tolerance?: number;
  /** The maker's own figures of the deflection, instead of a share of the span. */
  readonly limits?: { readonly low: Quantity; readonly high: Quantity };
}

export interface BeltTension extends Judgement {
  readonly freeSpan: Quantity;
  readonly deflection: Quantity;
  readonly assumed: readonly string[];
}
