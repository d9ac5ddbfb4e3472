/*
 * Screw threads of Whitworth form, coarse and fine, to 1 1/2 in.
 *
 * Source: BS 84:2007, tables of BSW and BSF; copied from memory.
 */
import type { InchThread } from './inch-thread.js';

/** BSW. */
export const whitworthCoarse: readonly InchThread[] = [
  { size: '1/8', diameter: 0.125, perInch: 40 },
  { size: '3/16', diameter: 0.1875, perInch: 24 },
  { size: '1/4', diameter: 0.25, perInch: 20 },
  { size: '5/16', diameter: 0.3125, perInch: 18 },
  { size: '3/8', diameter: 0.375, perInch: 16 },
  { size: '7/16', diameter: 0.4375, perInch: 14 },
  { size: '1/2', diameter: 0.5, perInch: 12 },
  { size: '9/16', diameter: 0.5625, perInch: 12 },
  { size: '5/8', diameter: 0.625, perInch: 11 },
  { size: '11/16', diameter: 0.6875, perInch: 11 },
  { size: '3/4', diameter: 0.75, perInch: 10 },
  { size: '7/8', diameter: 0.875, perInch: 9 },
  { size: '1', diameter: 1, perInch: 8 },
  { size: '1 1/8', diameter: 1.125, perInch: 7 },
  { size: '1 1/4', diameter: 1.25, perInch: 7 },
  { size: '1 1/2', diameter: 1.5, perInch: 6 },
];

/** BSF. */
export const whitworthFine: readonly InchThread[] = [
  { size: '3/16', diameter: 0.1875, perInch: 32 },
  { size: '7/32', diameter: 0.21875, perInch: 28 },
  { size: '1/4', diameter: 0.25, perInch: 26 },
  { size: '9/32', diameter: 0.28125, perInch: 26 },
  { size: '5/16', diameter: 0.3125, perInch: 22 },
  { size: '3/8', diameter: 0.375, perInch: 20 },
  { size: '7/16', diameter: 0.4375, perInch: 18 },
  { size: '1/2', diameter: 0.5, perInch: 16 },
  { size: '9/16', diameter: 0.5625, perInch: 16 },
  { size: '5/8', diameter: 0.625, perInch: 14 },
  { size: '11/16', diameter: 0.6875, perInch: 14 },
  { size: '3/4', diameter: 0.75, perInch: 12 },
  { size: '13/16', diameter: 0.8125, perInch: 12 },
  { size: '7/8', diameter: 0.875, perInch: 11 },
  { size: '1', diameter: 1, perInch: 10 },
  { size: '1 1/8', diameter: 1.125, perInch: 9 },
  { size: '1 1/4', diameter: 1.25, perInch: 9 },
  { size: '1 3/8', diameter: 1.375, perInch: 8 },
  { size: '1 1/2', diameter: 1.5, perInch: 8 },
];
