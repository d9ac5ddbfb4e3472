import { units } from '@second-spanner/shared/contracts/quantity';

/** A piece of a sentence: words, or a figure with its unit where it has one. */
export interface SentencePiece {
  readonly words?: string;
  readonly figure?: string;
  readonly unit?: string;
}

const escaped = (text: string): string => text.replace(/[.*+?^${}()|[\]\\]/g, String.raw`\$&`);

const unitNames = Object.values(units)
  .flat()
  .sort((a, b) => b.length - a.length)
  .map(escaped)
  .join('|');

/** Codes such as `T-07` and `LM-0147`, orders such as `1-3-4-2`, step codes, times and plain numbers. */
const figure = String.raw`[A-Z]{1,3}-\w*\d\w*|[±−+-]?\d+(?:[.,:/–-]\d+)*(?:°(?![CF]))?%?`;
const pattern = new RegExp(
  String.raw`(?<![\w.,-])(${figure})(?:[\s\u00A0\u2009]?(${unitNames}))?(?![A-Za-z])`,
  'g',
);

/** Parts a sentence into its words and its figures, in order, so that figures can be set as such. */
export function partFigures(sentence: string): readonly SentencePiece[] {
  const pieces: SentencePiece[] = [];
  let end = 0;
  for (const match of sentence.matchAll(pattern)) {
    if (match.index > end) pieces.push({ words: sentence.slice(end, match.index) });
    pieces.push({ figure: match[1], unit: match[2] });
    end = match.index + match[0].length;
  }
  if (end < sentence.length) pieces.push({ words: sentence.slice(end) });
  return pieces;
}
