/**
 * Fundamental deviations of shafts, µm, in the size bands of `tolerance-grades.ts`; r and s in finer ones.
 *
 * Source: ISO 286-1:2010, tables 4 and 5 (from memory). d to p compared with JIS B 0401:1999 (the same
 * deviations) as reprinted in a cutting-tool catalogue, `JIS` of the reference values; s with ANSI B4.2 as
 * reprinted in a mould-base catalogue of 2020, technical reference p. 294.
 */

/** How far the upper limit lies below the nominal size. */
export const below = {
  d: [20, 30, 40, 50, 65, 80, 100, 120, 145, 170],
  e: [14, 20, 25, 32, 40, 50, 60, 72, 85, 100],
  f: [6, 10, 13, 16, 20, 25, 30, 36, 43, 50],
  g: [2, 4, 5, 6, 7, 9, 10, 12, 14, 15],
  h: [0, 0, 0, 0, 0, 0, 0, 0, 0, 0],
} as const;

/** How far the lower limit lies above the nominal size; of k in the grades to IT7 alone, beyond them it is 0. */
export const above = {
  k: [0, 1, 1, 1, 2, 2, 2, 3, 3, 4],
  m: [2, 4, 6, 7, 8, 9, 11, 13, 15, 17],
  n: [4, 8, 10, 12, 15, 17, 20, 23, 27, 31],
  p: [6, 12, 15, 18, 22, 26, 32, 37, 43, 50],
} as const;

/** As `above`, in the bands of `fineBands`. */
export const aboveFine = {
  r: [10, 15, 19, 23, 28, 34, 41, 43, 51, 54, 63, 65, 68, 77, 80, 84],
  s: [14, 19, 23, 28, 35, 43, 53, 59, 71, 79, 92, 100, 108, 122, 130, 140],
} as const;

/** Upper end of each band of r and s, mm. */
export const fineBands = [3, 6, 10, 18, 30, 50, 65, 80, 100, 120, 140, 160, 180, 200, 225, 250] as const;
