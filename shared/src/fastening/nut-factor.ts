import { InputError } from '../contracts/input-error.js';
import { printNumber } from '../quantities/print.js';
import { requireNumber, requireRecord } from '../quantities/require.js';
import { nutFactors } from './tables/nut-factors.js';

export interface NutFactor {
  readonly factor: number;
  /** `oiled (nut factor 0.15)`. */
  readonly words: string;
}

const conditions = ['dry', 'oiled', 'moly'] as const;

/**
 * The nut factor of a condition, or the one that is given.
 *
 * @throws InputError on `field` or `field.nutFactor`
 */
export function requireNutFactor(input: unknown, field: string): NutFactor {
  const condition = conditions.find((one) => one === input);
  if (condition !== undefined) {
    const { factor, words } = nutFactors[condition];
    return { factor, words: `${words} (nut factor ${printNumber(factor, 2)})` };
  }
  if (typeof input !== 'object' || input === null) {
    throw new InputError(
      field,
      `This must be ${conditions.join(', ')} or a nut factor, such as { "nutFactor": 0.18 }. ` +
        'Sources differ twofold on plated bolts: give the nut factor and its spread.',
    );
  }
  const factor = requireNumber(requireRecord(input, field)['nutFactor'], `${field}.nutFactor`, {
    min: 0.03,
    max: 1,
  });
  return { factor, words: `with a nut factor of ${factor}` };
}
