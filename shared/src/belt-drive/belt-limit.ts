import { requireNumber, requireRecord } from '../quantities/require.js';

/** What a belt drive may be out of line: degrees, and share of the span. */
export interface LimitTaken {
  readonly angle: number;
  readonly offsetPerSpan: number;
  /** Whether one of the two was not given. */
  readonly isUsual: boolean;
}

/**
 * The limits given, or what is usual for V-belts: 0.5°, and 0.0087 of the span, which is its tangent.
 *
 * @throws InputError on `limit` and below
 * Source: a pulley-alignment maker's table (`BM1` of the reference values): 0.5° for V-belts, 0.87 mm per 100 mm.
 */
export function requireBeltLimit(input: unknown): LimitTaken {
  const given = input === undefined ? {} : requireRecord(input, 'limit');
  const [angle, offsetPerSpan] = [given['angle'], given['offsetPerSpan']];
  return {
    angle: angle === undefined ? 0.5 : requireNumber(angle, 'limit.angle', { min: 0, max: 45 }),
    offsetPerSpan:
      offsetPerSpan === undefined
        ? 0.0087
        : requireNumber(offsetPerSpan, 'limit.offsetPerSpan', { min: 0, max: 1 }),
    isUsual: angle === undefined || offsetPerSpan === undefined,
  };
}
