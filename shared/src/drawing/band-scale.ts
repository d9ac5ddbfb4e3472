import { decimalsOf } from './words.js';

export interface BandReading {
  readonly value: number;
  /** Expanded uncertainty, half width, in the band's unit. */
  readonly uncertainty: number;
  /** The first person's reading is a solid dot, the second's an outline. */
  readonly role: 'first' | 'second';
  /** What stands before the figure, such as `first`. */
  readonly label: string;
  /** A failed reading is drawn as wrong. */
  readonly failed?: boolean;
}

export interface BandInput {
  readonly low?: number;
  readonly high?: number;
  readonly unit: string;
  readonly readings: readonly BandReading[];
  /** Decimals of the figures; by default as many as limits and readings need, at most 4. */
  readonly decimals?: number;
}

export interface BandScale {
  readonly at: (value: number) => number;
  readonly ticks: readonly number[];
  readonly decimals: number;
  readonly left: number;
  readonly right: number;
}

export const bandWidth = 340;
const left = 12;
const right = 328;

/** A linear axis with the band in its middle two thirds, stretched some way where a reading lies outside. */
export function bandScale({ low, high, readings, decimals }: BandInput): BandScale {
  const ends = readings.flatMap(({ value, uncertainty }) => [value - uncertainty, value + uncertainty]);
  const limits = [low, high].filter((limit) => limit !== undefined);
  const known = [...limits, ...ends];
  const span = spanOf(low, high, known);
  // A reading far outside would squeeze the band: the axis goes no further than this beyond a limit.
  const furthest = 1.25 * span;
  const least = Math.max(Math.min(...known) - span / 12, low === undefined ? -Infinity : low - furthest);
  const most = Math.min(Math.max(...known) + span / 12, high === undefined ? Infinity : high + furthest);
  const from = Math.min((low ?? Math.min(...known)) - span / 4, least);
  const to = Math.max((high ?? Math.max(...known)) + span / 4, most);
  const scale = (right - left) / (to - from);
  return {
    at: (value) => left + (value - from) * scale,
    ticks: ticksBetween(from, to),
    decimals:
      decimals ??
      Math.max(0, ...[...limits, ...readings.map(({ value }) => value)].map((v) => decimalsOf(v, 4))),
    left,
    right,
  };
}

/** The band's width; for a single limit, how far the readings lie from it, and something to stand for none. */
function spanOf(low: number | undefined, high: number | undefined, known: readonly number[]): number {
  if (low !== undefined && high !== undefined && high > low) {
    return high - low;
  }
  const spread = Math.max(...known) - Math.min(...known);
  return spread > 0 && Number.isFinite(spread) ? 1.5 * spread : Math.max(Math.abs(known[0] ?? 0) / 2, 1);
}

function ticksBetween(from: number, to: number): readonly number[] {
  const rough = (to - from) / 24;
  const power = 10 ** Math.floor(Math.log10(rough));
  const step = ([1, 2, 5, 10].find((factor) => factor * power >= rough) ?? 10) * power;
  const first = Math.ceil(from / step);
  const count = Math.max(0, Math.floor(to / step) - first + 1);
  return Array.from({ length: count }, (_, i) => (first + i) * step);
}
