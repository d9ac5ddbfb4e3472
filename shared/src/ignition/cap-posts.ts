import type { CapPost, Rotation } from '../contracts/calculations.js';
import { InputError } from '../contracts/input-error.js';
import { around } from '../quantities/around.js';
import { requireList, requireNumber, requireRecord } from '../quantities/require.js';
import { requireName } from './firing-order.js';
import { named } from './words.js';

/** Two posts nearer than this stand at one angle, degrees. */
const sameAngle = 1e-6;

/**
 * An unknown input as the posts of a cap with `count` of them. Undefined gives `"1"…"n"` clockwise as seen
 * on the cap, evenly spaced, post 1 at 0°. Angles are brought into 0° to 360°.
 * Throws `InputError` on `field` or an item of it.
 */
export function requirePosts(input: unknown, count: number, field: string): readonly CapPost[] {
  if (input === undefined) {
    return Array.from({ length: count }, (_, i) => ({ post: String(i + 1), angle: (i * 360) / count }));
  }
  const items = requireList(input, field, { max: 1000 });
  if (items.length !== count) {
    throw new InputError(field, `The cap must have a post for each cylinder: ${count}, not ${items.length}.`);
  }
  const posts = items.map((item, i) => requirePost(item, `${field}[${i}]`));
  posts.forEach((post, i) => {
    refuseTwins(post, posts.slice(0, i), `${field}[${i}]`);
  });
  return posts;
}

function requirePost(input: unknown, field: string): CapPost {
  const given = requireRecord(input, field);
  const angle = requireNumber(given['angle'], `${field}.angle`, { min: -360, max: 360 });
  return { post: requireName(given['post'], `${field}.post`), angle: around(angle) };
}

function refuseTwins(post: CapPost, before: readonly CapPost[], field: string): void {
  if (before.some((other) => other.post === post.post)) {
    throw new InputError(`${field}.post`, `Post ${named(post.post)} is already in the list.`);
  }
  const twin = before.find((other) => {
    const apart = Math.abs(other.angle - post.angle);
    return Math.min(apart, 360 - apart) < sameAngle;
  });
  if (twin !== undefined) {
    throw new InputError(`${field}.angle`, `Post ${named(twin.post)} stands at this angle already.`);
  }
}

/** The posts in the order the rotor meets them, beginning with `first`; `rotation` as seen on the cap. */
export function asRotorMeets(
  posts: readonly CapPost[],
  first: CapPost,
  rotation: Rotation,
): readonly CapPost[] {
  const after = (post: CapPost): number => turnBetween(first.angle, post.angle, rotation);
  return [...posts].sort((a, b) => after(a) - after(b));
}

/** Degrees of cap from one angle to another the way the rotor turns, 0 to 360. */
export function turnBetween(from: number, to: number, rotation: Rotation): number {
  return around(rotation === 'clockwise' ? to - from : from - to);
}
