import type { BeltGaps, BeltLineRequest, PulleyLine } from '../contracts/belt-drive.js';
import { toSi } from '../quantities/convert.js';
import { exaggeration } from './exaggeration.js';
import type { Point } from './shapes.js';

/** One pulley as seen from above, drawing units; slope is y gained for x gained. */
export interface PulleyLayout {
  readonly x: number;
  readonly radius: number;
  /** Middle of its rim face. */
  readonly face: number;
  readonly slope: number;
  /** Rim face to groove, and to the pulley's back. */
  readonly groove: number;
  readonly back: number;
}

export interface BeltLineLayout {
  readonly driver: PulleyLayout;
  readonly driven: PulleyLayout;
  /** Across the belt, beside the scale along it; undefined where lengths across are cut short. */
  readonly times: number | undefined;
  /** Whether a pulley was too small along the belt to be seen. */
  readonly isEnlarged: boolean;
  /** The straight edge's face, from which gaps are drawn. */
  readonly edge: number;
  /** Height of the driver's plane at the driven pulley's middle. */
  readonly plane: number;
  readonly lowest: number;
}

const left = 20;
const right = 320;
/** The straight edge's face where no rim stands in front of it. */
const usualEdge = 102;
const room = 34;
const thickness = 34;
const leastRadius = 9;

/** Lays a driver and one driven pulley out: to one scale along the belt, exaggerated across it. */
export function beltLineLayout(request: BeltLineRequest, index: number, line: PulleyLine): BeltLineLayout {
  const pulley = request.driven[index] ?? request.driven[0];
  if (pulley === undefined) throw new RangeError('A belt line has at least one driven pulley.');
  const [d1, d2, span] = [request.driver.diameter, pulley.diameter, pulley.span].map(toSi) as [
    number,
    number,
    number,
  ];
  const scale = (right - left) / (d1 / 2 + span + d2 / 2);
  const gaps = gapsOf(pulley.gaps);
  const grooves =
    pulley.faceToGroove === undefined || request.driver.faceToGroove === undefined
      ? 0
      : toSi(pulley.faceToGroove) - toSi(request.driver.faceToGroove);
  const across = [...gaps, toSi(line.offset), grooves];
  const times = exaggeration(
    across.map((length) => length * scale),
    room,
  );
  // Beyond the room everything across is drawn smaller together, and the drawing says so.
  const perMetre = times === undefined ? room / Math.max(...across.map(Math.abs)) : scale * times;
  const [near1 = 0, far1 = 0, near2 = 0, far2 = 0] = gaps.map((gap) => gap * perMetre);
  const edge = usualEdge - Math.min(0, near1, far1, near2, far2);
  const [r1, r2] = [Math.max(leastRadius, (d1 / 2) * scale), Math.max(leastRadius, (d2 / 2) * scale)];
  const extra = grooves * perMetre;
  const slopes = [(near1 - far1) / (2 * r1), (far2 - near2) / (2 * r2)] as const;
  const driver: PulleyLayout = {
    x: left + (d1 / 2) * scale,
    radius: r1,
    face: edge + (near1 + far1) / 2,
    slope: gentle(slopes[0]),
    groove: thickness / 2 + Math.max(0, -extra),
    back: thickness + Math.max(0, -extra),
  };
  const driven: PulleyLayout = {
    x: right - (d2 / 2) * scale,
    radius: r2,
    face: edge + (near2 + far2) / 2,
    slope: gentle(slopes[1]),
    groove: thickness / 2 + Math.max(0, extra),
    back: thickness + Math.max(0, extra),
  };
  return {
    driver,
    driven,
    times: slopes.some((slope) => gentle(slope) !== slope) ? undefined : times,
    isEnlarged: Math.min(d1, d2) * scale < 2 * leastRadius,
    edge,
    plane: placed(driven, 0, driven.groove).y - toSi(line.offset) * perMetre,
    lowest: Math.max(lowestOf(driver), lowestOf(driven)),
  };
}

function gapsOf({ driverNear, driverFar, drivenNear, drivenFar }: BeltGaps): readonly number[] {
  return [driverNear, driverFar, drivenNear, drivenFar].map(toSi);
}

/** Steeper no pulley can be drawn and still be seen from above. */
const gentle = (slope: number): number => Math.max(-1, Math.min(1, slope));

function lowestOf(pulley: PulleyLayout): number {
  return Math.max(...[-pulley.radius, pulley.radius].map((x) => placed(pulley, x, pulley.back).y));
}

/**
 * A point of the pulley, `x` along its face from its middle and `y` behind it, on the drawing. A lean that is
 * drawn too large across the belt alone is a shear and no turn, so that gaps and offsets keep their scale.
 */
export function placed(pulley: PulleyLayout, x: number, y: number): Point {
  return { x: pulley.x + x - y * pulley.slope, y: pulley.face + x * pulley.slope + y };
}
