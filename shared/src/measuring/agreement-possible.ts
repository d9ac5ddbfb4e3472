import type { Quantity } from '../contracts/quantity.js';
import { convert, convertInterval, kindOf } from '../quantities/convert.js';
import { floatNoise, requireLike, requireUncertainty } from './reading-input.js';

/**
 * Whether a tool is fine enough for a second person's reading to mean something: its expanded uncertainty
 * (k = 2, half width) is at most a quarter of the tolerance, high less low. Asked of each of the two tools.
 * With one limit only, the tolerance is that limit's distance from zero, which a temperature has not; without
 * limits there is nothing to hold the tool against: false.
 * Throws `InputError` on `uncertainty`, `low` or `high`. Source: common practice (four to one), no source.
 */
export function agreementPossible(uncertainty: Quantity, low?: Quantity, high?: Quantity): boolean {
  const given = low ?? high;
  if (given === undefined) return false;
  const unit = given.unit;
  const half = convertInterval(requireUncertainty(uncertainty, given, 'uncertainty'), unit).value;
  const at = (limit: Quantity | undefined, field: string): number | undefined =>
    limit === undefined ? undefined : convert(requireLike(limit, given, field), unit).value;
  const [least, most] = [at(low, 'low'), at(high, 'high')];
  if (least !== undefined && most !== undefined) return 4 * half <= most - least + floatNoise(least, most);
  if (kindOf(unit) === 'temperature') return false;
  return 4 * half <= Math.abs(least ?? most ?? 0);
}
