import type { FastenerPosition } from '../contracts/calculations.js';
import { InputError } from '../contracts/input-error.js';
import {
  requireList,
  requireNumber,
  requireOneOf,
  requireRecord,
  requireText,
} from '../quantities/require.js';

/** More than any joint of an engine has; keeps a plan of twenty passes small. */
const mostFasteners = 200;
const furthest = 1e6;
const patterns = ['grid', 'circle', 'line'] as const;

/** Fasteners in their places, and how the places were given. `x` and `y` are plain numbers, in one scale. */
export interface Layout {
  readonly pattern: (typeof patterns)[number] | 'by-hand';
  readonly positions: readonly FastenerPosition[];
}

/**
 * The fasteners of a request in their places. Those of a pattern are numbered from 1, row by row or clockwise.
 *
 * @throws InputError on paths such as `fasteners.rows` or `fasteners.positions[3].x`
 */
export function requireLayout(input: unknown): Layout {
  const { pattern, rows, columns, count, positions } = requireRecord(input, 'fasteners');
  if (positions !== undefined) {
    if (pattern !== undefined)
      throw new InputError('fasteners', 'Give either a pattern or positions, not both.');
    return { pattern: 'by-hand', positions: requirePositions(positions) };
  }
  switch (requireOneOf(pattern, patterns, 'fasteners.pattern')) {
    case 'grid':
      return grid(requireCount(rows, 'fasteners.rows'), requireCount(columns, 'fasteners.columns'));
    case 'circle':
      return circle(requireCount(count, 'fasteners.count'));
    default:
      return { ...grid(1, requireCount(count, 'fasteners.count')), pattern: 'line' };
  }
}

function requireCount(input: unknown, field: string): number {
  return requireNumber(input, field, { min: 1, max: mostFasteners, integer: true });
}

function grid(rows: number, columns: number): Layout {
  if (rows * columns > mostFasteners) {
    throw new InputError('fasteners.rows', `Rows times columns must be at most ${mostFasteners}.`);
  }
  const positions = Array.from({ length: rows * columns }, (_, i) => ({
    fastener: `${i + 1}`,
    x: i % columns,
    y: Math.floor(i / columns),
  }));
  return { pattern: 'grid', positions };
}

/** Clockwise from the top, `y` pointing down as it does in a grid. */
function circle(count: number): Layout {
  const positions = Array.from({ length: count }, (_, i) => {
    const angle = (2 * Math.PI * i) / count;
    return { fastener: `${i + 1}`, x: Math.sin(angle), y: -Math.cos(angle) };
  });
  return { pattern: 'circle', positions };
}

function requirePositions(input: unknown): readonly FastenerPosition[] {
  const path = 'fasteners.positions';
  const positions: FastenerPosition[] = [];
  for (const [i, item] of requireList(input, path, { min: 1, max: mostFasteners }).entries()) {
    const { fastener, x, y } = requireRecord(item, `${path}[${i}]`);
    const place = {
      fastener: requireText(fastener, `${path}[${i}].fastener`, { max: 40 }),
      x: requireNumber(x, `${path}[${i}].x`, { min: -furthest, max: furthest }),
      y: requireNumber(y, `${path}[${i}].y`, { min: -furthest, max: furthest }),
    };
    if (positions.some((other) => other.fastener === place.fastener)) {
      throw new InputError(`${path}[${i}].fastener`, `There is a fastener ${place.fastener} already.`);
    }
    const under = positions.find((other) => other.x === place.x && other.y === place.y);
    if (under)
      throw new InputError(`${path}[${i}]`, `Fastener ${under.fastener} stands at this place already.`);
    positions.push(place);
  }
  return positions;
}
