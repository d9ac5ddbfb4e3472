import type { KeyFit, KeyFitRequest } from '../contracts/fits.js';
import { toSi } from '../quantities/convert.js';
import { exaggeration } from './exaggeration.js';
import type { Point } from './shapes.js';

/** The section across the shaft in drawing units. */
export interface KeywayLayout {
  readonly left: number;
  readonly right: number;
  readonly top: number;
  readonly bottom: number;
  /** Right walls of the slots; the key lies against their left ones. */
  readonly shaftWall: number;
  readonly hubWall: number;
  /** Top of the hub's slot. */
  readonly roof: number;
  /** Height of the shaft's surface at x. */
  readonly surface: (x: number) => number;
  /** Where the parts are broken off. */
  readonly ends: { readonly left: number; readonly right: number; readonly foot: number };
  readonly sides: number | undefined;
  readonly over: number | undefined;
  readonly isToScale: boolean;
}

/** Right side of the key, so that a label beside it has room whatever the key's width. */
const right = 228;
const keyTop = 104;
const largest = 84;
const smallest = 12;
const room = 22;
/** Half of what is broken out of the parts, where the shaft's curve allows it. */
const halfSection = 124;
const furthest = 326;
/** Drawn for a shaft of unknown diameter. */
const usualRadius = 260;
/** Of a smaller shaft the curve would be no section any more. */
const leastRadius = 104;

const clamp = (value: number, low: number, high: number): number => Math.min(Math.max(value, low), high);

/** Lays the key and its slots out: the parts to one scale, the plays exaggerated. */
export function keywayLayout(request: KeyFitRequest, { play }: KeyFit): KeywayLayout {
  const [width, height] = [toSi(request.key.width), toSi(request.key.height)];
  const scale = largest / Math.max(width, height);
  const w = Math.max(smallest, width * scale);
  const h = Math.max(smallest, height * scale);
  const hubDepth = toSi(request.hubKeyway.depth) * scale;
  // What a depth from the slot's edge lacks is in the play over the key.
  const trueDepth = (toSi(play.top) + height) * scale - hubDepth;
  const depth = clamp(trueDepth, 0.15 * h, 1.15 * h);
  const sides = exaggeration([toSi(play.shaft) * scale, toSi(play.hub) * scale], room);
  const over = exaggeration([toSi(play.top) * scale], room);
  const drawn = (length: number, factor: number | undefined): number =>
    factor === undefined ? Math.sign(length) * room : length * scale * factor;

  const bottom = keyTop + h;
  const crown = bottom - depth;
  const trueRadius =
    request.shaftDiameter === undefined ? usualRadius : (toSi(request.shaftDiameter) / 2) * scale;
  const radius = Math.max(leastRadius, trueRadius);
  const middle = right - w / 2;
  const half = Math.min(halfSection, 0.85 * radius);
  const surface = (x: number): number =>
    crown + radius - Math.sqrt(radius * radius - Math.min(Math.abs(x - middle), radius) ** 2);
  return {
    left: right - w,
    right,
    top: keyTop,
    bottom,
    shaftWall: right + drawn(toSi(play.shaft), sides),
    hubWall: right + drawn(toSi(play.hub), sides),
    roof: Math.min(keyTop - drawn(toSi(play.top), over), crown - 8),
    surface,
    ends: {
      left: middle - half,
      right: Math.min(middle + half, furthest),
      foot: Math.max(bottom + 40, surface(middle - half) + 26),
    },
    sides,
    over,
    isToScale:
      radius === trueRadius &&
      Math.abs(trueDepth - depth) < 0.01 &&
      Math.min(width, height) * scale >= smallest,
  };
}

/** Points of the shaft's surface from one x to another, moved up by `lift`. */
export function surfacePoints(
  layout: KeywayLayout,
  from: number,
  to: number,
  lift: number,
): readonly Point[] {
  const count = 12;
  return Array.from({ length: count + 1 }, (_, i) => {
    const x = from + ((to - from) * i) / count;
    return { x, y: layout.surface(x) - lift };
  });
}
