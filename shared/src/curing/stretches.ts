import { InputError } from '../contracts/input-error.js';
import { toSi } from '../quantities/convert.js';
import { requireList, requireQuantity, requireRecord } from '../quantities/require.js';
import { requireMoment, type MomentStyle } from './moments.js';
import type { SheetPoint } from './read-sheet.js';
import { slower, timesAt, type Times } from './times-at.js';

/** A temperature (kelvin) from a time on (milliseconds). */
export interface Logged {
  readonly at: number;
  readonly temperature: number;
}

/** A time in which one rate of cure is counted; `times` undefined where the data sheet has no figures. */
export interface Stretch {
  readonly from: number;
  readonly to: number;
  readonly times: Times | undefined;
  /** The coldest and the warmest of it, kelvin. */
  readonly temperatures: readonly [number, number];
}

const mostLogged = 2000;

/** An untrusted log of temperatures in the order of time, none after now. Throws `InputError` on `log`. */
export function readLog(input: unknown, style: MomentStyle, now: number): readonly Logged[] {
  if (input === undefined) return [];
  let last = -Infinity;
  return requireList(input, 'log', { max: mostLogged }).map((item, i) => {
    const path = `log[${i}]`;
    const given = requireRecord(item, path);
    const { at } = requireMoment(given['at'], `${path}.at`, style);
    if (at <= last) throw new InputError(`${path}.at`, 'Write the temperatures in the order of their times.');
    if (at > now) throw new InputError(`${path}.at`, 'This is later than now.');
    last = at;
    const temperature = requireQuantity(given['temperature'], 'temperature', `${path}.temperature`);
    return { at, temperature: toSi(temperature) };
  });
}

/**
 * The time from `start` on, cut at each temperature logged. Between two temperatures the slower rate of the
 * two counts; the last one counts for ever. Before the first logged, `temperature` does.
 */
export function stretchesOf(
  points: readonly SheetPoint[],
  start: number,
  temperature: number,
  log: readonly Logged[],
): readonly Stretch[] {
  const before = log.filter(({ at }) => at <= start).at(-1);
  const marks: readonly Logged[] = [
    { at: start, temperature: before?.temperature ?? temperature },
    ...log.filter(({ at }) => at > start),
  ];
  return marks.map((mark, i) => {
    const next = marks[i + 1];
    const [a, b] = [mark.temperature, next?.temperature ?? mark.temperature];
    const [atStart, atEnd] = [timesAt(points, a), timesAt(points, b)];
    return {
      from: mark.at,
      to: next?.at ?? Infinity,
      times: atStart === undefined || atEnd === undefined ? undefined : slower(atStart, atEnd),
      temperatures: [Math.min(a, b), Math.max(a, b)],
    };
  });
}

/** When a stage is reached, or the stretch for which the data sheet has no figures before that. */
export type Reached = { readonly at: number } | { readonly without: Stretch };

/** Adds up, stretch by stretch, the share of the stage's time that has passed, until it is whole. */
export function reach(stretches: readonly Stretch[], stage: keyof Times): Reached | undefined {
  let share = 0;
  for (const stretch of stretches) {
    const { from, to, times } = stretch;
    if (times === undefined) return { without: stretch };
    const whole = times[stage];
    if (whole === undefined) return undefined;
    const end = from + (1 - share) * whole;
    // A double's rounding must not push a whole hour into the next millisecond.
    if (end <= to) return { at: Math.ceil(end - 1e-3) };
    share += (to - from) / whole;
  }
  return undefined;
}

/** The share of the stage that is behind at a time, 0 to 1. */
export function shareAt(stretches: readonly Stretch[], stage: keyof Times, now: number): number {
  const share = stretches.reduce((sum, { from, to, times }) => {
    const whole = times?.[stage];
    return whole === undefined || now <= from ? sum : sum + (Math.min(now, to) - from) / whole;
  }, 0);
  return Math.min(1, share);
}
