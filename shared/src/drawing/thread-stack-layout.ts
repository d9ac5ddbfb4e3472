import type { ThreadStack, ThreadStackRequest } from '../contracts/fastening.js';
import type { Quantity } from '../contracts/quantity.js';
import { readThread } from '../fastening/read-thread.js';
import { toSi } from '../quantities/convert.js';
import { round } from './geometry.js';

/** Half the bolt's diameter on the drawing; all lengths go by the same scale as far as they fit. */
export const halfBolt = 22;
/** The underside of the bolt's head. */
export const seat = 62;
const mostGrip = 116;
const mostWashers = 40;
const mostBelow = 176;
const least = 3;

export interface StackLayout {
  /** Heights, drawing units, y downwards. */
  readonly gripTop: number;
  readonly face: number;
  readonly boltEnd: number;
  readonly nutBottom: number | undefined;
  readonly threadEnd: number | undefined;
  readonly holeEnd: number | undefined;
  readonly bottom: number;
  /** The joint is drawn shorter than it is, with a break. */
  readonly isShortened: boolean;
  /** Something else did not fit its scale. */
  readonly isToScale: boolean;
}

export interface StackDrawingInput {
  readonly request: ThreadStackRequest;
  readonly answer: ThreadStack;
}

/** Where everything stands on the drawing. */
export function layOutStack({ request, answer }: StackDrawingInput): StackLayout {
  const scale = (2 * halfBolt) / readThread(request.thread).diameter;
  const drawn = (length: Quantity | undefined): number => (length === undefined ? 0 : toSi(length) * scale);
  const { into } = request;
  const washers = drawn(request.washers);
  const grip = drawn(request.grip);
  const reach = drawn(request.boltLength) - grip - washers;
  const tapped = 'material' in into ? into : undefined;
  const nut = drawn(answer.nutHeight);
  const thread = drawn(tapped?.threadDepth);
  const hole = drawn(tapped?.holeDepth);

  const deepest = Math.max(nut, thread, hole, reach, least);
  const below = Math.min(1, mostBelow / deepest);
  const gripTop = seat + fitted(washers, mostWashers);
  const face = gripTop + Math.max(least, Math.min(grip, mostGrip));
  const at = (depth: number): number => round(face + depth * below);
  const boltEnd = reach >= 0 ? at(reach) : round(Math.max(seat + 8, face + reach));
  return {
    gripTop: round(gripTop),
    face: round(face),
    boltEnd,
    nutBottom: tapped === undefined ? at(nut) : undefined,
    threadEnd: tapped === undefined ? undefined : at(thread),
    holeEnd: tapped?.holeDepth === undefined ? undefined : at(hole),
    bottom: round(face + deepest * below),
    isShortened: grip > mostGrip,
    isToScale: below === 1 && washers <= mostWashers && (reach >= 0 || face + reach >= seat + 8),
  };
}

const fitted = (height: number, most: number): number =>
  height === 0 ? 0 : Math.max(least, Math.min(height, most));
