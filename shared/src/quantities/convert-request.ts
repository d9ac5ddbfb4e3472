import type { ConvertAnswer, ConvertRequest } from '../contracts/calculations.js';
import { convert } from './convert.js';
import { requireAnyQuantity, requireRecord, requireText } from './require.js';

/**
 * Answers the `convert` calculation for an untrusted request. Negative figures are taken.
 * Throws `InputError` on `quantity`, `quantity.value`, `quantity.unit` or `to`.
 */
export function convertRequest(request: ConvertRequest): ConvertAnswer {
  const { quantity, to } = requireRecord(request, 'request');
  const checked = requireAnyQuantity(quantity, 'quantity', { negative: true });
  return { quantity: convert(checked, requireText(to, 'to')) };
}
