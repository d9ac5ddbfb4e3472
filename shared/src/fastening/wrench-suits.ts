import type { WrenchSuits, WrenchSuitsRequest } from '../contracts/fastening.js';
import type { Quantity } from '../contracts/quantity.js';
import type { Verdict } from '../contracts/verdict.js';
import { InputError } from '../contracts/input-error.js';
import { convert, toSi } from '../quantities/convert.js';
import { requireDate } from '../quantities/require-date.js';
import { requireNumber, requireOneOf, requireQuantity, requireRecord } from '../quantities/require.js';
import { requireTorqueLimits } from './torque-limits.js';
import {
  checkCalibration,
  checkDeviation,
  checkRange,
  checkResolution,
  type WrenchCase,
} from './wrench-checks.js';
import { wrenchDeviations, smallWrench } from './tables/wrench-deviations.js';
import { wrenchKinds } from './wrench-kinds.js';

/**
 * Whether a torque wrench suits a job: its range, what it may deliver at this torque against the tolerance, its
 * divisions, and whether it is in calibration. The verdict is the worst of the checks, and the reason theirs.
 * `delivers` is in the torque's unit; `deviation` and `ratio` (whole tolerance over whole deviation) are plain.
 * Without a deviation that of ISO 6789-1 for the kind and size is taken.
 *
 * @throws InputError on `torque`, `tolerance`, `wrench.kind`, `wrench.range`, `wrench.resolution`,
 * `wrench.deviation`, `wrench.calibrationDue`, `on`
 * Source: permissible deviations of ISO 6789-1:2017, 5.1.5 (from memory; reference I6789); divisions and
 * ratio common practice, no source.
 * Example: 8 N·m from a click wrench of 2 to 10 N·m: ±6 %, 7.52 to 8.48 N·m.
 */
export function wrenchSuits(request: WrenchSuitsRequest): WrenchSuits {
  const { given, assumed } = requireGiven(request);
  const { torque, limits, deviation } = given;
  const checks = [checkRange(given), checkDeviation(given), checkResolution(given), checkCalibration(given)];
  const verdict = worst(checks.map((check) => check.verdict));
  const telling = checks.filter((check) => check.verdict === verdict);
  return {
    verdict,
    reason: telling.map((check) => check.reason).join(' '),
    delivers: {
      low: { value: torque.value * (1 - deviation), unit: torque.unit },
      high: { value: torque.value * (1 + deviation), unit: torque.unit },
    },
    deviation,
    ratio:
      limits === undefined || deviation === 0
        ? null
        : (limits.below + limits.above) / (2 * deviation * torque.value),
    checks,
    assumed,
  };
}

/** What was not judged takes nothing away from what was. */
function worst(verdicts: readonly Verdict[]): Verdict {
  return (['fail', 'doubtful', 'pass'] as const).find((one) => verdicts.includes(one)) ?? 'not-judged';
}

function requireGiven(request: unknown): { given: WrenchCase; assumed: readonly string[] } {
  const input = requireRecord(request, 'request');
  const wrench = requireRecord(input['wrench'], 'wrench');
  const torque = requireQuantity(input['torque'], 'torque', 'torque', { zero: false });
  const kind = requireOneOf(wrench['kind'], wrenchKinds, 'wrench.kind');
  const range = requireRange(wrench['range']);
  const listed = wrenchDeviations[kind];
  const usual = toSi(range.high) <= smallWrench * (1 + 1e-9) ? listed.small : listed.large;
  const isGiven = wrench['deviation'] !== undefined;
  const given: WrenchCase = {
    torque,
    kind,
    range,
    limits: input['tolerance'] === undefined ? undefined : requireTorqueLimits(input['tolerance'], torque),
    resolution:
      wrench['resolution'] === undefined
        ? undefined
        : requireQuantity(wrench['resolution'], 'torque', 'wrench.resolution', { zero: false }),
    deviation: isGiven ? requireNumber(wrench['deviation'], 'wrench.deviation', { min: 0, max: 0.5 }) : usual,
    ...requireDates(wrench['calibrationDue'], input['on']),
  };
  const size = usual === listed.small ? 'up to' : 'over';
  return {
    given,
    assumed: isGiven
      ? []
      : [
          `Permissible deviation ±${usual * 100} %: ISO 6789-1, ${listed.type}, ${size} ${smallWrench} N·m at the top of its range.`,
        ],
  };
}

function requireRange(input: unknown): { low: Quantity; high: Quantity } {
  const range = requireRecord(input, 'wrench.range');
  const low = requireQuantity(range['low'], 'torque', 'wrench.range.low');
  const high = requireQuantity(range['high'], 'torque', 'wrench.range.high', { zero: false });
  if (convert(low, high.unit).value >= high.value) {
    throw new InputError('wrench.range.low', 'The bottom of the range must be less than its top.');
  }
  return { low, high };
}

function requireDates(due: unknown, on: unknown): Pick<WrenchCase, 'calibration'> {
  if (due === undefined) return { calibration: undefined };
  const calibrationDue = requireDate(due, 'wrench.calibrationDue');
  if (on === undefined) {
    throw new InputError('on', 'Give the day that the wrench is used: its calibration is judged by it.');
  }
  return { calibration: { due: calibrationDue, on: requireDate(on, 'on') } };
}
