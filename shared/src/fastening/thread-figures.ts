import type { ThreadFigures, ThreadFiguresRequest } from '../contracts/fastening.js';
import type { Quantity } from '../contracts/quantity.js';
import { fromSi } from '../quantities/convert.js';
import { requireRecord } from '../quantities/require.js';
import { readThread } from './read-thread.js';

/**
 * The figures of a thread of the tables: nominal, pitch and minor diameter of the bolt, pitch and tensile stress
 * area. Metric threads are answered in mm and mm², inch threads in inches and in².
 *
 * @throws InputError on `thread`
 * Source: ISO 724, ISO 898-1:2013, 9.1.6.1, ASME B1.1-2003 and BS 84 (from memory); sizes as the tables say.
 * Example: M10x1.5 has d2 = 9.026 mm and As = 57.99 mm².
 */
export function threadFigures(request: ThreadFiguresRequest): ThreadFigures {
  const thread = readThread(requireRecord(request, 'request')['thread']);
  const { unit } = thread.nominal;
  const length = (metres: number): Quantity => fromSi(metres, unit);
  return {
    name: thread.name,
    series: thread.series,
    diameter: thread.nominal,
    pitch: length(thread.pitch),
    pitchDiameter: length(thread.pitchDiameter),
    minorDiameter: length(thread.minorDiameter),
    stressArea: fromSi(thread.stressArea, unit === 'mm' ? 'mm2' : 'in2'),
    ...(thread.perInch !== undefined && { perInch: thread.perInch }),
  };
}
