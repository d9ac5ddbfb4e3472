const words = /\b(leads?(?! to\b)|outlets?|inlet|clearances?|followers?|anticlockwise)\b/gi;

/** A sentence of the calculations with its trade words as tokens, so that it is set in the person's dialect. */
export function spoken(sentence: string): string {
  return sentence.replace(words, '{$1}');
}
