import { describe, expect, it } from 'vitest';
import { printDay, printMoment, printWhen } from './dates';

const now = new Date(2026, 11, 9, 18, 0);
const at = (year: number, month: number, day: number): string =>
  new Date(year, month - 1, day, 14, 6).toISOString();

describe('times in words', () => {
  it('are the clock for today and the day before it', () => {
    expect(printWhen(at(2026, 12, 9), now)).toBe('14:06');
    expect(printWhen(at(2026, 12, 8), now)).toBe('8 Dec');
  });

  it('name another year', () => {
    expect(printDay(at(2025, 3, 14), now)).toBe('14 Mar 2025');
  });

  it('are whole in records', () => {
    expect(printMoment(at(2026, 12, 9))).toBe('9 Dec 2026, 14:06');
  });
});
