import type { RunningClearance, RunningClearanceRequest } from '../contracts/measuring.js';
import type { Quantity } from '../contracts/quantity.js';
import type { Judgement } from '../contracts/verdict.js';
import { convert, toSi } from '../quantities/convert.js';
import { printQuantity } from '../quantities/print.js';
import { requireRecord } from '../quantities/require.js';
import { judgedReadings } from './judged-readings.js';
import { limitDecision } from './limit-decision.js';
import {
  quantityIfGiven,
  requireLimits,
  withoutNoise,
  worstReasons,
  worstVerdict,
  type LimitsGiven,
} from './limits-input.js';
import { readRound } from './read-round.js';

/**
 * The clearance of a shaft in its hole from two-point readings of both: least is the smallest hole less the
 * largest shaft, most the largest less the smallest, mean the one mean less the other. In the unit of the
 * limits, or of the hole's first reading. A clearance below zero is an interference.
 *
 * The least is judged at the low limit, zero where there is none, and the most at the high limit, each with
 * √2 of the uncertainty of one reading. In shells the readings at `splitAxis` do not count.
 *
 * @throws InputError on the request's fields
 * Source: definition of clearance; judged at 90° to the split by common practice, no source.
 * Example: hole 50.040 to 50.050 mm, shaft 49.990 to 50.000 mm: 0.040 to 0.060 mm.
 */
export function runningClearance(request: RunningClearanceRequest): RunningClearance {
  const given = requireRecord(request, 'request');
  const allOfHole = readRound(given['hole'], 'hole');
  const unit = allOfHole[0]?.given.unit ?? 'mm';
  const shaft = readRound(given['shaft'], 'shaft', unit).map(({ value }) => value);
  const hole = judgedReadings(allOfHole, false, given).readings.map(({ value }) => value);
  const limits = requireLimits(given['limits'], 'length', 'limits');
  const uncertainty = quantityIfGiven(given['uncertainty'], 'length', 'uncertainty');
  const answerUnit = (limits.low ?? limits.high)?.unit ?? unit;
  const between = (a: number, b: number): Quantity => {
    const [size, difference] = [a, a - b].map((value) => convert({ value, unit }, answerUnit).value);
    return { value: withoutNoise(difference ?? 0, size ?? 0), unit: answerUnit };
  };
  const clearance = {
    least: between(Math.min(...hole), Math.max(...shaft)),
    mean: between(mean(hole), mean(shaft)),
    most: between(Math.max(...hole), Math.min(...shaft)),
  };
  const both = uncertainty && { ...uncertainty, value: uncertainty.value * Math.SQRT2 };
  return {
    ...judge(clearance.least, clearance.most, limits, both),
    ...clearance,
    cautions: [
      given['splitAxis'] === undefined
        ? 'In shells the clearance is judged at 90° to the split, where they are not relieved, with the caps torqued.'
        : 'The readings at the split are left out. The caps must have been torqued.',
      'Gauges with two points do not show lobing, which takes clearance away unseen.',
    ],
  };
}

const mean = (values: readonly number[]): number =>
  values.reduce((sum, value) => sum + value, 0) / values.length;

function judge(least: Quantity, most: Quantity, limits: LimitsGiven, uncertainty?: Quantity): Judgement {
  const nothing: Quantity = { value: 0, unit: least.unit };
  const atLow = limitDecision({ value: least, low: limits.low ?? nothing, uncertainty });
  const low = { ...atLow, reason: `Least: ${atLow.reason}` };
  if (limits.low === undefined && limits.high === undefined) {
    if (low.verdict !== 'pass') return low;
    return {
      verdict: 'not-judged',
      reason: `${printQuantity(least)} to ${printQuantity(most)}: there is no limit to judge by, so the figures are only recorded.`,
    };
  }
  const atHigh = limits.high && limitDecision({ value: most, high: limits.high, uncertainty });
  const high = atHigh === undefined ? [] : [{ ...atHigh, reason: `Most: ${atHigh.reason}` }];
  const parts = tooCoarse(limits, uncertainty, least) ?? [low, ...high];
  return { verdict: worstVerdict(parts), reason: worstReasons(parts) };
}

/** Judged between both limits at once, a tool may be too coarse for either, and no reading can pass. */
function tooCoarse(
  limits: LimitsGiven,
  uncertainty: Quantity | undefined,
  least: Quantity,
): readonly Judgement[] | undefined {
  if (limits.low === undefined || limits.high === undefined || uncertainty === undefined) return undefined;
  const room = toSi(limits.high) - toSi(limits.low);
  if (room >= 2 * toSi(uncertainty)) return undefined;
  return [limitDecision({ value: least, ...limits, uncertainty })];
}
