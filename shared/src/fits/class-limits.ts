import { InputError } from '../contracts/input-error.js';
import { clip } from '../quantities/clip.js';
import { standardTolerance, type Grade } from './standard-tolerance.js';
import { above, aboveFine, below, fineBands } from './tables/shaft-deviations.js';
import { sizeBands } from './tables/tolerance-grades.js';

/** From the nominal size, µm. */
export interface Deviations {
  readonly lower: number;
  readonly upper: number;
}

const letters = ['d', 'e', 'f', 'g', 'h', 'js', 'k', 'm', 'n', 'p', 'r', 's'] as const;
type Letter = (typeof letters)[number];
const leastGrade = 5;
const mostGrade = 11;
export const leastSize = 1;
export const mostSize = 250;

/**
 * Limits of an ISO 286 tolerance class: nominal size in mm, from 1 to 250; deviations in µm. Holes D to H, JS, K,
 * M, N, P, R, S and shafts d to h, js, k, m, n, p, r, s in grades 5 to 11; no hole K coarser than 8 over 3 mm,
 * as the standard gives none.
 *
 * A shaft's fundamental deviation comes from the table. A hole's is its mirror image, save that K, M and N to
 * grade 8 and P, R and S to grade 7 are raised by Δ = IT(n) − IT(n − 1) over 3 mm, and N coarser than 8 has its
 * upper limit at the nominal size. JS is halved exactly; older prints round half micrometres down.
 *
 * @throws InputError on `field.class` for a class that is not there, on `field.size` for a size that is not
 * Source: ISO 286-1:2010, 4.3.2.5 and tables 1 to 5 (from memory; what they are compared with, at their heads).
 * Example: 40 mm H7 is 0 to +25 µm, K7 −18 to +7 µm, p6 +26 to +42 µm.
 */
export function classLimits(size: number, code: string, of: 'hole' | 'shaft', field: string): Deviations {
  const { letter, grade } = readClass(code, of, `${field}.class`);
  if (!(size >= leastSize && size <= mostSize)) {
    throw new InputError(`${field}.size`, `The classes held here run from ${leastSize} to ${mostSize} mm.`);
  }
  const width = standardTolerance(size, grade);
  if (letter === 'js') return { lower: -width / 2, upper: width / 2 };
  if (letter in below) {
    const away = below[letter as keyof typeof below][bandOf(size, sizeBands)] ?? 0;
    return of === 'hole' ? { lower: away, upper: away + width } : { lower: -away - width, upper: 0 - away };
  }
  if (of === 'shaft') {
    const lower = letter === 'k' && grade > 7 ? 0 : raised(letter, size);
    return { lower, upper: lower + width };
  }
  const upper = tightHole(letter, grade, size, `${field}.class`);
  return { lower: upper - width, upper };
}

function readClass(code: string, of: 'hole' | 'shaft', field: string): { letter: Letter; grade: Grade } {
  const [, written = '', digits = ''] = /^([A-Za-z]{1,2})(\d{1,2})$/.exec(code.trim()) ?? [];
  const letter = letters.find((one) => one === written.toLowerCase());
  const isOther =
    written !== '' && written !== (of === 'hole' ? written.toUpperCase() : written.toLowerCase());
  if (letter !== undefined && isOther) {
    const [capital, example] = of === 'hole' ? ['a capital', 'H7'] : ['a small', 'h6'];
    throw new InputError(field, `The class of a ${of} has ${capital} letter, such as ${example}.`);
  }
  const grade = Number(digits);
  if (letter === undefined || !(grade >= leastGrade && grade <= mostGrade)) {
    const known = letters.map((one) => (of === 'hole' ? one.toUpperCase() : one)).join(', ');
    throw new InputError(
      field,
      `There is no class “${clip(code)}” here: ${known}, each with a grade from ${leastGrade} to ${mostGrade}.`,
    );
  }
  return { letter, grade: grade as Grade };
}

const bandOf = (size: number, bands: readonly number[]): number => bands.findIndex((end) => size <= end);

/** How far a shaft k to s is above its nominal size, of k as in its finer grades. */
function raised(letter: Letter, size: number): number {
  const fine = letter === 'r' || letter === 's';
  const found = fine
    ? aboveFine[letter][bandOf(size, fineBands)]
    : above[letter as keyof typeof above][bandOf(size, sizeBands)];
  return found ?? 0;
}

/** Upper deviation of a hole K to S. */
function tightHole(letter: Letter, grade: Grade, size: number, field: string): number {
  const isSmall = size <= 3;
  if (letter === 'k' && grade > 8 && !isSmall) {
    throw new InputError(field, 'Over 3 mm there is no hole K coarser than K8.');
  }
  if (letter === 'n' && grade > 8 && !isSmall) return 0;
  const coarsestRaised = ['k', 'm', 'n'].includes(letter) ? 8 : 7;
  const isRaised = grade <= coarsestRaised && !isSmall;
  const delta = isRaised ? standardTolerance(size, grade) - standardTolerance(size, (grade - 1) as Grade) : 0;
  return delta - raised(letter, size);
}
