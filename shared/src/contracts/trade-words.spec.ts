import { describe, expect, it } from 'vitest';
import { tradeText, tradeWords } from './trade-words.js';

describe('trade words', () => {
  // The pairs are common practice on either side of the ocean, no source.
  it('speaks the dialect of the shop', () => {
    const text = '{Inlet} {clearance}, crankshaft {end float}';
    expect(tradeText(text, 'british')).toBe('Inlet clearance, crankshaft end float');
    expect(tradeText(text, 'american')).toBe('Intake lash, crankshaft end play');
  });

  it('leaves what it does not know as it stands', () => {
    expect(tradeText('{nothing} {toString} {', 'american')).toBe('{nothing} {toString} {');
  });

  it('gives a whole sentence without a token left for every pair', () => {
    for (const word of Object.keys(tradeWords)) {
      expect(tradeText(`{${word}}`, 'american')).not.toMatch(/[{}]/);
    }
  });
});
