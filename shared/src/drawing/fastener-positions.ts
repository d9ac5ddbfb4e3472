import type { FastenerLayout, FastenerPosition } from '../contracts/calculations.js';
import { polar } from './geometry.js';

/**
 * Where a layout's fasteners stand, in plain units with y downwards. Those of a pattern are numbered from 1,
 * row by row from the top left, or clockwise round a circle from the top.
 */
export function fastenerPositions(layout: FastenerLayout): readonly FastenerPosition[] {
  if ('positions' in layout) {
    return layout.positions;
  }
  if (layout.pattern === 'circle') {
    const centre = { x: 0, y: 0 };
    return numbered(layout.count, (i) => polar(centre, 10, (360 * i) / layout.count));
  }
  if (layout.pattern === 'line') {
    return numbered(layout.count, (i) => ({ x: i, y: 0 }));
  }
  const { rows, columns } = layout;
  return numbered(rows * columns, (i) => ({ x: i % columns, y: Math.floor(i / columns) }));
}

function numbered(
  count: number,
  place: (index: number) => { readonly x: number; readonly y: number },
): readonly FastenerPosition[] {
  return Array.from({ length: count }, (_, i) => ({ fastener: String(i + 1), ...place(i) }));
}
