import type { Quantity } from '@second-spanner/shared/contracts/quantity';
import type { MeasurementStep } from '@second-spanner/shared/contracts/steps';
import { drawEndFloat } from '@second-spanner/shared/drawing/end-float';
import type { Drawing } from '@second-spanner/shared/drawing/shapes';
import type { DrawingOptions } from '@second-spanner/shared/drawing/words';
import { convert, kindOf } from '@second-spanner/shared/quantities/convert';

/** The step that the drawing of the centre main bearing belongs to; the sheet's proposal names it so. */
const crankEndFloat = 'Crankshaft {end float}';

/** Where a measurement is made, where there is a drawing of that place. A reading is drawn only where it is given. */
export function placeDrawing(
  { title, limits: { low, high } }: MeasurementStep,
  reading: Quantity | null,
  options: DrawingOptions,
): Drawing | null {
  const unit = (low ?? high)?.unit;
  if (title !== crankEndFloat || (unit !== 'mm' && unit !== 'in' && unit !== 'thou' && unit !== 'µm'))
    return null;
  const inUnit = (figure: Quantity | undefined): number | undefined => figure && convert(figure, unit).value;
  const isDrawn = reading !== null && kindOf(reading.unit) === 'length' && reading.value >= 0;
  return drawEndFloat(
    { low: inUnit(low), high: inUnit(high), unit, reading: isDrawn ? inUnit(reading) : undefined },
    options,
  );
}
