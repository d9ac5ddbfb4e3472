/**
 * For tests: the largest distance between the figures of two like values (a figure, a list, or figures by name),
 * as a share of the expected figure where that is over 1. Infinite where they are not alike.
 */
export function apart(actual: unknown, expected: unknown): number {
  if (typeof actual === 'number' && typeof expected === 'number') {
    const distance = Math.abs(actual - expected) / Math.max(1, Math.abs(expected));
    return Number.isNaN(distance) ? Infinity : distance;
  }
  if (typeof actual !== 'object' || typeof expected !== 'object' || actual === null || expected === null) {
    return actual === expected ? 0 : Infinity;
  }
  const [ours, theirs] = [Object.entries(actual), Object.entries(expected)];
  if (ours.length !== theirs.length) return Infinity;
  return Math.max(
    0,
    ...theirs.map(([name, value]) => apart((actual as Record<string, unknown>)[name], value)),
  );
}
