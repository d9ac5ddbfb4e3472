import { createRequire } from 'node:module';
import { readFileSync } from 'node:fs';
import { create, type Font } from 'fontkit';
import { unwrapWoff } from './woff.js';

/** What the Latin subsets can draw: ASCII, Latin 1, dashes, quotation marks, bullet and ellipsis. */
const drawable: readonly number[] = [
  ...range(0x20, 0x7e),
  ...range(0xa0, 0xff),
  ...[0x2013, 0x2014, 0x2018, 0x2019, 0x201c, 0x201d, 0x2022, 0x2026],
];

function range(first: number, last: number): readonly number[] {
  return Array.from({ length: last - first + 1 }, (_, index) => first + index);
}

const require = createRequire(import.meta.url);

/**
 * Parsed once, for every sheet that is printed. A glyph keeps the character that it was first asked for by, and none
 * when that was another glyph, as an Á asks for the A: so all are asked for here, or an A could not be found in the
 * sheets printed after.
 */
function read(file: string): Font {
  const font = create(unwrapWoff(readFileSync(require.resolve(file))));
  for (const character of drawable) font.glyphForCodePoint(character);
  return font;
}

/** The faces on paper. Latin subsets, so every text goes through `printable`. */
export const fonts = {
  text: read('@fontsource/barlow/files/barlow-latin-400-normal.woff'),
  'text-medium': read('@fontsource/barlow/files/barlow-latin-500-normal.woff'),
  'text-strong': read('@fontsource/barlow/files/barlow-latin-600-normal.woff'),
  plate: read('@fontsource/barlow-semi-condensed/files/barlow-semi-condensed-latin-500-normal.woff'),
  figures: read('@fontsource/roboto-mono/files/roboto-mono-latin-400-normal.woff'),
  'figures-medium': read('@fontsource/roboto-mono/files/roboto-mono-latin-500-normal.woff'),
} as const;

export type FontName = keyof typeof fonts;

/** What the subsets lack, in characters that they have. */
const replacements: Readonly<Record<string, string>> = {
  '\u2009': ' ',
  '\u202F': ' ',
  '≤': 'at most ',
  '≥': 'at least ',
  '→': ' to ',
  Ω: 'ohm',
  '−': '–',
  '‒': '–',
  '‑': '-',
  '√': 'root ',
  '≈': 'about ',
  '☑': 'x',
  '′': "'",
  '″': '"',
  '⁄': '/',
  '∕': '/',
  π: 'pi',
  θ: 'theta',
  α: 'alpha',
  φ: 'phi',
  λ: 'lambda',
  δ: 'delta ',
  Δ: 'delta ',
  Σ: 'sum of ',
};

const raised = '⁰¹²³⁴⁵⁶⁷⁸⁹';
const lowered = '₀₁₂₃₄₅₆₇₈₉';
/** A raised figure that the subsets lack, alone or in a run with those that they have. */
const raisedRun = /[⁰¹²³⁴-⁹]*[⁻⁰⁴-⁹][⁰¹²³⁴-⁹]*/g;

/** `10⁻⁶` as `10^-6`, `x₁` as `x1`. */
const onTheLine = (text: string): string =>
  text
    .replace(
      raisedRun,
      (run) => `^${[...run].map((sign) => (sign === '⁻' ? '-' : raised.indexOf(sign))).join('')}`,
    )
    .replace(/[₀-₉]/g, (figure) => String(lowered.indexOf(figure)));

const hasGlyph = new Set(drawable.map((code) => String.fromCodePoint(code)));

/** A text with only characters that every face can draw; what is unknown becomes a question mark. */
export function printable(text: string): string {
  return [...onTheLine(text)]
    .map((character) => (hasGlyph.has(character) ? character : (replacements[character] ?? '?')))
    .join('');
}
