import { InputError } from '../contracts/input-error.js';
import { nearest } from './nearest.js';
import { metricThreads } from './tables/metric-threads.js';
import { threadOf, type Thread } from './thread.js';

const written = /^m ?(\d{1,3}(?:[.,]\d{1,3})?)(?: ?[x×*-] ?(\d{1,2}(?:[.,]\d{1,3})?))?$/i;

/** A metric thread of the tables; undefined where the text has not the form of one. */
export function metricThread(text: string, field: string): Thread | undefined {
  const match = written.exec(text);
  if (match === null) return undefined;
  const number = (digits: string | undefined): number => Number((digits ?? '').replace(',', '.'));
  const diameter = number(match[1]);
  const size = metricThreads.find((one) => one.diameter === diameter);
  if (size === undefined) {
    const near = nearest(
      metricThreads,
      diameter,
      (one) => one.diameter,
      (one) => `M${one.diameter}`,
    );
    throw new InputError(field, `M${diameter} is not in the tables; the nearest: ${near}.`);
  }
  const pitches: readonly number[] = size.pitches;
  const [coarse] = size.pitches;
  const pitch = match[2] === undefined ? coarse : number(match[2]);
  if (!pitches.includes(pitch)) {
    const named = pitches.map((one) => `M${diameter}x${one}`).join(', ');
    throw new InputError(field, `M${diameter}x${pitch} is not in the tables; there are ${named}.`);
  }
  return threadOf({
    name: `M${diameter}x${pitch}`,
    series: pitch === coarse ? 'metric-coarse' : 'metric-fine',
    diameter: diameter / 1000,
    pitch: pitch / 1000,
    nominal: { value: diameter, unit: 'mm' },
  });
}
