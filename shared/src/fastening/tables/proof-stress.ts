/*
 * Proof stress of bolts, screws and studs by property class or grade, in bands of the nominal diameter.
 *
 * Sources: ISO 898-1:2013, table 3, nominal stress under proof load Sp,nom; 10.9 and 12.9
 * compared with the reproduction ISO898S, 8.8 with the proof loads ISO898P, the others copied from memory.
 * SAE J429:2014, table 1; grades 2, 5 and 8 compared with the textbook table J429, the bands above 3/4 and 1 in
 * copied from memory.
 * Grades of old British standards are not here: no source for them was at hand.
 */

export interface ProofBand {
  /** Largest nominal diameter of the band, included: mm for a property class, inches for a grade. */
  readonly to: number;
  /** MPa for a property class, ksi for a grade. */
  readonly proof: number;
}

export interface ProofStress {
  readonly name: string;
  readonly standard: 'ISO 898-1' | 'SAE J429';
  /** Smallest nominal diameter that the standard covers, in the unit of the bands. */
  readonly from: number;
  readonly bands: readonly ProofBand[];
}

const iso = (name: string, ...bands: readonly ProofBand[]): ProofStress => ({
  name,
  standard: 'ISO 898-1',
  from: 1.6,
  bands,
});
const sae = (name: string, ...bands: readonly ProofBand[]): ProofStress => ({
  name,
  standard: 'SAE J429',
  from: 0.25,
  bands,
});

export const proofStresses: readonly ProofStress[] = [
  iso('4.6', { to: 39, proof: 225 }),
  iso('4.8', { to: 39, proof: 310 }),
  iso('5.6', { to: 39, proof: 280 }),
  iso('5.8', { to: 39, proof: 380 }),
  iso('6.8', { to: 39, proof: 440 }),
  iso('8.8', { to: 16, proof: 580 }, { to: 39, proof: 600 }),
  iso('9.8', { to: 16, proof: 650 }),
  iso('10.9', { to: 39, proof: 830 }),
  iso('12.9', { to: 39, proof: 970 }),
  sae('SAE 2', { to: 0.75, proof: 55 }, { to: 1.5, proof: 33 }),
  sae('SAE 5', { to: 1, proof: 85 }, { to: 1.5, proof: 74 }),
  sae('SAE 8', { to: 1.5, proof: 120 }),
];
