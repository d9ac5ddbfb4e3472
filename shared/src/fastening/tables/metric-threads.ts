/**
 * ISO general purpose metric screw threads, M3 to M30: nominal diameter and pitches, mm.
 *
 * Source: ISO 261:1998, table 2, and ISO 262:1998, table 1; copied from memory. The first pitch of a size is the
 * coarse one, the others are fine.
 */
export const metricThreads = [
  { diameter: 3, pitches: [0.5, 0.35] },
  { diameter: 3.5, pitches: [0.6, 0.35] },
  { diameter: 4, pitches: [0.7, 0.5] },
  { diameter: 5, pitches: [0.8, 0.5] },
  { diameter: 6, pitches: [1, 0.75] },
  { diameter: 7, pitches: [1, 0.75] },
  { diameter: 8, pitches: [1.25, 1, 0.75] },
  { diameter: 9, pitches: [1.25, 1, 0.75] },
  { diameter: 10, pitches: [1.5, 1.25, 1, 0.75] },
  { diameter: 11, pitches: [1.5, 1, 0.75] },
  { diameter: 12, pitches: [1.75, 1.5, 1.25, 1] },
  { diameter: 14, pitches: [2, 1.5, 1.25, 1] },
  { diameter: 16, pitches: [2, 1.5, 1] },
  { diameter: 18, pitches: [2.5, 2, 1.5, 1] },
  { diameter: 20, pitches: [2.5, 2, 1.5, 1] },
  { diameter: 22, pitches: [2.5, 2, 1.5, 1] },
  { diameter: 24, pitches: [3, 2, 1.5, 1] },
  { diameter: 27, pitches: [3, 2, 1.5, 1] },
  { diameter: 30, pitches: [3.5, 3, 2, 1.5, 1] },
] as const satisfies readonly { readonly diameter: number; readonly pitches: readonly number[] }[];
