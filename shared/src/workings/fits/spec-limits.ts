import type { Limits } from '../../contracts/spec.js';
import type { Quantity } from '../../contracts/quantity.js';
import { convert } from '../../quantities/convert.js';
import { printQuantity } from '../../quantities/print.js';

/** A spec's limits as they would be typed in two fields; an open one stays empty. */
export function typedLimits(
  { low, high }: Limits,
  lowName: string,
  highName: string,
): Record<string, string> {
  return {
    ...(low === undefined ? {} : { [lowName]: printQuantity(low) }),
    ...(high === undefined ? {} : { [highName]: printQuantity(high) }),
  };
}

/** The middle of a spec's limits, or its one limit, as it would be typed; empty without any. */
export function typedMiddle({ low, high }: Limits): string {
  const either = low ?? high;
  if (either === undefined) return '';
  if (low === undefined || high === undefined) return printQuantity(either);
  const middle: Quantity = { value: (low.value + convert(high, low.unit).value) / 2, unit: low.unit };
  return printQuantity(middle);
}
