import { InputError } from '../contracts/input-error.js';
import { toSi } from '../quantities/convert.js';
import { requireQuantity } from '../quantities/require.js';

/** An open belt's two pulleys, metres. */
export interface OpenBelt {
  readonly driver: number;
  readonly driven: number;
  readonly centres: number;
}

/**
 * The pulleys of an open belt drive.
 *
 * @throws InputError on the three fields and below; on `centres` where the pulleys would overlap
 */
export function requireOpenBelt(given: Readonly<Record<string, unknown>>): OpenBelt {
  const length = (field: string): number =>
    toSi(requireQuantity(given[field], 'length', field, { zero: false }));
  const [driver, driven] = [length('driverDiameter'), length('drivenDiameter')];
  const centres = length('centres');
  if (centres < (driver + driven) / 2) {
    throw new InputError(
      'centres',
      'The pulleys would touch: their centres must be further apart than this.',
    );
  }
  return { driver, driven, centres };
}
