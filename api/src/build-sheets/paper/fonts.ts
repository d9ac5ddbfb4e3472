import { createRequire } from 'node:module';
import { readFileSync } from 'node:fs';
import { unwrapWoff } from './woff.js';

const require = createRequire(import.meta.url);
const read = (file: string): Buffer => unwrapWoff(readFileSync(require.resolve(file)));

/** The faces on paper. WOFF, for pdfkit takes no WOFF2; Latin subsets, so every text goes through `printable`. */
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
  '√': 'root ',
  '☑': 'x',
};

const hasGlyph = /[\u0020-\u007E\u00A0-\u00FF\u2013\u2014\u2018\u2019\u201C\u201D\u2022\u2026]/;

/** A text with only characters that every face can draw; what is unknown becomes a question mark. */
export function printable(text: string): string {
  return [...text]
    .map((character) => (hasGlyph.test(character) ? character : (replacements[character] ?? '?')))
    .join('');
}
