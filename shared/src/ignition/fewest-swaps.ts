/**
 * The fewest exchanges of two leads that bring every lead home, done in the order listed.
 * @param fitted at each place, the number of the place where what is there belongs (a permutation of 0…n−1)
 * @returns pairs of places; as many as there are places, less the cycles of the permutation
 */
export function fewestSwaps(fitted: readonly number[]): (readonly [number, number])[] {
  const now = [...fitted];
  const swaps: (readonly [number, number])[] = [];
  now.forEach((_, place) => {
    const from = now.indexOf(place);
    if (from === place) return;
    const evicted = now[place];
    if (from < 0 || evicted === undefined) throw new RangeError('fewestSwaps needs a permutation');
    // The place's own lead comes home, so one exchange settles one place for good.
    now[from] = evicted;
    now[place] = place;
    swaps.push([place, from]);
  });
  return swaps;
}
