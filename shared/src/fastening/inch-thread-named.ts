import { InputError } from '../contracts/input-error.js';
import { nearest } from './nearest.js';
import type { InchThread } from './tables/inch-thread.js';
import { unifiedCoarse, unifiedFine } from './tables/unified-threads.js';
import { whitworthCoarse, whitworthFine } from './tables/whitworth-threads.js';
import { inch, threadOf, type Thread } from './thread.js';

type Series = 'UNC' | 'UNF' | 'BSW' | 'BSF';

const tables: Readonly<Record<Series, readonly InchThread[]>> = {
  UNC: unifiedCoarse,
  UNF: unifiedFine,
  BSW: whitworthCoarse,
  BSF: whitworthFine,
};
const allSeries: readonly Series[] = ['UNC', 'UNF', 'BSW', 'BSF'];

/** Other spellings of a series. */
const spellings: Readonly<Record<string, Series>> = {
  UNC: 'UNC',
  NC: 'UNC',
  UNF: 'UNF',
  NF: 'UNF',
  BSW: 'BSW',
  WHIT: 'BSW',
  WHITWORTH: 'BSW',
  W: 'BSW',
  BSF: 'BSF',
};

const written = new RegExp(
  '^(?<number>no\\.? ?|#)?(?<size>(?:\\d{1,2}[ -])?\\d{1,2}/\\d{1,2}|\\d{1,2}) ?(?:"|in(?:ch)?\\b)?' +
    '(?: ?[-x×] ?(?<perInch>\\d{1,2})(?: ?tpi)?)?(?: ?(?<series>[a-z]{1,9}))?\\.?$',
  'i',
);

interface Named {
  readonly size: string;
  readonly diameter: number;
  readonly perInch: number | undefined;
}

/** An inch thread of the tables; undefined where the text has not the form of one. */
export function inchThread(text: string, field: string): Thread | undefined {
  const groups = written.exec(text)?.groups;
  if (groups === undefined) return undefined;
  const named = namedBy(groups);
  if (!(named.diameter > 0 && named.diameter < Infinity)) {
    throw new InputError(field, `${named.size} is no size: write it like 3/8-16 UNC.`);
  }
  const word = groups['series'];
  if (word === undefined) throw new InputError(field, whichSeries(named));
  const series = spellings[word.toUpperCase()];
  if (series === undefined) {
    throw new InputError(
      field,
      `Threads ${word.toUpperCase()} are not in the tables; UNC, UNF, BSW and BSF are.`,
    );
  }
  const found = tables[series].find(({ diameter }) => isSame(diameter, named.diameter));
  if (found === undefined) throw new InputError(field, notThere(named, series));
  if (named.perInch !== undefined && named.perInch !== found.perInch) {
    throw new InputError(field, otherPitch(named, series, found));
  }
  return threadOf({
    name: nameOf(found, series),
    series,
    diameter: found.diameter * inch,
    pitch: inch / found.perInch,
    nominal: { value: found.diameter, unit: 'in' },
    perInch: found.perInch,
  });
}

/** A bare whole number over 2 is a number size: no bolt here is that many inches thick. */
function namedBy(groups: Readonly<Record<string, string | undefined>>): Named {
  const size = (groups['size'] ?? '').replace(/(\d)-(\d+\/)/, '$1 $2');
  const perInch = groups['perInch'] === undefined ? undefined : Number(groups['perInch']);
  const isNumber = !size.includes('/') && (groups['number'] !== undefined || Number(size) > 2);
  if (isNumber) return { size: `No. ${Number(size)}`, diameter: 0.06 + 0.013 * Number(size), perInch };
  const diameter = size
    .split(' ')
    .map((part) => {
      const [over = '', under = '1'] = part.split('/');
      return Number(over) / Number(under);
    })
    .reduce((sum, part) => sum + part, 0);
  return { size, diameter, perInch };
}

const isSame = (a: number, b: number): boolean => Math.abs(a - b) < 1e-6;
const nameOf = ({ size, perInch }: InchThread, series: Series): string => `${size}-${perInch} ${series}`;

/** The threads of all series that have this size, and so many threads an inch where that is known. */
function alike({ diameter, perInch }: Named): readonly string[] {
  return allSeries.flatMap((series) =>
    tables[series]
      .filter((one) => isSame(one.diameter, diameter) && (perInch ?? one.perInch) === one.perInch)
      .map((one) => nameOf(one, series)),
  );
}

function whichSeries(named: Named): string {
  const same = alike(named);
  const list = same.length > 0 ? same : alike({ ...named, perInch: undefined });
  return list.length === 0
    ? `${named.size} is not in the tables: write the size and the series, such as 3/8-16 UNC.`
    : `Write which thread it is: ${list.join(', ')}.`;
}

function notThere(named: Named, series: Series): string {
  const near = nearest(
    tables[series],
    named.diameter,
    ({ diameter }) => diameter,
    (one) => nameOf(one, series),
  );
  return `${named.size} ${series} is not in the tables; the nearest: ${near}.`;
}

function otherPitch(named: Named, series: Series, found: InchThread): string {
  const others = alike(named);
  const hint = others.length === 0 ? '' : ` With ${named.perInch} it is ${others.join(' or ')}.`;
  return `${named.size} ${series} has ${found.perInch} threads an inch, not ${named.perInch}.${hint}`;
}
