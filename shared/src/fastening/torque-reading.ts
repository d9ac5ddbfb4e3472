import type { TorqueReading, TorqueReadingRequest } from '../contracts/fastening.js';
import { InputError } from '../contracts/input-error.js';
import type { Quantity } from '../contracts/quantity.js';
import { printNumber, printQuantity } from '../quantities/print.js';
import { requireNumber, requireOneOf, requireQuantity, requireRecord } from '../quantities/require.js';
import { judgePull } from './judge-pull.js';
import { requireTorqueLimits } from './torque-limits.js';
import { wrenchKinds } from './wrench-kinds.js';

/**
 * Judges what a torque wrench was set to, or what it showed. A click wrench proves its setting, not a reading; a
 * dial or digital one is read, and judged at the limits with its permissible deviation as uncertainty. A single
 * printed torque without a tolerance is judged by the wrench's class alone. A deviation that leaves no room
 * between the limits makes the wrench too coarse: `doubtful`. Torques in any units; `deviation` as a share.
 *
 * @throws InputError on `torque`, `tolerance`, `wrench.kind`, `wrench.deviation`, and on `setting` or `reading`,
 * whichever the wrench needs or cannot give
 * Source: the guard band of ILAC-G8:09/2019, 4.2 (from memory), with the deviation of ISO 6789-1.
 * Example: 27 lbf·ft ± 2, a digital wrench of 4 % that shows 27.4: pass.
 */
export function torqueReading(request: TorqueReadingRequest): TorqueReading {
  const given = requireRecord(request, 'request');
  const torque = requireQuantity(given['torque'], 'torque', 'torque', { zero: false });
  const limits =
    given['tolerance'] === undefined ? undefined : requireTorqueLimits(given['tolerance'], torque);
  const wrench = requireRecord(given['wrench'], 'wrench');
  const kind = requireOneOf(wrench['kind'], wrenchKinds, 'wrench.kind');
  const deviation = requireNumber(wrench['deviation'], 'wrench.deviation', { min: 0, max: 0.5 });
  const clicks = kind === 'click';
  const uncertaintyAt = ({ value, unit }: Quantity): Quantity => ({
    // Without the last digits, which only floating point made, so that a sentence does not print them.
    value: Number((value * deviation).toPrecision(12)),
    unit,
  });
  const judged = judgePull({
    wrench: 'The wrench',
    clicks,
    shown: requireShown(given, clicks),
    wanted: torque,
    lever: 1,
    low: limits?.low,
    high: limits?.high,
    uncertaintyAt,
    ...(limits === undefined && { allowed: uncertaintyAt(torque) }),
  });
  return { ...judged, rule: ruleOf(clicks, limits, deviation) };
}

function requireShown(given: Readonly<Record<string, unknown>>, clicks: boolean): Quantity {
  const [wanted, other] = clicks ? (['setting', 'reading'] as const) : (['reading', 'setting'] as const);
  if (given[other] !== undefined) {
    throw new InputError(
      other,
      clicks
        ? 'A click wrench proves its setting, not a reading: give what it was set to.'
        : 'A wrench that is read is judged by its reading: give what it showed.',
    );
  }
  return requireQuantity(given[wanted], 'torque', wanted, { zero: false });
}

function ruleOf(
  clicks: boolean,
  limits: { readonly low: Quantity; readonly high: Quantity } | undefined,
  deviation: number,
): string {
  const share = `±${printNumber(deviation * 100, 1).replace(/\.0$/, '')} %`;
  const judged = clicks ? 'The setting is judged, pulled once to the click' : 'The reading is judged';
  return limits === undefined
    ? `${judged}, by the wrench's own ${share} alone: no limits are printed.`
    : `${judged}, between ${printQuantity(limits.low)} and ${printQuantity(limits.high)}, ` +
        `with the wrench's ${share} kept clear inside both.`;
}
