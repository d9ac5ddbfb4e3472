import type { FastenerPosition } from '../contracts/calculations.js';
import { distance, round } from './geometry.js';
import { edgeMargin, type Extent } from './part-outlines.js';
import type { Point } from './shapes.js';

export type PartOutline = 'head' | 'plain' | 'circle';

export interface TighteningLayout {
  readonly box: Extent;
  readonly places: ReadonlyMap<string, Point>;
  /** Radius of a fastener. */
  readonly radius: number;
}

export const tighteningWidth = 340;
const largestRadius = 14.5;
const smallestRadius = 4;
/** Two rows of a head stand at least so far apart, that the bores can be seen between them. */
const headDepth = 72;
const mostHeight = 300;

/** Fits the fasteners into the drawing's width, keeping their proportions as far as they can be read. */
export function layOutFasteners(
  positions: readonly FastenerPosition[],
  outline: PartOutline,
  top: number,
): TighteningLayout {
  const { xs, ys } = boundsOf(positions, outline);
  const [wide, deep] = [spread(xs), spread(ys)];
  const across = tighteningWidth - 2 * (edgeMargin + 18);
  const most = outline === 'circle' ? 220 : across;
  const scale = Math.min(wide > 0 ? most / wide : Infinity, deep > 0 ? mostHeight / deep : Infinity);
  const scaleX = Number.isFinite(scale) ? scale : 0;
  const scaleY = deep > 0 ? scaleDown(scaleX, ys, outline) : scaleX;
  const left = (tighteningWidth - wide * scaleX) / 2;
  const bodyTop = top + edgeMargin;
  const places = new Map(
    positions.map(({ fastener, x, y }) => [
      fastener,
      {
        x: round(left + (x - Math.min(...xs)) * scaleX),
        y: round(bodyTop + (y - Math.min(...ys)) * scaleY),
      },
    ]),
  );
  const box = {
    left,
    right: left + wide * scaleX,
    top: bodyTop,
    bottom: bodyTop + deep * scaleY,
  };
  return { box, places, radius: fastenerRadius([...places.values()]) };
}

/**
 * What the drawing reaches across and down: to the outermost fasteners, or all round the circle that they stand
 * on, for three or five do not reach it on every side.
 */
function boundsOf(
  positions: readonly FastenerPosition[],
  outline: PartOutline,
): { readonly xs: readonly number[]; readonly ys: readonly number[] } {
  const xs = positions.map(({ x }) => x);
  const ys = positions.map(({ y }) => y);
  if (outline !== 'circle') return { xs, ys };
  const mean = (values: readonly number[]): number =>
    values.reduce((sum, value) => sum + value, 0) / values.length;
  const centre = { x: mean(xs), y: mean(ys) };
  const radius = Math.max(...positions.map((place) => distance(place, centre)));
  return { xs: [centre.x - radius, centre.x + radius], ys: [centre.y - radius, centre.y + radius] };
}

function spread(values: readonly number[]): number {
  return Math.max(...values) - Math.min(...values);
}

/** The scale down the drawing: few rows are kept neither so close nor so far apart as their pattern has it. */
function scaleDown(scale: number, ys: readonly number[], outline: PartOutline): number {
  if (outline === 'head') {
    return Math.max(scale, headDepth / spread(ys));
  }
  const rows = [...new Set(ys)].sort((a, b) => a - b);
  if (outline === 'circle' || rows.length > 3) {
    return scale;
  }
  const least = Math.min(...rows.slice(1).map((y, i) => y - (rows[i] ?? y)));
  return Math.min(64 / least, Math.max(44 / least, scale));
}

function fastenerRadius(places: readonly Point[]): number {
  const nearest = places.flatMap((a, i) => places.slice(i + 1).map((b) => distance(a, b)));
  return round(Math.max(smallestRadius, Math.min(largestRadius, 0.42 * Math.min(...nearest, Infinity))));
}
