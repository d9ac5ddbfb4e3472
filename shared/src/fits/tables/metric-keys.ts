/**
 * Parallel keys by shaft diameter, mm: the high form, which most prints mean.
 *
 * Source: DIN 6885-1:1968 (ISO/R 773:1969), as a catalogue of standard parts reprints it (`KEYM` of the reference
 * values) and two further prints of the same table say; from memory where they stop. Widths are b, heights h,
 * depths t1 in the shaft and t2 in the hub, both at the centre line. Key width h9; slot widths P9 or N9 in the
 * shaft and P9 or JS9 in the hub where it must not move, H9 and D10 where it may. Depths are 0 to +0.1 mm to
 * 6 × 6, 0 to +0.2 mm over it.
 */
export interface MetricKey {
  /** The shaft's diameter, over and up to. */
  readonly over: number;
  readonly upTo: number;
  readonly width: number;
  readonly height: number;
  readonly shaftDepth: number;
  readonly hubDepth: number;
}

const row = (
  over: number,
  upTo: number,
  width: number,
  height: number,
  shaftDepth: number,
  hubDepth: number,
): MetricKey => ({ over, upTo, width, height, shaftDepth, hubDepth });

export const metricKeys: readonly MetricKey[] = [
  row(6, 8, 2, 2, 1.2, 1),
  row(8, 10, 3, 3, 1.8, 1.4),
  row(10, 12, 4, 4, 2.5, 1.8),
  row(12, 17, 5, 5, 3, 2.3),
  row(17, 22, 6, 6, 3.5, 2.8),
  row(22, 30, 8, 7, 4, 3.3),
  row(30, 38, 10, 8, 5, 3.3),
  row(38, 44, 12, 8, 5, 3.3),
  row(44, 50, 14, 9, 5.5, 3.8),
  row(50, 58, 16, 10, 6, 4.3),
  row(58, 65, 18, 11, 7, 4.4),
  row(65, 75, 20, 12, 7.5, 4.9),
  row(75, 85, 22, 14, 9, 5.4),
  row(85, 95, 25, 14, 9, 5.4),
  row(95, 110, 28, 16, 10, 6.4),
];
