import type { SheetPoint } from './read-sheet.js';

/** Milliseconds at one temperature. */
export interface Times {
  readonly toHandle?: number;
  readonly toLoad: number;
  readonly full: number;
}

const noise = 1e-6;

/**
 * The times at a temperature (kelvin), linear between the lines on either side of it; undefined outside them.
 * `points` go up in temperature, one line each. Cure quickens more than linearly with warmth, so that a
 * straight line errs late.
 */
export function timesAt(points: readonly SheetPoint[], temperature: number): Times | undefined {
  const same = points.find((point) => Math.abs(point.temperature - temperature) <= noise);
  if (same !== undefined) return same;
  const above = points.findIndex((point) => point.temperature > temperature);
  const [a, b] = [points[above - 1], points[above]];
  if (a === undefined || b === undefined) return undefined;
  const share = (temperature - a.temperature) / (b.temperature - a.temperature);
  const between = (from: number, to: number): number => from + (to - from) * share;
  const handles = a.toHandle !== undefined && b.toHandle !== undefined;
  return {
    ...(handles ? { toHandle: between(a.toHandle, b.toHandle) } : {}),
    toLoad: between(a.toLoad, b.toLoad),
    full: between(a.full, b.full),
  };
}

/** Lines upwards in temperature; of two at one temperature the slower figures hold. */
export function byTemperature(points: readonly SheetPoint[]): readonly SheetPoint[] {
  const sorted = [...points].sort((a, b) => a.temperature - b.temperature);
  return sorted.reduce<readonly SheetPoint[]>((merged, point) => {
    const last = merged.at(-1);
    const isSame = last !== undefined && point.temperature - last.temperature <= noise;
    return isSame ? [...merged.slice(0, -1), slower(last, point)] : [...merged, point];
  }, []);
}

/** What is slower of two, in each of the times. */
export function slower<T extends Times>(a: T, b: T): T {
  const most = (x: number | undefined, y: number | undefined): number | undefined =>
    x === undefined || y === undefined ? undefined : Math.max(x, y);
  return {
    ...a,
    toHandle: most(a.toHandle, b.toHandle),
    toLoad: Math.max(a.toLoad, b.toLoad),
    full: Math.max(a.full, b.full),
  };
}
