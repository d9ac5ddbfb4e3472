import { InputError } from '../contracts/input-error.js';
import { requireText } from './require.js';

/** An unknown input as a day of the calendar, `2026-12-01`. Throws `InputError` on `field`. */
export function requireDate(input: unknown, field: string): string {
  const text = requireText(input, field, { max: 40 });
  const [, year, month, day] = /^(\d{4})-(\d{2})-(\d{2})$/.exec(text) ?? [];
  const date = new Date(Date.UTC(Number(year), Number(month) - 1, Number(day)));
  if (Number.isNaN(date.getTime()) || date.toISOString().slice(0, 10) !== text) {
    throw new InputError(field, 'This must be a day of the calendar, such as 2026-12-01.');
  }
  return text;
}
