import { InputError } from '../contracts/input-error.js';
import type { PlasticStrip, PlasticStripRequest } from '../contracts/measuring.js';
import { fromSi, toSi } from '../quantities/convert.js';
import { requireQuantity, requireRecord } from '../quantities/require.js';

/**
 * The clearance that flattened a round plastic strip: π·d²/(4·W), its volume and length unchanged. Lengths
 * more than zero, the width more than the diameter; in the unit of the diameter. A check of the scale printed
 * on the strip's own packet, which always wins: the strip's edges bulge, and the formula leaves that out.
 *
 * @throws InputError on `diameter`, `width`
 * Source: a clearance strip's specification, clearance = constant ÷ width (PGS in the reference values).
 * Example: 0.20 mm flattened to 0.60 mm: 0.0524 mm.
 */
export function plasticStrip(request: PlasticStripRequest): PlasticStrip {
  const given = requireRecord(request, 'request');
  const diameter = requireQuantity(given['diameter'], 'length', 'diameter', { zero: false });
  const width = requireQuantity(given['width'], 'length', 'width', { zero: false });
  const [d, w] = [toSi(diameter), toSi(width)];
  if (w <= d) {
    throw new InputError('width', 'A strip that was pressed flat is wider than it was round.');
  }
  return { clearance: fromSi((Math.PI * d * d) / (4 * w), diameter.unit) };
}
