import { Pipe, type PipeTransform } from '@angular/core';

const months = ['Jan', 'Feb', 'Mar', 'Apr', 'May', 'Jun', 'Jul', 'Aug', 'Sep', 'Oct', 'Nov', 'Dec'];

const two = (value: number): string => String(value).padStart(2, '0');

const clock = (date: Date): string => `${two(date.getHours())}:${two(date.getMinutes())}`;

/** `9 Dec`, with the year where it is another one than this. */
export function printDay(iso: string, now = new Date()): string {
  const date = new Date(iso);
  const day = `${date.getDate()} ${months[date.getMonth()] ?? ''}`;
  return date.getFullYear() === now.getFullYear() ? day : `${day} ${date.getFullYear()}`;
}

/** The time for today, else the day: `14:06` or `9 Dec`. */
export function printWhen(iso: string, now = new Date()): string {
  const date = new Date(iso);
  return date.toDateString() === now.toDateString() ? clock(date) : printDay(iso, now);
}

/** `9 Dec 2026, 14:06`: for records. */
export function printMoment(iso: string): string {
  const date = new Date(iso);
  return `${date.getDate()} ${months[date.getMonth()] ?? ''} ${date.getFullYear()}, ${clock(date)}`;
}

/** Times of the api in words: `iso | when` (default), `iso | when: 'day'`, `iso | when: 'moment'`. */
@Pipe({ name: 'when' })
export class When implements PipeTransform {
  transform(iso: string, style: 'when' | 'day' | 'moment' = 'when'): string {
    if (style === 'day') return printDay(iso);
    return style === 'moment' ? printMoment(iso) : printWhen(iso);
  }
}
