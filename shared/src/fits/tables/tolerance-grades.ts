/**
 * Standard tolerance grades IT4 to IT11, µm, for sizes from 1 to 250 mm; IT4 stands only behind the holes' Δ.
 *
 * Source: ISO 286-1:2010, table 1 (from memory). IT6 to IT9 to 50 mm are those of T5-001 to T5-009; h4 to h9 of
 * a printed tool catalogue's shaft table say the same for IT4 to IT9 up to 250 mm, and its hole table H10 and H11
 * for IT10 and IT11.
 */

/** Upper end of each size band, mm, belonging to the band; the first begins at 1 mm. */
export const sizeBands = [3, 6, 10, 18, 30, 50, 80, 120, 180, 250] as const;

export const toleranceGrades = {
  4: [3, 4, 4, 5, 6, 7, 8, 10, 12, 14],
  5: [4, 5, 6, 8, 9, 11, 13, 15, 18, 20],
  6: [6, 8, 9, 11, 13, 16, 19, 22, 25, 29],
  7: [10, 12, 15, 18, 21, 25, 30, 35, 40, 46],
  8: [14, 18, 22, 27, 33, 39, 46, 54, 63, 72],
  9: [25, 30, 36, 43, 52, 62, 74, 87, 100, 115],
  10: [40, 48, 58, 70, 84, 100, 120, 140, 160, 185],
  11: [60, 75, 90, 110, 130, 160, 190, 220, 250, 290],
} as const satisfies Record<number, readonly number[]>;
