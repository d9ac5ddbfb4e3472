import type { CapPost } from '../contracts/calculations.js';
import { InputError } from '../contracts/input-error.js';
import { requireRecord } from '../quantities/require.js';
import { requireName } from './firing-order.js';
import { listed, named } from './words.js';

/**
 * An unknown input as a trace: which outlet each post is joined to inside the cap, every post named and one
 * to one. Undefined joins each post to its own outlet. Throws `InputError` on `field` or `field.<post>`.
 */
export function requireTrace(
  input: unknown,
  posts: readonly CapPost[],
  field: string,
): ReadonlyMap<string, string> {
  if (input === undefined) return new Map(posts.map(({ post }) => [post, post]));
  const given = requireRecord(input, field);
  const names = posts.map(({ post }) => post);
  const stranger = Object.keys(given).find((post) => !names.includes(post));
  if (stranger !== undefined) {
    throw new InputError(field, `The cap has no post “${named(stranger)}”; its posts are ${listed(names)}.`);
  }
  const missing = names.filter((post) => given[post] === undefined);
  if (missing.length > 0) {
    throw new InputError(field, `A trace must name every post; ${listed(missing)} is missing.`);
  }
  const trace = new Map<string, string>();
  for (const post of names) {
    const outlet = requireName(given[post], `${field}.${post}`);
    const other = names.find((one) => trace.get(one) === outlet);
    if (other !== undefined) {
      const both = `posts ${named(other)} and ${named(post)}`;
      throw new InputError(
        `${field}.${post}`,
        `Each post has an outlet of its own; ${both} both lead to ${named(outlet)}.`,
      );
    }
    trace.set(post, outlet);
  }
  return trace;
}
