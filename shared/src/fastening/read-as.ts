import type { TorqueDoubt } from '../contracts/fastening.js';
import type { Quantity } from '../contracts/quantity.js';

/** Under this share of the proof load a clamp load holds no joint: common practice, no source. */
export const leastShare = 0.25;

/** A share is at a bound where it differs from it by less than this: what multiplying doubles leaves behind. */
const noise = 1e-9;

/** Whether the first of a share and its bound lies under the second; a share at its bound lies neither side. */
export const isUnder = (one: number, other: number): boolean => one < other - noise;

type ReadAs = NonNullable<TorqueDoubt['readAs']>;
const common: readonly ReadAs[] = ['N·m', 'lbf·ft', 'lbf·in', 'kgf·m'];

/**
 * The one other common unit in which the same number makes sense, where it makes none as it stands: between 25 %
 * of the proof load and the whole of it. Where two others do, nobody can tell, and there is no answer.
 */
export function readAs(torque: Quantity, shareIn: (torque: Quantity) => number): ReadAs | undefined {
  const makesSense = (unit: Quantity['unit']): boolean => {
    const share = shareIn({ value: torque.value, unit });
    return !isUnder(share, leastShare) && !isUnder(1, share);
  };
  if (makesSense(torque.unit)) return undefined;
  const others = common.filter((unit) => unit !== torque.unit && makesSense(unit));
  return others.length === 1 ? others[0] : undefined;
}
