import { tradeText } from '../../contracts/trade-words.js';
import { describe, expect, it } from 'vitest';
import { spoken } from './spoken.js';

describe('sentences of the calculations in the person’s trade words', () => {
  it('have the words of the dialect, and the verb to lead stays', () => {
    const sentence = 'Exchange the leads at outlets A and B. Inside, outlets A and B lead to other posts.';
    expect(tradeText(spoken(sentence), 'american')).toBe(
      'Exchange the wires at towers A and B. Inside, towers A and B lead to other posts.',
    );
    expect(tradeText(spoken(sentence), 'british')).toBe(sentence);
  });
});
