const factors = [64, 32, 24, 16, 12, 8, 4, 2, 1] as const;

/**
 * The largest usual factor by which lengths (drawing units) may be drawn too large without the longest exceeding
 * `room`; undefined where even their true length does.
 */
export function exaggeration(lengths: readonly number[], room: number): number | undefined {
  const longest = Math.max(0, ...lengths.map(Math.abs));
  return factors.find((factor) => longest * factor <= room);
}
