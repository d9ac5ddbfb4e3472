import type { Quantity } from '../../contracts/quantity.js';
import type { CaseReader } from '../read-case.js';

/** The tolerance that was typed; a side left open is nothing where the other is there. */
export function toleranceOf(
  read: CaseReader,
  torque: Quantity,
): { readonly low: Quantity; readonly high: Quantity } | undefined {
  const [low, high] = [read.quantityIf('below'), read.quantityIf('above')];
  if (low === undefined && high === undefined) return undefined;
  const nothing: Quantity = { value: 0, unit: torque.unit };
  return { low: low ?? nothing, high: high ?? nothing };
}
