import type { Quantity } from '../contracts/quantity.js';
import type { Limits } from '../contracts/spec.js';
import { printNumber, printQuantity } from '../quantities/print.js';

/**
 * Limits as a manual prints them: `0.35 to 0.40 mm`, `at least 1 bar`, `at most 0.05 mm`. Two limits are printed to
 * the decimals of the finer one.
 */
export function printLimits({ low, high }: Limits): string {
  if (low && high) return printSpan(low, high);
  if (low) return `at least ${printQuantity(low)}`;
  if (high) return `at most ${printQuantity(high)}`;
  return 'no limit';
}

function printSpan(low: Quantity, high: Quantity): string {
  if (low.unit !== high.unit) return `${printQuantity(low)} to ${printQuantity(high)}`;
  const digits = Math.max(decimals(low.value), decimals(high.value));
  return `${printNumber(low.value, digits)} to ${printQuantity(high, { digits })}`;
}

const decimals = (value: number): number => (String(value).split('.')[1] ?? '').length;
