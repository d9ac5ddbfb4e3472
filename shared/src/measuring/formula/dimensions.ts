import type { Kind } from '../../contracts/quantity.js';

/** Powers of metre, kilogram, second and ohm. */
export type Dimensions = readonly [number, number, number, number];

export const plainNumber: Dimensions = [0, 0, 0, 0];

/** What each kind of figure is made of. Temperatures have zero points, and do not add or multiply. */
const ofKind: Record<Exclude<Kind, 'temperature'>, Dimensions> = {
  length: [1, 0, 0, 0],
  area: [2, 0, 0, 0],
  volume: [3, 0, 0, 0],
  mass: [0, 1, 0, 0],
  time: [0, 0, 1, 0],
  force: [1, 1, -2, 0],
  torque: [2, 1, -2, 0],
  pressure: [-1, 1, -2, 0],
  resistance: [0, 0, 0, 1],
};

/** The powers that a kind of figure is made of. Example: a torque is m²·kg·s⁻². */
export function dimensionsOf(kind: Exclude<Kind, 'temperature'>): Dimensions {
  return ofKind[kind];
}

/** Whether two figures may be added: all their powers are the same. */
export function areAlike(a: Dimensions, b: Dimensions): boolean {
  return a.every((power, i) => power === b[i]);
}

/** Of a product (`sign` 1) or a quotient (−1). */
export function combine([a, b, c, d]: Dimensions, other: Dimensions, sign: 1 | -1): Dimensions {
  return [a + sign * other[0], b + sign * other[1], c + sign * other[2], d + sign * other[3]];
}

/** What a figure of these dimensions is called in a sentence. */
export function nameOf(dimensions: Dimensions): string {
  if (areAlike(dimensions, plainNumber)) return 'a plain number';
  const kind = Object.entries(ofKind).find(([, of]) => areAlike(of, dimensions))?.[0];
  return kind === undefined ? 'no kind of figure that there is a unit for' : `a figure of ${kind}`;
}
