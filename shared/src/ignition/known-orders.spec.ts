import { describe, expect, it } from 'vitest';
import { knownOrders } from './known-orders.js';

describe('knownOrders', () => {
  const all = Object.entries(knownOrders).flatMap(([count, known]) =>
    known.map((one) => ({ count: Number(count), ...one })),
  );

  it('holds permutations that begin with cylinder 1, each once, each with its source', () => {
    for (const { count, order, source, engine } of all) {
      expect([...order].sort((a, b) => a - b)).toEqual(Array.from({ length: count }, (_, i) => i + 1));
      expect(order[0]).toBe(1);
      expect(source).not.toBe('');
      expect(engine).not.toBe('');
    }
    expect(new Set(all.map(({ order }) => order.join())).size).toBe(all.length);
  });

  // T2-001 to T2-017, T2-039, T2-042: "Firing order", encyclopedia copies (W-FO2010, W-FOwoi, W-FOpig); FAA
  // aviation maintenance handbook (FAA-FO);
  // article on V8 firing orders (CP-FO); article on numbering the cylinders of V engines (CYLN).
  it.each([
    [[1, 2, 3]],
    [[1, 3, 2]],
    [[1, 3, 4, 2]],
    [[1, 4, 2, 3]],
    [[1, 2, 4, 5, 3]],
    [[1, 5, 3, 6, 2, 4]],
    [[1, 4, 5, 2, 3, 6]],
    [[1, 6, 2, 4, 3, 5]],
    [[1, 3, 5, 7, 2, 4, 6]],
    [[1, 8, 4, 3, 6, 5, 7, 2]],
    [[1, 8, 7, 2, 6, 5, 4, 3]],
    [[1, 5, 4, 2, 6, 3, 7, 8]],
    [[1, 3, 7, 2, 6, 5, 4, 8]],
    [[1, 10, 9, 4, 3, 6, 5, 8, 7, 2]],
    [[1, 7, 5, 11, 3, 9, 6, 12, 2, 8, 4, 10]],
  ])('knows the published order %j', (order) => {
    expect(knownOrders[order.length]?.map((one) => one.order)).toContainEqual(order);
  });
});
