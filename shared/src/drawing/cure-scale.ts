import type { Cure, CureRequest } from '../contracts/curing.js';
import { requireMoment } from '../curing/moments.js';

/** What a cure's drawing stands on, milliseconds from when time began to run. */
export interface CureTimes {
  readonly handle: number | undefined;
  readonly load: number;
  readonly full: number | undefined;
  readonly now: number;
  /** The end of the axis. */
  readonly end: number;
}

/** The times of a cure, or null where there is none to load at. */
export function cureTimes(request: CureRequest, answer: Cure): CureTimes | null {
  if (answer.loadAt === undefined) return null;
  const at = (text: string): number => requireMoment(text, 'time').at;
  const start = at(request.closed ?? request.applied);
  const since = (text: string | undefined): number | undefined =>
    text === undefined ? undefined : at(text) - start;
  const [handle, full] = [since(answer.handleAt), since(answer.fullAt)];
  const load = at(answer.loadAt) - start;
  const now = at(request.now) - start;
  const last = full ?? load;
  return { handle, load, full, now, end: 1.06 * Math.max(last, Math.min(now, 1.25 * last)) };
}

const minute = 60_000;
const hour = 60 * minute;
const day = 24 * hour;
const steps = [
  ...[minute / 60, minute / 12, minute / 4, minute, 5 * minute, 10 * minute, 15 * minute, 30 * minute],
  ...[hour, 2 * hour, 3 * hour, 6 * hour, 12 * hour],
  ...[day, 2 * day, 4 * day, 7 * day, 14 * day, 28 * day, 56 * day, 112 * day],
];

export interface TimeTicks {
  readonly unit: 'seconds' | 'minutes' | 'hours' | 'days';
  readonly ticks: readonly { readonly at: number; readonly label: string }[];
}

/** At most seven ticks over a span, in the unit that keeps their figures short. */
export function timeTicks(end: number): TimeTicks {
  const step = steps.find((one) => end / one <= 7) ?? end / 4;
  const [unit, size] =
    step < minute
      ? (['seconds', 1000] as const)
      : step < hour
        ? (['minutes', minute] as const)
        : step < day
          ? (['hours', hour] as const)
          : (['days', day] as const);
  const count = Math.floor(end / step);
  const ticks = Array.from({ length: count + 1 }, (_, i) => ({
    at: i * step,
    label: String(Math.round((i * step) / size)),
  }));
  return { unit, ticks };
}
