/** The names of the two listed sizes next to a size, the one below and the one above where there are both. */
export function nearest<T>(
  list: readonly T[],
  size: number,
  sizeOf: (one: T) => number,
  nameOf: (one: T) => string,
): string {
  const sorted = [...list].sort((a, b) => sizeOf(a) - sizeOf(b));
  const below = sorted.filter((one) => sizeOf(one) <= size).at(-1);
  const above = sorted.find((one) => sizeOf(one) > size);
  return [below, above]
    .filter((one) => one !== undefined)
    .map(nameOf)
    .join(' and ');
}
