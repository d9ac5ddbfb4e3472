import type { Quantity, Unit } from '@second-spanner/shared/contracts/quantity';
import type { Tool } from '@second-spanner/shared/contracts/registers';
import type { Limits } from '@second-spanner/shared/contracts/spec';
import type { Verdict } from '@second-spanner/shared/contracts/verdict';
import { drawToleranceBand } from '@second-spanner/shared/drawing/tolerance-band';
import type { Drawing } from '@second-spanner/shared/drawing/shapes';
import type { DrawingOptions } from '@second-spanner/shared/drawing/words';
import { convert, convertInterval } from '@second-spanner/shared/quantities/convert';
import { uncertaintyAt } from '@second-spanner/shared/sheet/tools';

/** A reading to be put on a band. */
export interface OnBand {
  readonly value: Quantity;
  readonly tool: Tool | undefined;
  readonly role: 'first' | 'second';
  readonly label: string;
  readonly verdict?: Verdict;
}

/** Readings on their tolerance band in a unit of choice; null where there is no limit to draw. */
export function bandIn(
  { low, high }: Limits,
  unit: Unit,
  readings: readonly OnBand[],
  options: DrawingOptions,
): Drawing | null {
  if (low === undefined && high === undefined) return null;
  return drawToleranceBand(
    {
      low: low && rounded(convert(low, unit).value),
      high: high && rounded(convert(high, unit).value),
      unit,
      readings: readings.map(({ value, tool, role, label, verdict }) => ({
        value: rounded(convert(value, unit).value),
        uncertainty: tool === undefined ? 0 : convertInterval(uncertaintyAt(tool, value), unit).value,
        role,
        label,
        failed: verdict === 'fail',
      })),
    },
    options,
  );
}

/** Without the noise of a conversion, which would print as a tail of decimals. */
const rounded = (value: number): number => Number(value.toPrecision(12));
