import type { Dialect } from './people.js';

/** Pairs of trade words. A shop works in one column; quoted sources are never touched. */
export const tradeWords = {
  clearance: ['clearance', 'lash'],
  clearances: ['clearances', 'lash'],
  follower: ['follower', 'lifter'],
  followers: ['followers', 'lifters'],
  inlet: ['inlet', 'intake'],
  'HT lead': ['HT lead', 'plug wire'],
  'HT leads': ['HT leads', 'plug wires'],
  lead: ['lead', 'wire'],
  leads: ['leads', 'wires'],
  outlet: ['outlet', 'tower'],
  outlets: ['outlets', 'towers'],
  sump: ['sump', 'oil pan'],
  'end float': ['end float', 'end play'],
  'split pin': ['split pin', 'cotter pin'],
  'split pins': ['split pins', 'cotter pins'],
  'big end': ['big end', 'rod bearing'],
  'big ends': ['big ends', 'rod bearings'],
  'big-end': ['big-end', 'rod-bearing'],
  'gudgeon pin': ['gudgeon pin', 'wrist pin'],
  spanner: ['spanner', 'wrench'],
  anticlockwise: ['anticlockwise', 'counter-clockwise'],
  'gudgeon pins': ['gudgeon pins', 'wrist pins'],
  earth: ['earth', 'ground'],
  snag: ['snag', 'problem'],
  snags: ['snags', 'problems'],
} as const satisfies Record<string, readonly [string, string]>;

export type TradeWord = keyof typeof tradeWords;

/** The word that a dialect uses. */
export function tradeWord(word: TradeWord, dialect: Dialect): string {
  return tradeWords[word][dialect === 'british' ? 0 : 1];
}

const isTradeWord = (word: string): word is TradeWord => Object.hasOwn(tradeWords, word);

/** Replaces `{word}` tokens of a text; `{Word}` gives the word with a capital. Unknown tokens stay as they are. */
export function tradeText(text: string, dialect: Dialect): string {
  return text.replace(/\{([^{}]+)\}/g, (token, name: string) => {
    if (isTradeWord(name)) return tradeWord(name, dialect);
    const lower = name.charAt(0).toLowerCase() + name.slice(1);
    if (!isTradeWord(lower)) return token;
    const word = tradeWord(lower, dialect);
    return word.charAt(0).toUpperCase() + word.slice(1);
  });
}
