/*
 * Unified inch screw threads, coarse and fine, No. 4 to 1 1/2 in.
 *
 * Source: ASME B1.1-2003, table 1; copied from memory. Number sizes are 0.060 in and 0.013 in a number.
 */
import type { InchThread } from './inch-thread.js';

/** UNC. */
export const unifiedCoarse: readonly InchThread[] = [
  { size: 'No. 4', diameter: 0.112, perInch: 40 },
  { size: 'No. 5', diameter: 0.125, perInch: 40 },
  { size: 'No. 6', diameter: 0.138, perInch: 32 },
  { size: 'No. 8', diameter: 0.164, perInch: 32 },
  { size: 'No. 10', diameter: 0.19, perInch: 24 },
  { size: 'No. 12', diameter: 0.216, perInch: 24 },
  { size: '1/4', diameter: 0.25, perInch: 20 },
  { size: '5/16', diameter: 0.3125, perInch: 18 },
  { size: '3/8', diameter: 0.375, perInch: 16 },
  { size: '7/16', diameter: 0.4375, perInch: 14 },
  { size: '1/2', diameter: 0.5, perInch: 13 },
  { size: '9/16', diameter: 0.5625, perInch: 12 },
  { size: '5/8', diameter: 0.625, perInch: 11 },
  { size: '3/4', diameter: 0.75, perInch: 10 },
  { size: '7/8', diameter: 0.875, perInch: 9 },
  { size: '1', diameter: 1, perInch: 8 },
  { size: '1 1/8', diameter: 1.125, perInch: 7 },
  { size: '1 1/4', diameter: 1.25, perInch: 7 },
  { size: '1 3/8', diameter: 1.375, perInch: 6 },
  { size: '1 1/2', diameter: 1.5, perInch: 6 },
];

/** UNF. */
export const unifiedFine: readonly InchThread[] = [
  { size: 'No. 4', diameter: 0.112, perInch: 48 },
  { size: 'No. 5', diameter: 0.125, perInch: 44 },
  { size: 'No. 6', diameter: 0.138, perInch: 40 },
  { size: 'No. 8', diameter: 0.164, perInch: 36 },
  { size: 'No. 10', diameter: 0.19, perInch: 32 },
  { size: 'No. 12', diameter: 0.216, perInch: 28 },
  { size: '1/4', diameter: 0.25, perInch: 28 },
  { size: '5/16', diameter: 0.3125, perInch: 24 },
  { size: '3/8', diameter: 0.375, perInch: 24 },
  { size: '7/16', diameter: 0.4375, perInch: 20 },
  { size: '1/2', diameter: 0.5, perInch: 20 },
  { size: '9/16', diameter: 0.5625, perInch: 18 },
  { size: '5/8', diameter: 0.625, perInch: 18 },
  { size: '3/4', diameter: 0.75, perInch: 16 },
  { size: '7/8', diameter: 0.875, perInch: 14 },
  { size: '1', diameter: 1, perInch: 12 },
  { size: '1 1/8', diameter: 1.125, perInch: 12 },
  { size: '1 1/4', diameter: 1.25, perInch: 12 },
  { size: '1 3/8', diameter: 1.375, perInch: 12 },
  { size: '1 1/2', diameter: 1.5, perInch: 12 },
];
