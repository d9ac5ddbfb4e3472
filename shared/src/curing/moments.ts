import { InputError } from '../contracts/input-error.js';
import { requireText } from '../quantities/require.js';

const iso = /^(\d{4})-(\d{2})-(\d{2})T(\d{2}):(\d{2})(?::(\d{2})(?:\.(\d{1,9}))?)?(Z|[+-]\d{2}:\d{2})?$/;
const date = /^\d{4}-\d{2}-\d{2}$/;
const day = 86_400_000;

/** How the times of a case are written, and so how answers are: an offset in minutes, or none at all. */
export interface MomentStyle {
  readonly offset: number | null;
}

export interface Moment extends MomentStyle {
  /** Milliseconds since 1970, of a time without an offset as if it were UTC. */
  readonly at: number;
}

/**
 * An untrusted ISO 8601 time: `2026-12-01T14:00Z`, with an offset, or without any, which then none of a case
 * may have (`like`). Throws `InputError` on `field`.
 */
export function requireMoment(input: unknown, field: string, like?: MomentStyle): Moment {
  const text = requireText(input, field, { max: 40 });
  const match = iso.exec(text);
  const at = match === null ? NaN : read(match, text);
  if (match === null || !Number.isFinite(at)) {
    throw new InputError(field, 'Write a time such as 2026-12-01T14:00Z or 2026-12-01T15:00+01:00.');
  }
  const offset = offsetOf(match[8]);
  if (like !== undefined && (like.offset === null) !== (offset === null)) {
    throw new InputError(field, 'Write all times with an offset from UTC (or Z), or all without one.');
  }
  return { at, offset };
}

/** The end of a date, or a time, in milliseconds. Throws `InputError` on `field`. */
export function requireExpiry(input: unknown, field: string): number {
  const text = requireText(input, field, { max: 40 });
  if (!date.test(text)) return requireMoment(text, field).at;
  const at = read(iso.exec(`${text}T00:00Z`) ?? [], `${text}T00:00Z`);
  if (Number.isFinite(at)) return at + day;
  throw new InputError(field, 'Write a date such as 2026-12-01; the lot is good to its end.');
}

/** NaN for a day or a time that does not exist, which a plain reading would carry over into the next. */
function read(match: readonly (string | undefined)[], text: string): number {
  const [, year, month, dayOfMonth, hour, minute] = match.map(Number);
  const written = match[8] === undefined ? `${text}Z` : text;
  const inMonth = new Date(Date.UTC(year ?? 0, month ?? 0, 0)).getUTCDate();
  const exists = (dayOfMonth ?? 0) <= inMonth && (hour ?? 24) < 24 && (minute ?? 60) < 60;
  return exists ? Date.parse(written) : NaN;
}

function offsetOf(written: string | undefined): number | null {
  if (written === undefined) return null;
  if (written === 'Z') return 0;
  const minutes = Number(written.slice(1, 3)) * 60 + Number(written.slice(4));
  return written.startsWith('-') ? -minutes : minutes;
}

/** An ISO time of the answer: in UTC, or without an offset where the case has none. */
export function isoOf(at: number, { offset }: MomentStyle): string {
  const text = new Date(at).toISOString();
  return offset === null ? text.slice(0, -1) : text;
}

const months = 'Jan Feb Mar Apr May Jun Jul Aug Sep Oct Nov Dec'.split(' ');

/** A time for a sentence, to the minute after it: `15:20 on 1 Dec 2026`, as the case's own clock shows it. */
export function sayMoment(at: number, style: MomentStyle): string {
  const { clock, day: on, year } = shown(at, style);
  return `${clock}${style.offset === 0 ? ' UTC' : ''} on ${on} ${year}`;
}

/** The same, short enough for a drawing: `15:20, 1 Dec`. */
export function sayClock(at: number, style: MomentStyle): string {
  const { clock, day: on } = shown(at, style);
  return `${clock}, ${on}`;
}

function shown(at: number, { offset }: MomentStyle): { clock: string; day: string; year: number } {
  const time = new Date(Math.ceil(at / 60_000) * 60_000 + (offset ?? 0) * 60_000);
  const [hour, minute] = [time.getUTCHours(), time.getUTCMinutes()].map((n) => String(n).padStart(2, '0'));
  return {
    clock: `${hour ?? ''}:${minute ?? ''}`,
    day: `${time.getUTCDate()} ${months[time.getUTCMonth()] ?? ''}`,
    year: time.getUTCFullYear(),
  };
}

/** A span of milliseconds for a sentence, to the minute after it: `1 h 20 min`, `3 d 2 h`. */
export function saySpan(milliseconds: number): string {
  const minutes = Math.ceil(milliseconds / 60_000 - 1e-6);
  const [d, h, min] = [Math.floor(minutes / 1440), Math.floor((minutes % 1440) / 60), minutes % 60];
  const parts =
    d > 0 ? [`${d} d`, h > 0 ? `${h} h` : ''] : [h > 0 ? `${h} h` : '', min > 0 ? `${min} min` : ''];
  const text = parts.filter((part) => part !== '').join(' ');
  return text === '' ? '0 min' : text;
}
