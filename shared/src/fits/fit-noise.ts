/**
 * Lengths closer than this are equal, metres: a thousandth of a nanometre, which no workshop measures and
 * which subtracting two sizes of metres as doubles does not reach.
 */
export const fitNoise = 1e-12;

/** A difference of lengths, metres, without what floating point alone has left of nothing. */
export function settled(difference: number): number {
  return Math.abs(difference) <= fitNoise ? 0 : difference;
}
