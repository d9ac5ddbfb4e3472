import { InputError } from '../contracts/input-error.js';
import type { Quantity } from '../contracts/quantity.js';
import { convert } from '../quantities/convert.js';
import { printQuantity } from '../quantities/print.js';
import { requireQuantity, requireRecord } from '../quantities/require.js';

/** Each fastener's final torque; empty where none was given. */
export type Finals = ReadonlyMap<string, Quantity>;

export interface Tolerance {
  readonly low: Quantity;
  readonly high: Quantity;
}

/**
 * The final torque of each fastener: one for all, or by fastener and then complete.
 *
 * @throws InputError on `final`, `finals` or paths such as `finals.7`
 */
export function requireFinals(final: unknown, finals: unknown, fasteners: readonly string[]): Finals {
  if (final !== undefined && finals !== undefined) {
    throw new InputError('finals', 'Give one final torque or one for each fastener, not both.');
  }
  if (final !== undefined) {
    const torque = requireQuantity(final, 'torque', 'final', { zero: false });
    return new Map(fasteners.map((fastener) => [fastener, torque]));
  }
  if (finals === undefined) return new Map();
  const record = requireRecord(finals, 'finals', { max: fasteners.length });
  const unknown = Object.keys(record).find((name) => !fasteners.includes(name));
  if (unknown !== undefined) throw new InputError(`finals.${unknown}`, 'There is no such fastener.');
  return new Map(
    fasteners.map((fastener) => {
      const field = `finals.${fastener}`;
      if (record[fastener] === undefined) throw new InputError(field, 'This fastener has no final torque.');
      return [fastener, requireQuantity(record[fastener], 'torque', field, { zero: false })];
    }),
  );
}

/**
 * How far a final torque may be missed, below and above. Undefined where none was given.
 *
 * @throws InputError on `tolerance`, its sides, or `final` where there is no torque that it could stand round
 */
export function requireTolerance(input: unknown, finals: Finals): Tolerance | undefined {
  if (input === undefined) return undefined;
  const { low, high } = requireRecord(input, 'tolerance');
  const tolerance = {
    low: requireQuantity(low, 'torque', 'tolerance.low'),
    high: requireQuantity(high, 'torque', 'tolerance.high'),
  };
  if (finals.size === 0) throw new InputError('final', 'The tolerance stands round a final torque: give it.');
  for (const [fastener, final] of finals) {
    if (convert(tolerance.low, final.unit).value < final.value) continue;
    throw new InputError(
      'tolerance.low',
      `This must be less than the final torque of fastener ${fastener}, ${printQuantity(final)}.`,
    );
  }
  return tolerance;
}
