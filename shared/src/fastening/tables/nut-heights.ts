/**
 * Greatest height m of hexagon nuts of style 1 by nominal diameter, mm; coarse and fine threads have the same.
 *
 * Source: ISO 4032:2012, table 1, and ISO 8673:2012, m max; copied from memory.
 */
export const nutHeights: ReadonlyMap<number, number> = new Map([
  [3, 2.4],
  [3.5, 2.8],
  [4, 3.2],
  [5, 4.7],
  [6, 5.2],
  [8, 6.8],
  [10, 8.4],
  [12, 10.8],
  [14, 12.8],
  [16, 14.8],
  [18, 15.8],
  [20, 18],
  [22, 19.4],
  [24, 21.5],
  [27, 23.8],
  [30, 25.6],
]);
