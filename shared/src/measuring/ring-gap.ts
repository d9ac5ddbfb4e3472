import { InputError } from '../contracts/input-error.js';
import type { RingGap, RingGapRequest } from '../contracts/measuring.js';
import type { Quantity } from '../contracts/quantity.js';
import type { Judgement } from '../contracts/verdict.js';
import { fromSi, intervalToSi, toSi } from '../quantities/convert.js';
import { printNumber, printQuantity, roundInwards } from '../quantities/print.js';
import { requireNumber, requireQuantity, requireRecord } from '../quantities/require.js';
import { decimalsOf } from '../quantities/round.js';
import { limitDecision } from './limit-decision.js';
import {
  quantityIfGiven,
  requireLimits,
  withoutNoise,
  worstReasons,
  worstVerdict,
  type LimitsGiven,
} from './limits-input.js';

/** Of grey iron, 10⁻⁶ per kelvin: a handbook's table of expansion (CTE1 in the reference values). */
const greyIron = 11.4;
const mostPerBore = 0.05;

/**
 * A piston ring's end gap, measured square in its bore: against the limits, or against the maker's gap for
 * each unit of bore (`perBore`, 0.0045 is 0.0045 in for each inch), and whether it closes when the ring runs
 * hotter than the bore: by π·D·α·ΔT. Lengths more than zero; ΔT a difference of temperatures; α in 10⁻⁶/K,
 * grey iron's 11.4 where none is given. Lengths in the unit of the gap.
 *
 * `pass` only when neither test fails; without limits, maker's figure and ΔT `not-judged`.
 *
 * @throws InputError on the request's fields; on `perBore` where limits are given too
 * Source: gap for each inch of bore as a trade magazine of January 2019 works it; linear expansion, by
 * definition. Example: 4.030 in × 0.0045 = 0.0181 in.
 */
export function ringGap(request: RingGapRequest): RingGap {
  const given = requireRecord(request, 'request');
  const bore = requireQuantity(given['bore'], 'length', 'bore', { zero: false });
  const gap = requireQuantity(given['gap'], 'length', 'gap');
  const uncertainty = quantityIfGiven(given['uncertainty'], 'length', 'uncertainty');
  const wanted = readWanted(given, bore, gap);
  const hotter = quantityIfGiven(given['ringHotterBy'], 'temperature', 'ringHotterBy', { interval: true });
  const coefficient =
    given['coefficient'] === undefined
      ? undefined
      : requireNumber(given['coefficient'], 'coefficient', { min: 0, max: 100 });
  const closesBy =
    hotter === undefined
      ? null
      : fromSi(Math.PI * toSi(bore) * (coefficient ?? greyIron) * 1e-6 * intervalToSi(hotter), gap.unit);
  const parts = [
    ...judgeWanted(gap, wanted, given['perBore'] !== undefined, uncertainty),
    ...(closesBy === null ? [] : [judgeClosing(gap, closesBy, uncertainty)]),
  ];
  return {
    verdict: worstVerdict(parts),
    reason: parts.length === 0 ? sayRecorded(gap) : worstReasons(parts),
    wanted,
    closesBy,
    assumed: assumedOf(hotter, coefficient),
  };
}

function readWanted(given: Readonly<Record<string, unknown>>, bore: Quantity, gap: Quantity): LimitsGiven {
  const limits = requireLimits(given['limits'], 'length', 'limits');
  if (given['perBore'] === undefined) return limits;
  if (limits.low !== undefined || limits.high !== undefined) {
    throw new InputError('perBore', 'Give either limits or a gap for each unit of bore, not both.');
  }
  const perBore = requireRecord(given['perBore'], 'perBore');
  const low = requireNumber(perBore['low'], 'perBore.low', { min: 0, max: mostPerBore });
  const high =
    perBore['high'] === undefined
      ? undefined
      : requireNumber(perBore['high'], 'perBore.high', { min: low, max: mostPerBore });
  const ofBore = (share: number): Quantity => fromSi(toSi(bore) * share, gap.unit);
  return { low: ofBore(low), ...(high === undefined ? {} : { high: ofBore(high) }) };
}

function judgeWanted(
  gap: Quantity,
  wanted: LimitsGiven,
  isOfBore: boolean,
  uncertainty?: Quantity,
): readonly Judgement[] {
  if (wanted.low === undefined && wanted.high === undefined) return [];
  const plain = (limit: Quantity | undefined): Quantity | undefined =>
    limit && { ...limit, value: withoutNoise(limit.value) };
  const exact = { low: plain(wanted.low), high: plain(wanted.high) };
  const limits = isOfBore ? readable(exact, gap) : exact;
  return [limitDecision({ value: gap, ...limits, uncertainty })];
}

/**
 * Limits that were worked out, to a decimal more than the gap was read to and inwards: no reading can lie between
 * such a limit and the exact one. As they are where that would leave nothing between them.
 */
function readable({ low, high }: LimitsGiven, gap: Quantity): LimitsGiven {
  const digits = decimalsOf(gap.value) + 1;
  const rounded = {
    low: low && roundInwards(low, gap.unit, digits, 'low'),
    high: high && roundInwards(high, gap.unit, digits, 'high'),
  };
  const isEmpty = rounded.low && rounded.high && rounded.low.value > rounded.high.value;
  return isEmpty === true ? { low, high } : rounded;
}

function judgeClosing(gap: Quantity, closesBy: Quantity, uncertainty?: Quantity): Judgement {
  const { verdict } = limitDecision({ value: gap, low: closesBy, uncertainty });
  const closes = `Hot, the gap of ${printQuantity(gap)} closes by ${printQuantity(closesBy)}`;
  const reasons = {
    pass: `${closes}: its ends stay apart.`,
    doubtful: `${closes}, within the tool's ±${uncertainty === undefined ? '' : printQuantity(uncertainty)} of all of it: its ends may meet, and the ring then breaks or scuffs.`,
    fail: `${closes}: its ends meet, and the ring then breaks or scuffs.`,
    'not-judged': '',
  };
  return { verdict, reason: reasons[verdict] };
}

const sayRecorded = (gap: Quantity): string =>
  `${printQuantity(gap)} has no limit to be judged by: the figure is only recorded.`;

function assumedOf(hotter: Quantity | undefined, coefficient: number | undefined): readonly string[] {
  const measured = 'The ring was square in the bore where the bore is least worn, pushed down with a piston.';
  if (hotter === undefined) return [measured];
  return [
    measured,
    ...(coefficient === undefined
      ? [`The ring is grey iron: ${printNumber(greyIron, 1)}·10⁻⁶ for each kelvin.`]
      : []),
    'The bore grows with the ring up to its own temperature: only the difference closes the gap.',
  ];
}
