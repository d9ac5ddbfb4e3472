/**
 * Nut factors K of T = K·d·F for steel on steel, by the condition of the threads and the face under the head.
 *
 * Common practice, no source. The nut factors that sources give for plated bolts differ by two to one, so there
 * is none here: it is an input, with its spread.
 */
export const nutFactors = {
  dry: { factor: 0.2, words: 'dry' },
  oiled: { factor: 0.15, words: 'oiled' },
  moly: { factor: 0.12, words: 'with moly paste' },
} as const;

/** How far a nut factor may be off either way, as a share: common practice, no source. */
export const usualSpread = 0.3;
