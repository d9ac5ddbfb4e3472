/**
 * An angle within a round, whole or not, after a turn of so many degrees: past the end it goes on from the
 * beginning. `from` and `to` are the same place.
 */
export function turned(angle: number, by: number, { from, to }: { from: number; to: number }): number {
  const round = to - from;
  const on = angle + by;
  if (on >= from && on <= to) return tidy(on);
  return tidy(from + ((((on - from) % round) + round) % round));
}

/** Tenths of degrees that floating point makes of 0.1 + 0.2 are nobody's. */
const tidy = (angle: number): number => Number(angle.toFixed(6));
