import { sizeBands, toleranceGrades } from './tables/tolerance-grades.js';

export type Grade = keyof typeof toleranceGrades;

/**
 * The standard tolerance of a grade for a nominal size: size in mm, from more than 0 to 250; tolerance in µm.
 * A size at the end of a band belongs to it. Source: ISO 286-1:2010, table 1 (see the table's head).
 *
 * @throws RangeError for a size over 250 mm, which the caller must have refused
 * Example: IT7 of 20 mm is 21 µm.
 */
export function standardTolerance(size: number, grade: Grade): number {
  const tolerance = toleranceGrades[grade][sizeBands.findIndex((end) => size <= end)];
  if (tolerance === undefined) throw new RangeError(`${size} mm is beyond the table of grades.`);
  return tolerance;
}
