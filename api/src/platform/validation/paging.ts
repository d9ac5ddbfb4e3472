import type { Page } from '@second-spanner/shared/contracts/paging';
import { badInput } from '../errors/http-problem.js';
import { isId } from './parse-id.js';

/** Which page of a list is asked for: the key after which it begins, and how many items. */
export interface Paging {
  readonly after: readonly string[] | null;
  readonly limit: number;
}

const usualLimit = 50;
const largestLimit = 200;

/** Whether a text can stand for a column of a cursor. */
type Part = (text: string) => boolean;

const anyText: Part = () => true;
const aTime: Part = (text) => /^\d{4}-\d\d-\d\dT[\d:.]+Z$/.test(text) && !Number.isNaN(Date.parse(text));
/** The columns of a list in order of time, such as the newest change first. */
export const byTime: readonly Part[] = [aTime, isId];

/** Reads `cursor` and `limit`; `parts` are the columns of the list's cursor. */
export function parsePaging(
  query: Readonly<Record<string, unknown>>,
  parts: readonly Part[] = [anyText],
): Paging {
  return { after: readCursor(query['cursor'], parts), limit: readLimit(query['limit']) };
}

/**
 * Makes a page from one row more than was asked for, which says whether there is a next page.
 * `key` gives a row's cursor, the same columns that the list is ordered by.
 */
export function pageOf<Row, T>(
  rows: readonly Row[],
  { limit }: Paging,
  key: (row: Row) => readonly string[],
  map: (row: Row) => T,
): Page<T> {
  const shown = rows.slice(0, limit);
  const last = shown.at(-1);
  const more = rows.length > limit && last !== undefined;
  return { items: shown.map(map), next: more ? writeCursor(key(last)) : null };
}

const writeCursor = (key: readonly string[]): string =>
  Buffer.from(JSON.stringify(key)).toString('base64url');

function readCursor(text: unknown, parts: readonly Part[]): readonly string[] | null {
  if (text === undefined) return null;
  const refusal = badInput({ field: 'cursor', message: 'This cursor is none that was given out here.' });
  if (typeof text !== 'string' || text.length > 500) throw refusal;
  let key: unknown;
  try {
    key = JSON.parse(Buffer.from(text, 'base64url').toString());
  } catch {
    throw refusal;
  }
  if (!Array.isArray(key) || key.length !== parts.length) throw refusal;
  const texts = key.filter(
    (text, column) => typeof text === 'string' && !text.includes('\0') && parts[column]?.(text),
  );
  if (texts.length !== parts.length) throw refusal;
  return texts;
}

function readLimit(text: unknown): number {
  if (text === undefined) return usualLimit;
  const limit = typeof text === 'string' && /^\d{1,3}$/.test(text) ? Number(text) : 0;
  if (limit < 1 || limit > largestLimit) {
    throw badInput({ field: 'limit', message: `This must be a whole number from 1 to ${largestLimit}.` });
  }
  return limit;
}
