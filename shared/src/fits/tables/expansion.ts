import type { ExpandingMaterial } from '../../contracts/fits.js';

/**
 * Mean coefficients of linear expansion near room temperature, 10⁻⁶ per kelvin. Several a material, as its
 * alloys differ; a calculation of how far to heat or cool takes the least, which never asks for too little.
 *
 * Sources: Fundamentals of Materials Science and Engineering, 3rd ed., table B.6 (`CTE2` of the reference
 * values) and a handbook table (`CTE1`, also its sheet of copper alloys); a list of generic values
 * (`CTE3`); plain steel from the same book's 1020 (from memory).
 */
export interface Expansion {
  readonly material: ExpandingMaterial;
  readonly alloy: string;
  readonly coefficient: number;
  readonly source: string;
}

export const expansions: readonly Expansion[] = [
  {
    material: 'steel',
    alloy: 'plain carbon steel',
    coefficient: 11.7,
    source: 'textbook table, 1020, from memory',
  },
  { material: 'grey-iron', alloy: 'grey iron castings', coefficient: 11.4, source: 'handbook table' },
  { material: 'grey-iron', alloy: 'grey iron, generic', coefficient: 10.8, source: 'list of generic values' },
  { material: 'ductile-iron', alloy: '60-40-18', coefficient: 11.2, source: 'textbook table B.6' },
  { material: 'ductile-iron', alloy: '80-55-06', coefficient: 10.6, source: 'textbook table B.6' },
  { material: 'aluminium', alloy: '356, cast', coefficient: 21.5, source: 'textbook table B.6' },
  { material: 'aluminium', alloy: '6061', coefficient: 23.6, source: 'textbook table B.6' },
  { material: 'aluminium', alloy: '1100', coefficient: 23.6, source: 'textbook table B.6' },
  { material: 'aluminium', alloy: 'generic', coefficient: 24, source: 'list of generic values' },
  { material: 'bronze', alloy: 'bearing bronze', coefficient: 18, source: 'textbook table B.6' },
  { material: 'bronze', alloy: 'phosphor bronze', coefficient: 17.3, source: 'handbook table' },
  { material: 'brass', alloy: 'generic', coefficient: 19, source: 'list of generic values' },
  { material: 'brass', alloy: 'cartridge brass', coefficient: 19.9, source: 'textbook table B.6' },
];
