import { expect, it } from 'vitest';
import { printable } from './fonts.js';

it.each([
  ['−12 µm ± 0.5°', '–12 µm ± 0.5°'],
  ['11.5 × 10⁻⁶ per K', '11.5 × 10^-6 per K'],
  ['mm², 10¹⁰', 'mm², 10^10'],
  ['√(U₁² + U₂²)', 'root (U1² + U2²)'],
  ['π·D·θ ÷ 360', 'pi·D·theta ÷ 360'],
  ['≤3', 'at most 3'],
  ['漢', '?'],
])('%s is printed as %s', (text, printed) => {
  expect(printable(text)).toBe(printed);
});
