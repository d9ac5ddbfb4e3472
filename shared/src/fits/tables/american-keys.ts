/**
 * Square parallel keys by shaft diameter, inches. The slot is half the key deep in the shaft, measured at the
 * slot's edge.
 *
 * Source: ANSI B17.1-1967 (R1998), table 1, as a reference page reprints it (`KEYA` of the reference values).
 */
export interface AmericanKey {
  readonly over: number;
  readonly upTo: number;
  /** Width and height. */
  readonly side: number;
}

export const americanKeys: readonly AmericanKey[] = [
  { over: 5 / 16, upTo: 7 / 16, side: 3 / 32 },
  { over: 7 / 16, upTo: 9 / 16, side: 1 / 8 },
  { over: 9 / 16, upTo: 7 / 8, side: 3 / 16 },
  { over: 7 / 8, upTo: 1.25, side: 1 / 4 },
  { over: 1.25, upTo: 1.375, side: 5 / 16 },
  { over: 1.375, upTo: 1.75, side: 3 / 8 },
  { over: 1.75, upTo: 2.25, side: 1 / 2 },
  { over: 2.25, upTo: 2.75, side: 5 / 8 },
  { over: 2.75, upTo: 3.25, side: 3 / 4 },
];
