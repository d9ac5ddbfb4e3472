import { notFound } from '../errors/http-problem.js';

const uuid = /^[0-9a-f]{8}-[0-9a-f]{4}-[0-9a-f]{4}-[0-9a-f]{4}-[0-9a-f]{12}$/i;

/** Whether a text has the form of our ids. */
export const isId = (text: unknown): text is string => typeof text === 'string' && uuid.test(text);

/** An id from an address. What has not even the form of an id is not found. */
export function parseId(text: unknown, what: string): string {
  if (!isId(text)) throw notFound(what);
  return text.toLowerCase();
}

/** A whole number above zero from an address. */
export function parseNumber(text: unknown, what: string): number {
  const number = typeof text === 'string' && /^[1-9]\d{0,8}$/.test(text) ? Number(text) : undefined;
  if (number === undefined) throw notFound(what);
  return number;
}
