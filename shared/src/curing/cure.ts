import type { Cure, CureRequest } from '../contracts/curing.js';
import { InputError } from '../contracts/input-error.js';
import type { Quantity } from '../contracts/quantity.js';
import { fromSi, toSi } from '../quantities/convert.js';
import { printNumber, printQuantity } from '../quantities/print.js';
import { requireQuantity, requireRecord } from '../quantities/require.js';
import { isoOf, requireExpiry, requireMoment, sayMoment, saySpan, type MomentStyle } from './moments.js';
import { notInSheet, pointsFor } from './points-for.js';
import { readJoint, readSheet, type SheetPoint } from './read-sheet.js';
import { reach, readLog, shareAt, stretchesOf, type Reached, type Stretch } from './stretches.js';

/**
 * When a joint may be handled, loaded, and has its full strength, from its data sheet's figures: linear between
 * the temperatures, which errs late; at the next larger gap and the next lower humidity listed; for its own
 * substrate, with or without activator. Outside the figures, or where one is needed and not given, `not-judged`.
 * Time runs from `closed`, else `applied`. Before loading `fail`, from then on `pass`; `fail` too for a lot
 * past its date when it was applied (a date is good to its end, UTC) and a joint closed after the open time.
 *
 * With a log of temperatures the share of the stage that passes is added up stretch by stretch, time over the
 * time that the sheet gives; between two temperatures the slower counts, after the last one that one. `progress`
 * is the share of the way to loading. Times are ISO 8601, answers in UTC; where no time of a case has an
 * offset, they are taken as one clock's and answered so.
 *
 * @throws InputError on the request's fields; on `now` before `applied`, `closed` outside the two
 * Source: own rule, common practice. Example: 3 h to load at 22 °C, closed at 12:20, asked at 14:00: `fail`,
 * 1 h 20 min to wait.
 */
export function cure(request: CureRequest): Cure {
  const given = requireRecord(request, 'request');
  const sheet = readSheet(given['sheet']);
  const temperature = requireQuantity(given['temperature'], 'temperature', 'temperature');
  const joint = readJoint(given);
  const times = readTimes(given);
  const log = readLog(given['log'], times.style, times.now);
  const cautions = [...cautionsOf(given), ...notInSheet(sheet, joint)];
  const spoilt = [...lotPast(given, times), ...closedLate(given, times)];

  const chosen = pointsFor(sheet, joint);
  if ('cannot' in chosen) {
    return spoilt.length > 0
      ? { verdict: 'fail', reason: spoilt.join(' '), cautions }
      : { verdict: 'not-judged', reason: chosen.cannot, cautions };
  }
  const stretches = stretchesOf(chosen.points, times.start, toSi(temperature), log);
  const load = reach(stretches, 'toLoad');
  const full = reach(stretches, 'full');
  const judgement =
    load !== undefined && 'without' in load
      ? ({
          verdict: 'not-judged',
          reason: sayOutside(load.without, chosen.points, temperature, times.style),
        } as const)
      : judgeWait(load?.at ?? Infinity, full, times);
  return {
    ...(spoilt.length > 0 ? { verdict: 'fail', reason: [...spoilt, judgement.reason].join(' ') } : judgement),
    ...stage('handleAt', reach(stretches, 'toHandle'), times.style),
    ...stage('loadAt', load, times.style),
    ...stage('fullAt', full, times.style),
    ...(load !== undefined && 'at' in load ? { progress: shareAt(stretches, 'toLoad', times.now) } : {}),
    cautions,
  };
}

interface Times {
  readonly applied: number;
  readonly closed: number | undefined;
  readonly start: number;
  readonly now: number;
  readonly style: MomentStyle;
}

function readTimes(given: Readonly<Record<string, unknown>>): Times {
  const applied = requireMoment(given['applied'], 'applied');
  const now = requireMoment(given['now'], 'now', applied);
  if (now.at < applied.at) throw new InputError('now', 'This is before the compound was applied.');
  const closed =
    given['closed'] === undefined ? undefined : requireMoment(given['closed'], 'closed', applied);
  if (closed !== undefined && (closed.at < applied.at || closed.at > now.at)) {
    throw new InputError('closed', 'The joint is closed after the compound was applied and before now.');
  }
  const start = closed?.at ?? applied.at;
  return { applied: applied.at, closed: closed?.at, start, now: now.at, style: applied };
}

function lotPast(given: Readonly<Record<string, unknown>>, { applied }: Times): readonly string[] {
  if (given['lotExpires'] === undefined) return [];
  const end = requireExpiry(given['lotExpires'], 'lotExpires');
  const written = String(given['lotExpires']);
  return applied < end
    ? []
    : [`The lot was past its date, ${written}, when it was applied: clean it off and use a fresh one.`];
}

function closedLate(given: Readonly<Record<string, unknown>>, { applied, closed }: Times): readonly string[] {
  if (given['openTime'] === undefined) return [];
  const openTime = requireQuantity(given['openTime'], 'time', 'openTime', { zero: false });
  const open = (closed ?? applied) - applied;
  if (open <= 1000 * toSi(openTime) + 1e-3) return [];
  return [
    `The joint was closed ${saySpan(open)} after the compound was applied, later than the ${printQuantity(openTime)} it stays open: clean it off and apply it again.`,
  ];
}

/** How the reason begins where nothing is wrong but the time. */
export const notYet = 'Not yet: ';

function judgeWait(
  loadAt: number,
  full: Reached | undefined,
  { now, style }: Times,
): Pick<Cure, 'verdict' | 'reason'> {
  const strength =
    full !== undefined && 'at' in full
      ? ` Full strength ${full.at <= now ? 'since' : 'at'} ${sayMoment(full.at, style)}.`
      : '';
  return now < loadAt
    ? {
        verdict: 'fail',
        reason: `${notYet}${saySpan(loadAt - now)} still to wait. It may be loaded at ${sayMoment(loadAt, style)}.${strength}`,
      }
    : { verdict: 'pass', reason: `It may be loaded since ${sayMoment(loadAt, style)}.${strength}` };
}

function sayOutside(
  { from, temperatures }: Stretch,
  points: readonly SheetPoint[],
  { unit }: Quantity,
  style: MomentStyle,
): string {
  const say = (kelvin: number): string => {
    const { value } = fromSi(kelvin, unit);
    return `${printNumber(value, 1).replace(/\.0$/, '')}\u2009${unit}`;
  };
  const [coldest, warmest] = [points[0]?.temperature ?? 0, points.at(-1)?.temperature ?? 0];
  const outside = temperatures[0] < coldest ? temperatures[0] : temperatures[1];
  const has =
    coldest === warmest
      ? `at ${say(coldest)} alone for this joint`
      : `from ${say(coldest)} to ${say(warmest)} for this joint`;
  return `The data sheet has figures ${has}. ${say(outside)}, from ${sayMoment(from, style)} on, is outside them, and nothing is guessed.`;
}

function stage(
  name: 'handleAt' | 'loadAt' | 'fullAt',
  reached: Reached | undefined,
  style: MomentStyle,
): Partial<Cure> {
  return reached !== undefined && 'at' in reached ? { [name]: isoOf(reached.at, style) } : {};
}

function cautionsOf(given: Readonly<Record<string, unknown>>): readonly string[] {
  const allowed = given['retorqueAllowed'] ?? false;
  if (typeof allowed !== 'boolean') {
    throw new InputError('retorqueAllowed', 'This must be true or false.');
  }
  return [
    ...(allowed
      ? []
      : [
          'Do not tighten again while it sets or after, unless its data sheet allows it: that breaks the bond.',
        ]),
    ...(given['openTime'] !== undefined && given['closed'] === undefined
      ? ['When the joint was closed was not said: it is taken as closed when the compound was applied.']
      : []),
  ];
}
