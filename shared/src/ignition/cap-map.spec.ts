import { describe, expect, it } from 'vitest';
import type { CapMapRequest, Cylinder, Rotation } from '../contracts/calculations.js';
import { capMap } from './cap-map.js';

/** The cylinders round the cap as a person reads them: clockwise, from the first post on. */
const readClockwise = (request: CapMapRequest): readonly Cylinder[] =>
  [...capMap(request).rows].sort((a, b) => a.angle - b.angle).map(({ cylinder }) => cylinder);

const inOrder = (firingOrder: readonly Cylinder[], rotation: Rotation = 'clockwise'): CapMapRequest => ({
  firingOrder,
  rotation,
});

/** Posts spaced like `gaps`, clockwise from 0°. */
const spaced = (gaps: readonly number[]): { post: string; angle: number }[] =>
  gaps.map((_, i) => ({ post: `P${i + 1}`, angle: gaps.slice(0, i).reduce((sum, gap) => sum + gap, 0) }));

describe('capMap, against published orders', () => {
  // T2-042 to T2-046. Orders: "Firing order", encyclopedia copy of 2010 (W-FO2010); article on V8 orders (CP-FO).
  // The order on the cap follows from the definition: for a rotor that turns anticlockwise, reversed after No. 1.
  it.each([
    ['1-3-4-2 clockwise', [1, 3, 4, 2], 'clockwise', [1, 3, 4, 2]],
    ['1-3-4-2 anticlockwise', [1, 3, 4, 2], 'anticlockwise', [1, 2, 4, 3]],
    ['1-5-3-6-2-4 anticlockwise', [1, 5, 3, 6, 2, 4], 'anticlockwise', [1, 4, 2, 6, 3, 5]],
    ['V8 clockwise', [1, 8, 4, 3, 6, 5, 7, 2], 'clockwise', [1, 8, 4, 3, 6, 5, 7, 2]],
    ['V8 anticlockwise', [1, 5, 4, 2, 6, 3, 7, 8], 'anticlockwise', [1, 8, 7, 3, 6, 2, 4, 5]],
  ] as const)('reads %s round the cap', (_, order, rotation, expected) => {
    expect(readClockwise(inOrder(order, rotation))).toEqual(expected);
  });

  // Posts 45° apart on a V8's cap: definition, 360° over eight posts.
  it('puts the posts of an eight 45° apart', () => {
    const { rows } = capMap(inOrder([1, 8, 4, 3, 6, 5, 7, 2]));
    expect(rows.map(({ angle }) => angle)).toEqual([0, 45, 90, 135, 180, 225, 270, 315]);
  });

  // T2-021, T2-022, T2-024. Firing interval 720/n of crank and 360/n of cap: technical-exam study cards (CRAM);
  // for the six also an article on odd-fire V6 engines (ODD): 120° of crank, 60° of cap.
  it.each([
    [[1, 2, 4, 5, 3], 144, 72],
    [[1, 5, 3, 6, 2, 4], 120, 60],
    [[1, 10, 9, 4, 3, 6, 5, 8, 7, 2], 72, 36],
  ])('gives the interval of %j', (order, crank, distributor) => {
    expect(capMap(inOrder(order))).toMatchObject({
      verdict: 'pass',
      crankInterval: crank,
      distributorInterval: distributor,
    });
  });

  // T2-026, T2-027, T2-032, T2-035. Halderman & Linder, Automotive Fuel and Emissions Control Systems, p. 361
  // (HALD); article on valve setting by overlap (CUM); V8 and V12 worked out from published orders (CP-FO, W-FO2010).
  it.each([
    [
      [1, 6, 5, 4, 3, 2],
      [
        [1, 4],
        [3, 6],
        [2, 5],
      ],
    ],
    [
      [1, 5, 3, 6, 2, 4],
      [
        [1, 6],
        [2, 5],
        [3, 4],
      ],
    ],
    [
      [1, 8, 7, 2, 6, 5, 4, 3],
      [
        [1, 6],
        [5, 8],
        [4, 7],
        [2, 3],
      ],
    ],
    [
      [1, 7, 5, 11, 3, 9, 6, 12, 2, 8, 4, 10],
      [
        [1, 6],
        [7, 12],
        [2, 5],
        [8, 11],
        [3, 4],
        [9, 10],
      ],
    ],
  ])('pairs the companions of %j', (order, pairs) => {
    const sorted = (list: readonly (readonly Cylinder[])[]): string[] => list.map((p) => p.join('+')).sort();
    expect(sorted(capMap(inOrder(order)).companions)).toEqual(sorted(pairs));
  });
});

describe('capMap of engines that fire unevenly', () => {
  // T2-054. Odd-fire V6: the cap's spacing is half of the crank interval, 45° and 75° (from memory, no source).
  it('passes an odd-fire six on a cap spaced 45° and 75°', () => {
    const map = capMap({
      ...inOrder([1, 6, 5, 4, 3, 2]),
      intervals: [90, 150, 90, 150, 90, 150],
      posts: spaced([45, 75, 45, 75, 45, 75]),
    });
    expect(map).toMatchObject({ verdict: 'pass', crankInterval: null, distributorInterval: null });
    expect(map.rows.map(({ firesAt }) => firesAt)).toEqual([0, 90, 240, 330, 480, 570]);
  });

  it('doubts the same engine on an even cap and on one turned the other way', () => {
    const engine = { ...inOrder([1, 6, 5, 4, 3, 2]), intervals: [90, 150, 90, 150, 90, 150] };
    expect(capMap(engine).verdict).toBe('doubtful');
    expect(capMap(engine).reason).toMatch(/60°.*90° of crank.*45°/);
    const otherWay: CapMapRequest = {
      ...engine,
      rotation: 'anticlockwise',
      posts: spaced([45, 75, 45, 75, 45, 75]),
    };
    expect(capMap(otherWay).verdict).toBe('doubtful');
  });

  // T2-037. V10 of 54° and 90°: five intervals make 342° or 378°, never 360° (from memory, no source).
  it('finds no companions in a V10 of 54° and 90°', () => {
    const map = capMap({
      ...inOrder([1, 10, 9, 4, 3, 6, 5, 8, 7, 2]),
      intervals: [54, 90, 54, 90, 54, 90, 54, 90, 54, 90],
      posts: spaced([27, 45, 27, 45, 27, 45, 27, 45, 27, 45]),
    });
    expect(map).toMatchObject({ verdict: 'pass', companions: [] });
  });

  // T2-056. V-twin with one crank pin and 45° between the cylinders: 360 − 45 and 360 + 45, by definition.
  it('maps a V-twin that fires at 315° and 405°', () => {
    const twin = { ...inOrder([1, 2]), intervals: [315, 405] };
    expect(capMap({ ...twin, posts: spaced([157.5, 202.5]) })).toMatchObject({
      verdict: 'pass',
      companions: [],
    });
    expect(capMap(twin).verdict).toBe('doubtful');
  });

  // The tolerance of 2° of distributor is the product's own rule.
  it.each([
    [[92, 90, 88, 90], 'pass'],
    [[92.1, 90, 87.9, 90], 'doubtful'],
  ])('judges posts spaced %j as %s', (gaps, verdict) => {
    expect(capMap({ ...inOrder([1, 3, 4, 2]), posts: spaced(gaps) }).verdict).toBe(verdict);
  });

  it('takes intervals written to two decimals, and finds the companions of a fourteen', () => {
    const order = Array.from({ length: 14 }, (_, i) => i + 1);
    const map = capMap({ ...inOrder(order), intervals: order.map(() => 51.43) });
    expect(map.companions).toHaveLength(7);
    expect(map.crankInterval).toBeCloseTo(720 / 14, 9);
  });
});

describe('capMap, option by option', () => {
  // Common practice, no source: order 1-3-4-2 on a rotor that turns anticlockwise.
  it('follows an anticlockwise rotor from the post for No. 1, through the trace, to the outlets', () => {
    const map = capMap({
      firingOrder: [1, 3, 4, 2],
      rotation: 'anticlockwise',
      posts: [
        { post: 'C', angle: 45 },
        { post: 'D', angle: 135 },
        { post: 'B', angle: 225 },
        { post: 'A', angle: -45 },
      ],
      firstPost: 'A',
      trace: { A: 'B', B: 'A', C: 'C', D: 'D' },
    });
    expect(map.rows).toEqual([
      { step: 1, post: 'A', angle: 315, cylinder: 1, firesAt: 0, outlet: 'B' },
      { step: 2, post: 'B', angle: 225, cylinder: 3, firesAt: 180, outlet: 'A' },
      { step: 3, post: 'D', angle: 135, cylinder: 4, firesAt: 360, outlet: 'D' },
      { step: 4, post: 'C', angle: 45, cylinder: 2, firesAt: 540, outlet: 'C' },
    ]);
    expect(map.leads).toEqual([
      { cylinder: 1, post: 'A', outlet: 'B' },
      { cylinder: 2, post: 'C', outlet: 'C' },
      { cylinder: 3, post: 'B', outlet: 'A' },
      { cylinder: 4, post: 'D', outlet: 'D' },
    ]);
    expect(map.reason).toMatch(
      /anticlockwise.*posts A, B, D and C.*1, 3, 4 and 2.*outlets B, A, D and C.*180°/,
    );
  });

  it('begins with the first post listed, whatever its angle', () => {
    const posts = [
      { post: 'x', angle: 200 },
      { post: 'y', angle: 20 },
    ];
    expect(capMap({ ...inOrder([1, 2]), posts }).rows.map(({ post }) => post)).toEqual(['x', 'y']);
  });

  it('turns a two-stroke’s distributor at crank speed and finds it no companions', () => {
    const map = capMap({ ...inOrder([1, 3, 4, 2]), strokesPerCycle: 2 });
    expect(map).toMatchObject({
      verdict: 'pass',
      crankInterval: 90,
      distributorInterval: 90,
      companions: [],
    });
    expect(map.rows.map(({ firesAt }) => firesAt)).toEqual([0, 90, 180, 270]);
  });

  it('takes one cylinder, sixteen, and labels', () => {
    expect(capMap(inOrder([1]))).toMatchObject({
      verdict: 'pass',
      companions: [],
      crankInterval: 720,
      distributorInterval: 360,
    });
    const sixteen = Array.from({ length: 16 }, (_, i) => i + 1);
    expect(capMap(inOrder(sixteen))).toMatchObject({ verdict: 'pass', distributorInterval: 22.5 });
    const labelled = capMap(inOrder(['L1', 'R4', 'R2', 'L2', 'R3', 'L3', 'L4', 'R1']));
    expect(labelled.companions).toEqual([
      ['L1', 'R3'],
      ['R4', 'L3'],
      ['R2', 'L4'],
      ['L2', 'R1'],
    ]);
  });
});
