import type { LimitDecision, LimitDecisionRequest } from '../contracts/calculations.js';
import { InputError } from '../contracts/input-error.js';
import type { Quantity } from '../contracts/quantity.js';
import { convert, convertInterval } from '../quantities/convert.js';
import { printQuantity } from '../quantities/print.js';
import { requireRecord } from '../quantities/require.js';
import { limitReason, type Figures, type Limit } from './limit-reason.js';
import { floatNoise, requireLike, requireReading, requireUncertainty } from './reading-input.js';

export { agreementPossible } from './agreement-possible.js';

/**
 * Judges a reading at its limits with the tool's expanded uncertainty U (half width, k = 2) as guard band.
 *
 * `pass` when the reading is inside every limit by at least U, `fail` when it is beyond one by more than U,
 * `doubtful` between; a limit belongs to the good side. A band narrower than 2·U has no room for a pass:
 * `doubtful`, the tool is too coarse, wherever the reading lies. Without limits `not-judged`.
 * Units may differ among the figures; the uncertainty of a temperature is an interval.
 *
 * Throws `InputError` on `value`, `low`, `high`, `uncertainty` (and `.value`, `.unit` of each), and on
 * `low` when it is above `high`.
 * Source: the guard band w = U of ILAC-G8:09/2019, 4.2, with the same band on the far side of the limit
 * (from memory). Example: 55.4 N·m of 54 to 57 N·m with 1.1 N·m passes by 0.3 N·m.
 */
export function limitDecision(request: LimitDecisionRequest): LimitDecision {
  const figures = readFigures(request);
  const { value, limits, uncertainty } = figures;
  if (limits.length === 0) {
    return {
      verdict: 'not-judged',
      reason: `${printQuantity(figures.reading)} has no limit to be judged by: the figure is only recorded.`,
    };
  }
  const nearest = limits.reduce((a, b) => (inside(value, b) < inside(value, a) ? b : a));
  const clear = inside(value, nearest);
  const noise = floatNoise(value, nearest.at, uncertainty);
  const verdict = isTooCoarse(figures) ? 'too-coarse' : verdictOf(clear, uncertainty, noise);
  return {
    verdict: verdict === 'too-coarse' ? 'doubtful' : verdict,
    reason: limitReason(verdict, figures, nearest, Math.abs(clear) <= noise ? 0 : clear),
  };
}

function verdictOf(clear: number, uncertainty: number, noise: number): 'pass' | 'fail' | 'doubtful' {
  if (clear >= uncertainty - noise) return 'pass';
  return clear < -uncertainty - noise ? 'fail' : 'doubtful';
}

/** How far the value is on the good side of a limit; negative beyond it. */
function inside(value: number, limit: Limit): number {
  return limit.side === 'low' ? value - limit.at : limit.at - value;
}

function isTooCoarse({ limits, uncertainty }: Figures): boolean {
  const [low, high] = limits;
  if (low === undefined || high === undefined) return false;
  return high.at - low.at < 2 * uncertainty - floatNoise(low.at, high.at, uncertainty);
}

function readFigures(request: LimitDecisionRequest): Figures {
  const input = requireRecord(request, 'request');
  const reading = requireReading(input['value'], 'value');
  const limits = (['low', 'high'] as const).flatMap((side): Limit[] => {
    if (input[side] === undefined) return [];
    const given = requireLike(input[side], reading, side);
    return [{ side, given, at: convert(given, reading.unit).value }];
  });
  refuseCrossedLimits(limits);
  const uncertainty: Quantity | undefined =
    input['uncertainty'] === undefined
      ? undefined
      : requireUncertainty(input['uncertainty'], reading, 'uncertainty');
  return {
    reading,
    value: reading.value,
    limits,
    uncertainty: uncertainty === undefined ? 0 : convertInterval(uncertainty, reading.unit).value,
    uncertaintyGiven: uncertainty,
  };
}

function refuseCrossedLimits([low, high]: readonly Limit[]): void {
  if (low === undefined || high === undefined) return;
  if (low.at - high.at > floatNoise(low.at, high.at)) {
    throw new InputError(
      'low',
      `The low limit ${printQuantity(low.given)} is above the high limit ${printQuantity(high.given)}.`,
    );
  }
}
