/** How a list is shown: what is looked for, by which column, which page (from 1). */
export interface Arrangement {
  readonly search: string;
  /** A column's name, with a minus before it from high to low; empty leaves the list as it came. */
  readonly sort: string;
  readonly page: number;
}

/** What a column sorts by. */
export type Columns<T> = Readonly<Record<string, (item: T) => string | number>>;

export interface Arranged<T> {
  readonly rows: readonly T[];
  /** How many were found on all pages. */
  readonly found: number;
  readonly page: number;
  readonly pages: number;
}

const inOrder = new Intl.Collator('en-GB', { numeric: true, sensitivity: 'base' });

/** One page of the items that hold every word looked for, sorted. A page beyond the last is the last. */
export function arrange<T>(
  items: readonly T[],
  { search, sort, page }: Arrangement,
  columns: Columns<T>,
  pageSize: number,
): Arranged<T> {
  const words = search.toLowerCase().split(/\s+/).filter(Boolean);
  const valuesOf = Object.values(columns);
  const found = items.filter((item) => {
    const text = valuesOf
      .map((value) => value(item))
      .join(' ')
      .toLowerCase();
    return words.every((word) => text.includes(word));
  });

  const column = columns[sort.replace(/^-/, '')];
  const sorted = column === undefined ? found : found.toSorted((a, b) => compare(column(a), column(b)));
  if (sort.startsWith('-')) sorted.reverse();

  const pages = Math.max(1, Math.ceil(sorted.length / pageSize));
  const shown = Math.min(Math.max(1, page), pages);
  const rows = sorted.slice((shown - 1) * pageSize, shown * pageSize);
  return { rows, found: sorted.length, page: shown, pages };
}

function compare(a: string | number, b: string | number): number {
  return typeof a === 'number' && typeof b === 'number' ? a - b : inOrder.compare(String(a), String(b));
}
