import { InputError } from '../contracts/input-error.js';
import { clip } from '../quantities/clip.js';
import { requireText } from '../quantities/require.js';
import { inchThread } from './inch-thread-named.js';
import { metricThread } from './metric-thread-named.js';
import type { Thread } from './thread.js';

/**
 * A thread as a workshop writes it, from the tables: `M10x1.5`, `M10 x 1,5`, `M10` (the coarse one),
 * `3/8-16 UNC`, `3/8 UNF`, `7/16 BSF`, `1/4" BSW`, `No. 10-32 UNF`.
 *
 * @throws InputError on `field` (default `thread`) for a text that names no thread, and for a size that is not in
 * the tables, which names the nearest that are
 */
export function readThread(input: unknown, field = 'thread'): Thread {
  const text = requireText(input, field, { max: 40 })
    .replace(/[¼-¾⅐-⅞]/g, (sign) => ` ${sign.normalize('NFKC')}`)
    .replace(/[⁄∕]/g, '/')
    .replace(/[−–‒]/g, '-')
    .replace(/[″”“]|''/g, '"')
    .replace(/\s+/g, ' ')
    .trim();
  const thread = /^m ?\d/i.test(text) ? metricThread(text, field) : inchThread(text, field);
  if (thread !== undefined) return thread;
  throw new InputError(
    field,
    `“${clip(text)}” names no thread. Write it like M10x1.5, M8, 3/8-16 UNC, 3/8 UNF, 7/16 BSF or 1/4 BSW.`,
  );
}
