import type { CapMapRow } from '../contracts/calculations.js';
import { InputError } from '../contracts/input-error.js';
import type { ResolvedCap } from './resolve-cap.js';
import { listed } from './words.js';

/**
 * An unknown input as a cylinder of a cap, with its post; left out, the first of the firing order.
 * Throws `InputError` on `field`.
 */
export function requireCylinderRow(cap: ResolvedCap, input: unknown, field: string): CapMapRow {
  const cylinder = input ?? cap.order[0];
  const row = cap.rows.find((one) => one.cylinder === cylinder);
  if (row !== undefined) return row;
  throw new InputError(field, `This must be a cylinder of the firing order: ${listed(cap.order)}.`);
}
