/**
 * Square parallel keys by shaft diameter, inches, with the limits of key, slots and depths.
 *
 * Source: BS 46:Part 1:1958, square keys and keyways, as a reference page reprints it (`KEYB` of the reference
 * values).
 */
export interface BritishKey {
  readonly over: number;
  readonly upTo: number;
  /** Width and height, least and most. */
  readonly key: readonly [number, number];
  readonly shaftSlot: readonly [number, number];
  readonly shaftDepth: readonly [number, number];
  readonly hubSlot: readonly [number, number];
  readonly hubDepth: readonly [number, number];
}

type Pair = readonly [number, number];

const row = (
  [over, upTo]: Pair,
  key: Pair,
  shaftSlot: Pair,
  shaftDepth: Pair,
  hubSlot: Pair,
  hubDepth: Pair,
): BritishKey => ({ over, upTo, key, shaftSlot, shaftDepth, hubSlot, hubDepth });

export const britishKeys: readonly BritishKey[] = [
  row([0.25, 0.5], [0.125, 0.127], [0.124, 0.125], [0.072, 0.078], [0.125, 0.126], [0.06, 0.066]),
  row([0.5, 0.75], [0.188, 0.19], [0.187, 0.188], [0.107, 0.113], [0.188, 0.189], [0.088, 0.094]),
  row([0.75, 1], [0.25, 0.252], [0.249, 0.25], [0.142, 0.148], [0.25, 0.251], [0.115, 0.121]),
  row([1, 1.25], [0.312, 0.314], [0.311, 0.312], [0.177, 0.183], [0.312, 0.313], [0.142, 0.148]),
  row([1.25, 1.5], [0.375, 0.377], [0.374, 0.375], [0.213, 0.219], [0.375, 0.376], [0.169, 0.175]),
  row([1.5, 1.75], [0.438, 0.44], [0.437, 0.438], [0.248, 0.254], [0.438, 0.439], [0.197, 0.203]),
  row([1.75, 2], [0.5, 0.502], [0.499, 0.5], [0.283, 0.289], [0.5, 0.501], [0.224, 0.23]),
  row([2, 2.5], [0.625, 0.627], [0.624, 0.625], [0.354, 0.36], [0.625, 0.626], [0.278, 0.284]),
  row([2.5, 3], [0.75, 0.752], [0.749, 0.75], [0.424, 0.43], [0.75, 0.751], [0.333, 0.339]),
];
