import { InputError } from '../contracts/input-error.js';
import { requireList, requireText } from '../quantities/require.js';

/**
 * A sequence given by hand: every fastener once.
 *
 * @throws InputError on `sequence` or paths such as `sequence[3]`
 */
export function requireSequence(input: unknown, fasteners: readonly string[]): readonly string[] {
  const known = new Set(fasteners);
  const left = new Set(fasteners);
  const sequence = requireList(input, 'sequence', { min: 1, max: 1000 }).map((item, i) => {
    const field = `sequence[${i}]`;
    const fastener = requireText(item, field, { max: 40 });
    if (!known.has(fastener)) throw new InputError(field, `There is no fastener ${fastener}.`);
    if (!left.delete(fastener)) throw new InputError(field, `Fastener ${fastener} stands earlier already.`);
    return fastener;
  });
  if (left.size > 0) {
    const some = [...left].slice(0, 8).join(', ');
    throw new InputError('sequence', `Every fastener must stand in it once; left out: ${some}.`);
  }
  return sequence;
}
