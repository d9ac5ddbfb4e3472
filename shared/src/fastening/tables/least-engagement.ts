import type { TappedMaterial } from '../../contracts/fastening.js';

/**
 * Least engagement of a bolt in a tapped hole, in nominal diameters, and what the material is called.
 *
 * Common practice, no source: shop rules differ, and a bolt of a high class needs more than one of a low.
 */
export const leastEngagement: Readonly<Record<TappedMaterial, { diameters: number; words: string }>> = {
  steel: { diameters: 1, words: 'steel' },
  'cast-iron': { diameters: 1.5, words: 'cast iron' },
  aluminium: { diameters: 2, words: 'aluminium' },
  brass: { diameters: 1.5, words: 'brass' },
};
