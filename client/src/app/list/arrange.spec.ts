import { describe, expect, it } from 'vitest';
import { arrange, type Columns } from './arrange';

interface Car {
  readonly code: string;
  readonly year: number;
}
const columns: Columns<Car> = { code: ({ code }) => code, year: ({ year }) => year };
const cars: readonly Car[] = [
  { code: 'LM-C10', year: 1967 },
  { code: 'LM-C2', year: 1961 },
  { code: 'LM-C1', year: 1969 },
];
const codes = (search: string, sort: string, page = 1, size = 10): readonly string[] =>
  arrange(cars, { search, sort, page }, columns, size).rows.map(({ code }) => code);

describe('a list', () => {
  it('sorts numbers in words by their size, both ways', () => {
    expect(codes('', 'code')).toEqual(['LM-C1', 'LM-C2', 'LM-C10']);
    expect(codes('', '-year')).toEqual(['LM-C1', 'LM-C10', 'LM-C2']);
  });

  it('stays as it came for a column it does not have', () => {
    expect(codes('', 'colour')).toEqual(['LM-C10', 'LM-C2', 'LM-C1']);
  });

  it('finds what holds every word, whatever its case', () => {
    expect(codes('lm 1961', '')).toEqual(['LM-C2']);
    expect(codes('lm 1999', '')).toEqual([]);
  });

  it('shows a page, and the last for one beyond it', () => {
    expect(codes('', 'code', 2, 2)).toEqual(['LM-C10']);
    expect(codes('', 'code', 9, 2)).toEqual(['LM-C10']);
    expect(arrange(cars, { search: '', sort: '', page: 1 }, columns, 2).pages).toBe(2);
  });
});
