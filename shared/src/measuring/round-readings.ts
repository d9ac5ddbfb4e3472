import type { RoundReadings, RoundReadingsRequest } from '../contracts/measuring.js';
import type { Quantity, Unit } from '../contracts/quantity.js';
import { printQuantity } from '../quantities/print.js';
import { requireOneOf, requireRecord } from '../quantities/require.js';
import { judgedReadings, type Judged } from './judged-readings.js';
import { limitDecision } from './limit-decision.js';
import {
  quantityIfGiven,
  requireLimits,
  withoutNoise,
  worstReasons,
  worstVerdict,
  type LimitsGiven,
} from './limits-input.js';
import { readRound, type RoundRead } from './read-round.js';
import { convert } from '../quantities/convert.js';

const kinds = ['bore', 'journal', 'shell'] as const;
type Kind = (typeof kinds)[number];
type Part = RoundReadings['parts'][number];

/**
 * A bore, a journal or a bearing's shells from two-point readings at several heights and axes (lengths, all
 * more than zero, at most 200): mean, least, most; ovality, the greatest difference between axes at one
 * height; taper, the greatest difference between heights on one axis. All in the unit of the first reading.
 *
 * The size is judged at the reading that lies nearest to a limit, or furthest beyond one; ovality and taper at
 * their own limits, with √2 of the uncertainty of one reading, since each takes two. A shell is thinner
 * towards its split: only `judgedAxis`, at 90° to the split, counts, or else every axis but `splitAxis`, and
 * only with its cap torqued; several axes with neither named are `not-judged`.
 *
 * @throws InputError on the request's fields
 * Source: ovality and taper as a marine diesel's service manual defines roundness and cylindricity (YAN in the
 * reference values); the rest is common practice, no source.
 * Example: 88.012, 88.010, 88.006 along and 88.004, 88.003, 88.004 across: ovality 0.008, taper 0.006 mm.
 */
export function roundReadings(request: RoundReadingsRequest): RoundReadings {
  const given = requireRecord(request, 'request');
  const of = requireOneOf(given['of'], kinds, 'of');
  const all = readRound(given['readings'], 'readings');
  const limits = requireLimits(given['limits'], 'length', 'limits');
  const judged = judgedReadings(all, of === 'shell', given);
  const uncertainty = quantityIfGiven(given['uncertainty'], 'length', 'uncertainty');
  const unit = all[0]?.given.unit ?? 'mm';
  const values = judged.readings.map(({ value }) => value);
  const least = Math.min(...values);
  const most = Math.max(...values);
  const ovality = spread(judged.readings, 'height');
  const taper = spread(judged.readings, 'axis');
  const worst = worstOf(judged.readings, of, limits, unit);
  const spreadOf = (value: number | null): Quantity | null => (value === null ? null : { value, unit });
  const parts = judged.cannot === null ? judgeParts() : [notJudged('size', judged.cannot)];
  return {
    verdict: worstVerdict(parts),
    reason: parts.length === 0 ? sayRecorded(least, most, unit) : worstReasons(parts),
    mean: { value: values.reduce((sum, value) => sum + value, 0) / values.length, unit },
    least: { value: least, unit },
    most: { value: most, unit },
    ovality: spreadOf(ovality),
    taper: spreadOf(taper),
    worstHeight: worst.height,
    worstAxis: worst.axis,
    parts,
    cautions: cautionsOf(of, judged, ovality, taper),
  };

  function judgeParts(): readonly Part[] {
    const both = uncertainty && { ...uncertainty, value: uncertainty.value * Math.SQRT2 };
    const ofSpread = (part: 'ovality' | 'taper', value: number | null): readonly Part[] => {
      const high = quantityIfGiven(given[`${part}Limit`], 'length', `${part}Limit`);
      return high === undefined ? [] : [judgeSpread(part, spreadOf(value), most, high, both)];
    };
    return [
      ...judgeSize(worst, limits, uncertainty),
      ...ofSpread('ovality', ovality),
      ...ofSpread('taper', taper),
    ];
  }
}

/** Greatest difference among the readings that share a height, or an axis; null where none do. */
function spread(readings: readonly RoundRead[], same: 'height' | 'axis'): number | null {
  const groups = new Map<string, number[]>();
  for (const reading of readings) {
    groups.set(reading[same], [...(groups.get(reading[same]) ?? []), reading.value]);
  }
  const several = [...groups.values()].filter((values) => values.length > 1);
  if (several.length === 0) return null;
  return Math.max(...several.map((values) => Math.max(...values) - Math.min(...values)));
}

/** The reading nearest to a limit or furthest beyond it; without limits the one that wear shows in. */
function worstOf(
  readings: readonly RoundRead[],
  of: Kind,
  { low, high }: LimitsGiven,
  unit: Unit,
): RoundRead {
  const at = (limit: Quantity | undefined): number | undefined => limit && convert(limit, unit).value;
  const [least, most] = [at(low), at(high)];
  const wear = (value: number): number => (of === 'journal' ? value : -value);
  const clear = ({ value }: RoundRead): number =>
    least === undefined && most === undefined
      ? wear(value)
      : Math.min(value - (least ?? -Infinity), (most ?? Infinity) - value);
  return readings.reduce((a, b) => (clear(b) < clear(a) ? b : a));
}

function judgeSize(
  { height, axis, given }: RoundRead,
  limits: LimitsGiven,
  uncertainty?: Quantity,
): readonly Part[] {
  if (limits.low === undefined && limits.high === undefined) return [];
  const { verdict, reason } = limitDecision({ value: given, ...limits, uncertainty });
  return [{ of: 'size', verdict, reason: `Size, ${height}, ${axis}: ${reason}` }];
}

function judgeSpread(
  of: 'ovality' | 'taper',
  value: Quantity | null,
  size: number,
  high: Quantity,
  uncertainty?: Quantity,
): Part {
  if (value === null) {
    const needed = of === 'ovality' ? 'two axes at one height' : 'two heights on one axis';
    return notJudged(of, `There is no ${of} without readings of ${needed}.`);
  }
  const plain = { value: withoutNoise(value.value, size), unit: value.unit };
  const { verdict, reason } = limitDecision({ value: plain, high, uncertainty });
  return { of, verdict, reason: `${of === 'ovality' ? 'Ovality' : 'Taper'}: ${reason}` };
}

const notJudged = (of: Part['of'], reason: string): Part => ({ of, verdict: 'not-judged', reason });

function sayRecorded(least: number, most: number, unit: Unit): string {
  const [from, to] = [least, most].map((value) => printQuantity({ value, unit }));
  return `${from ?? ''} to ${to ?? ''}: there is no limit to judge by, so the figures are only recorded.`;
}

const lobing =
  'A gauge with two points does not show lobing: a shape with three or five lobes reads the same all round.';

function cautionsOf(
  of: Kind,
  { cautions }: Judged,
  ovality: number | null,
  taper: number | null,
): readonly string[] {
  return [
    of === 'journal'
      ? `${lobing} Turn it in a V-block under a dial gauge where it matters.`
      : `${lobing} Try a gauge with three points where it matters.`,
    ...(ovality === null ? ['Read on one axis only at each height, so that ovality does not show.'] : []),
    ...(taper === null ? ['Read at one height only on each axis, so that taper does not show.'] : []),
    ...cautions,
  ];
}
