import { InputError } from '../contracts/input-error.js';
import type { Kind, Quantity } from '../contracts/quantity.js';
import type { Judgement, Verdict } from '../contracts/verdict.js';
import { toSi } from '../quantities/convert.js';
import { requireQuantity, requireRecord, type QuantityOptions } from '../quantities/require.js';
import { roundTo } from '../quantities/round.js';

export interface LimitsGiven {
  readonly low?: Quantity;
  readonly high?: Quantity;
}

/** Untrusted limits of one kind, either of which may be missing. Throws `InputError` on `field` and below. */
export function requireLimits(
  input: unknown,
  kind: Kind,
  field: string,
  options: QuantityOptions = {},
): LimitsGiven {
  if (input === undefined) return {};
  const { low, high } = requireRecord(input, field);
  const one = (limit: unknown, side: string): Quantity | undefined =>
    limit === undefined ? undefined : requireQuantity(limit, kind, `${field}.${side}`, options);
  const given = { low: one(low, 'low'), high: one(high, 'high') };
  if (given.low !== undefined && given.high !== undefined && toSi(given.low) > toSi(given.high)) {
    throw new InputError(`${field}.low`, 'The least must not be more than the most.');
  }
  return given;
}

/** An optional untrusted figure of one kind. Throws `InputError` on `field` and below. */
export function quantityIfGiven(
  input: unknown,
  kind: Kind,
  field: string,
  options: QuantityOptions = {},
): Quantity | undefined {
  return input === undefined ? undefined : requireQuantity(input, kind, field, options);
}

/** A difference without the digits that only subtracting doubles of this size left behind. */
export function withoutNoise(difference: number, ...figures: readonly number[]): number {
  const largest = Math.max(...figures.map(Math.abs), Math.abs(difference));
  if (largest === 0) return 0;
  return roundTo(difference, Math.max(0, 11 - Math.ceil(Math.log10(largest))));
}

const order: readonly Verdict[] = ['pass', 'not-judged', 'doubtful', 'fail'];

/** The worst of several verdicts; what could not be judged is worse than a pass. None at all is not judged. */
export function worstVerdict(judgements: readonly Pick<Judgement, 'verdict'>[]): Verdict {
  if (judgements.length === 0) return 'not-judged';
  const worst = Math.max(...judgements.map(({ verdict }) => order.indexOf(verdict)));
  return order[worst] ?? 'not-judged';
}

/** The reasons of the judgements as bad as the worst, one after the other. */
export function worstReasons(judgements: readonly Judgement[]): string {
  const worst = worstVerdict(judgements);
  return judgements
    .filter(({ verdict }) => verdict === worst)
    .map(({ reason }) => reason)
    .join(' ');
}
