import type { Quantity } from '@second-spanner/shared/contracts/quantity';
import type { Limits } from '@second-spanner/shared/contracts/spec';
import { convert } from '@second-spanner/shared/quantities/convert';

/** How far from the middle the figures of a demo lie, as shares of the way to a limit. */
const spread = [0, 0.12, -0.1, 0.06, -0.14, 0.1, -0.04, 0.08];

const spreadAt = (index: number): number => spread[index % spread.length] ?? 0;

/** A figure well inside limits, a little different at every place. */
export function inside({ low, high }: Limits, index: number): Quantity {
  if (low && high) {
    const top = convert(high, low.unit).value;
    const middle = (low.value + top) / 2;
    return { value: middle + (spreadAt(index) * (top - low.value)) / 2, unit: low.unit };
  }
  if (high) return { value: high.value * (0.5 + spreadAt(index)), unit: high.unit };
  if (low) return { value: low.value * (1.4 + spreadAt(index)), unit: low.unit };
  throw new Error('The demo reads nothing that has no limits.');
}

/** A torque close to its target, a little different at every fastener. */
export const near = (target: Quantity, index: number): Quantity => ({
  value: target.value * (1 + spreadAt(index) / 20),
  unit: target.unit,
});
