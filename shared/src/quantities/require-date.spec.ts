import { expect, it } from 'vitest';
import { InputError } from '../contracts/input-error.js';
import { requireDate } from './require-date.js';

it.each(['2026-12-01', '2024-02-29', '1961-01-31'])('%s is a day', (text) => {
  expect(requireDate(text, 'on')).toBe(text);
});

it.each([
  '2026-02-30',
  '2025-02-29',
  '2026-13-01',
  '2026-1-1',
  '01/12/2026',
  '2026-12-01T10:00Z',
  '',
  20261201,
])('%s is none', (input) => {
  expect(() => requireDate(input, 'on')).toThrow(InputError);
  expect(() => requireDate(input, 'on')).toThrow(expect.objectContaining({ field: 'on' }));
});
