import type { CapMapRow, CapPost, Cylinder, Rotation, Side } from '../contracts/calculations.js';
import { InputError } from '../contracts/input-error.js';
import { requireOneOf, requireRecord } from '../quantities/require.js';
import { asRotorMeets, requirePosts } from './cap-posts.js';
import { requireTrace } from './cap-trace.js';
import { requireIntervals, type FiringIntervals } from './firing-intervals.js';
import { requireFiringOrder, requireName } from './firing-order.js';
import { listed, named } from './words.js';

const rotations: readonly Rotation[] = ['clockwise', 'anticlockwise'];
const sides: readonly Side[] = ['cap', 'drive'];

/** A cap with every choice made, turned to the view on the outside of the cap. */
export interface ResolvedCap {
  readonly order: readonly Cylinder[];
  /** As seen on the cap. */
  readonly rotation: Rotation;
  readonly rotationSeenFrom: Side;
  readonly strokesPerCycle: 2 | 4;
  /** Crank degrees in which every cylinder fires once. */
  readonly cycle: 360 | 720;
  readonly intervals: FiringIntervals;
  /** In the order the rotor meets the posts, beginning with the first cylinder of the order. */
  readonly rows: readonly CapMapRow[];
}

/**
 * Checks an unknown input as a cap-map request and makes every choice that it leaves open.
 * Throws `InputError` on the field that cannot be used.
 *
 * @param within path of the request inside a larger one, such as `cap`
 */
export function resolveCap(input: unknown, within?: string): ResolvedCap {
  const at = (field: string): string => (within === undefined ? field : `${within}.${field}`);
  const given = requireRecord(input, within ?? 'request');
  const { rotationSeenFrom = 'cap', strokesPerCycle: strokes = 4 } = given;
  const order = requireFiringOrder(given['firingOrder'], at('firingOrder'));
  const stated = requireOneOf(given['rotation'], rotations, at('rotation'));
  const side = requireOneOf(rotationSeenFrom, sides, at('rotationSeenFrom'));
  const rotation = side === 'cap' ? stated : reversed(stated);
  const strokesPerCycle = requireOneOf(strokes, [4, 2] as const, at('strokesPerCycle'));
  const cycle = strokesPerCycle === 4 ? 720 : 360;
  const intervals = requireIntervals(given['intervals'], order.length, cycle, at('intervals'));
  const posts = requirePosts(given['posts'], order.length, at('posts'));
  const first = requireFirstPost(given['firstPost'], posts, at('firstPost'));
  const trace = requireTrace(given['trace'], posts, at('trace'));
  const rows = asRotorMeets(posts, first, rotation).map(({ post, angle }, i): CapMapRow => {
    const cylinder = order[i];
    const firesAt = intervals.firesAt[i];
    const outlet = trace.get(post);
    if (cylinder === undefined || firesAt === undefined || outlet === undefined) {
      throw new InputError(at('posts'), 'Posts, cylinders and outlets must be as many.');
    }
    return { step: i + 1, post, angle, cylinder, firesAt, outlet };
  });
  return { order, rotation, rotationSeenFrom: side, strokesPerCycle, cycle, intervals, rows };
}

function requireFirstPost(input: unknown, posts: readonly CapPost[], field: string): CapPost {
  const name = input === undefined ? posts[0]?.post : requireName(input, field);
  const first = posts.find(({ post }) => post === name);
  if (first !== undefined) return first;
  const all = listed(posts.map(({ post }) => post));
  throw new InputError(field, `The cap has no post “${named(name ?? '')}”; its posts are ${all}.`);
}

/** The other way round. */
export function reversed(rotation: Rotation): Rotation {
  return rotation === 'clockwise' ? 'anticlockwise' : 'clockwise';
}
