import { describe, expect, it } from 'vitest';
import type { CapMapRequest } from '../contracts/calculations.js';
import { InputError } from '../contracts/input-error.js';
import { capMap } from './cap-map.js';

const four = { firingOrder: [1, 3, 4, 2], rotation: 'clockwise' };
const even = ['a', 'b', 'c', 'd'].map((post, i) => ({ post, angle: i * 90 }));
const withPost = (i: number, post: object): object => ({ posts: even.map((p, j) => (i === j ? post : p)) });
const aMegabyte = 'x'.repeat(1_000_000);

/** What is thrown for a request as it might come in: not bound to the type. */
function refusalOf(request: unknown): InputError {
  try {
    capMap(request as CapMapRequest);
  } catch (error) {
    if (error instanceof InputError) return error;
    throw error;
  }
  throw new Error('It was taken.');
}

describe('capMap refuses', () => {
  it.each<[string, unknown, string]>([
    ['nothing', undefined, 'request'],
    ['a list', [], 'request'],
    ['no order', { rotation: 'clockwise' }, 'firingOrder'],
    ['an empty order', { ...four, firingOrder: [] }, 'firingOrder'],
    [
      'a thousand cylinders',
      { ...four, firingOrder: Array.from({ length: 1000 }, (_, i) => i + 1) },
      'firingOrder',
    ],
    [
      'seventeen cylinders',
      { ...four, firingOrder: Array.from({ length: 17 }, (_, i) => i + 1) },
      'firingOrder',
    ],
    ['a cylinder twice', { ...four, firingOrder: [1, 3, 3, 2] }, 'firingOrder[2]'],
    ['a cylinder beyond the last', { ...four, firingOrder: [1, 3, 5, 2] }, 'firingOrder[2]'],
    ['half a cylinder', { ...four, firingOrder: [1, 3, 2.5, 2] }, 'firingOrder[2]'],
    ['NaN for a cylinder', { ...four, firingOrder: [Number.NaN] }, 'firingOrder[0]'],
    ['a label among numbers', { ...four, firingOrder: [1, 'L2'] }, 'firingOrder[1]'],
    ['a number among labels', { ...four, firingOrder: ['L1', 2] }, 'firingOrder[1]'],
    ['a label twice', { ...four, firingOrder: ['L1', 'L1'] }, 'firingOrder[1]'],
    ['an empty label', { ...four, firingOrder: ['L1', ' '] }, 'firingOrder[1]'],
    ['a label of a megabyte', { ...four, firingOrder: ['L1', aMegabyte] }, 'firingOrder[1]'],
    ['no rotation', { firingOrder: [1] }, 'rotation'],
    ['another rotation', { ...four, rotation: aMegabyte }, 'rotation'],
    ['another side', { ...four, rotationSeenFrom: 'below' }, 'rotationSeenFrom'],
    ['three strokes', { ...four, strokesPerCycle: 3 }, 'strokesPerCycle'],
    ['too few posts', { ...four, posts: even.slice(1) }, 'posts'],
    ['posts that are no list', { ...four, posts: 'abcd' }, 'posts'],
    ['a post twice', { ...four, ...withPost(3, { post: 'a', angle: 270 }) }, 'posts[3].post'],
    ['a post without a name', { ...four, ...withPost(0, { post: '', angle: 0 }) }, 'posts[0].post'],
    ['two posts at one angle', { ...four, ...withPost(3, { post: 'd', angle: 180 }) }, 'posts[3].angle'],
    ['0° and 360° at once', { ...four, ...withPost(3, { post: 'd', angle: 360 }) }, 'posts[3].angle'],
    ['an angle without end', { ...four, ...withPost(1, { post: 'b', angle: Infinity }) }, 'posts[1].angle'],
    ['an unknown first post', { ...four, firstPost: '5' }, 'firstPost'],
    ['a number for the first post', { ...four, firstPost: 1 }, 'firstPost'],
    ['too few intervals', { ...four, intervals: [360, 360] }, 'intervals'],
    ['intervals that miss the cycle', { ...four, intervals: [180, 180, 180, 170] }, 'intervals'],
    [
      'a four-stroke’s intervals on a two-stroke',
      { ...four, strokesPerCycle: 2, intervals: [180, 180, 180, 180] },
      'intervals',
    ],
    ['an interval of nothing', { ...four, intervals: [0, 360, 180, 180] }, 'intervals[0]'],
    ['an interval below nothing', { ...four, intervals: [-90, 450, 180, 180] }, 'intervals[0]'],
    ['NaN for an interval', { ...four, intervals: [180, Number.NaN, 180, 180] }, 'intervals[1]'],
    ['a trace that leaves a post out', { ...four, trace: { 1: 'A', 2: 'B', 3: 'C' } }, 'trace'],
    ['a trace with a post too many', { ...four, trace: { 1: 'A', 2: 'B', 3: 'C', 4: 'D', 5: 'E' } }, 'trace'],
    ['a trace of two posts to one outlet', { ...four, trace: { 1: 'A', 2: 'B', 3: 'A', 4: 'D' } }, 'trace.3'],
    ['a trace to no outlet', { ...four, trace: { 1: 'A', 2: 2, 3: 'C', 4: 'D' } }, 'trace.2'],
    [
      'a trace through a prototype',
      { ...four, trace: JSON.parse('{"__proto__":"A","1":"B"}') as unknown },
      'trace',
    ],
    ['a trace with a name of a megabyte', { ...four, trace: { [aMegabyte]: 'A' } }, 'trace'],
  ])('%s', (_, request, field) => {
    const refusal = refusalOf(request);
    expect(refusal.field).toBe(field);
    expect(refusal.message.length).toBeGreaterThan(10);
    expect(refusal.message.length).toBeLessThan(400);
  });

  it('says which cylinder stands twice, what the intervals make, and what posts there are', () => {
    expect(refusalOf({ ...four, firingOrder: [1, 3, 3, 2] }).message).toMatch(/place 2 .* place 3/);
    expect(refusalOf({ ...four, intervals: [180, 180, 180, 170] }).message).toMatch(/720°.*710°/);
    expect(refusalOf({ ...four, firstPost: '5' }).message).toContain('1, 2, 3 and 4');
  });
});
