import type { RoundReadings, RoundReadingsRequest } from '../contracts/measuring.js';
import type { Unit } from '../contracts/quantity.js';
import { convert } from '../quantities/convert.js';

/** What is drawn of a bore's or a journal's readings, values in one unit. */
export interface RoundLayout {
  readonly unit: Unit;
  readonly heights: readonly string[];
  /** At most four, each with a letter. */
  readonly axes: readonly { readonly letter: string; readonly name: string }[];
  /** Undefined where there is no reading. */
  readonly valueAt: (height: string, axis: string) => number | undefined;
  readonly base: number;
  /** How many times too large differences are drawn; null where there are none. */
  readonly times: number | null;
  /** Drawing units outwards from the smallest size, of one side. */
  readonly bulge: (value: number) => number;
  readonly worst: { readonly height: string; readonly axis: string; readonly isWrong: boolean };
}

const letters = ['A', 'B', 'C', 'D'];
/** The smallest size is drawn so far across, and differences bulge at most so far on each side. */
export const drawnAcross = 84;
export const mostBulge = 12;
const mantissas = [5, 2, 1];

export function roundLayout(request: RoundReadingsRequest, answer: RoundReadings): RoundLayout {
  const unit = answer.least.unit;
  const values = request.readings.map((reading) => ({
    ...reading,
    height: reading.height.trim(),
    axis: reading.axis.trim(),
    size: convert(reading.value, unit).value,
  }));
  const base = Math.min(...values.map(({ size }) => size));
  const spread = Math.max(...values.map(({ size }) => size)) - base;
  const names = [...new Set(values.map(({ axis }) => axis))].slice(0, letters.length);
  const perUnit = drawnAcross / base / 2;
  const times = spread * perUnit > 1e-9 ? exaggerationOf(spread * perUnit) : null;
  return {
    unit,
    heights: [...new Set(values.map(({ height }) => height))],
    axes: names.map((name, i) => ({ letter: letters[i] ?? '', name })),
    valueAt: (height, axis) => values.find((one) => one.height === height && one.axis === axis)?.size,
    base,
    times,
    bulge: (value) => (times === null ? 0 : Math.min(mostBulge, (value - base) * perUnit * times)),
    worst: {
      height: answer.worstHeight,
      axis: answer.worstAxis,
      isWrong: answer.parts.some(({ of, verdict }) => of === 'size' && verdict === 'fail'),
    },
  };
}

/** The largest of 1, 2, 5, 10, 20 … that keeps a length (drawing units) within the most. */
function exaggerationOf(length: number): number {
  for (let power = 6; power > 0; power -= 1) {
    const found = mantissas.find((mantissa) => length * mantissa * 10 ** (power - 1) <= mostBulge);
    if (found !== undefined) return found * 10 ** (power - 1);
  }
  return mostBulge / length;
}
