import type { SpecDocument } from '../../contracts/spec.js';
import { printQuantity } from '../../quantities/print.js';
import type { WorkingCase } from '../working.js';

/** A spec's measurements of one kind as cases: their two limits as `low` and `high`. Those with one limit are left out. */
export function limitsCases(
  { measurements }: SpecDocument,
  kind: 'lash' | 'preload',
): readonly { readonly name: string; readonly typed: WorkingCase }[] {
  return measurements.flatMap(({ key, name, limits }) => {
    const { low, high } = limits.value;
    if (!key.startsWith(`${kind}-`) || low === undefined || high === undefined) return [];
    return [{ name, typed: { low: printQuantity(low), high: printQuantity(high) } }];
  });
}
