import { InputError } from '../contracts/input-error.js';
import { toSi } from '../quantities/convert.js';
import {
  requireList,
  requireNumber,
  requireQuantity,
  requireRecord,
  requireText,
} from '../quantities/require.js';

/** One line of a data sheet: kelvin, metres, milliseconds. */
export interface SheetPoint {
  readonly temperature: number;
  readonly gap?: number;
  readonly substrate?: string;
  readonly activator?: boolean;
  readonly humidity?: number;
  readonly toHandle?: number;
  readonly toLoad: number;
  readonly full: number;
}

/** What the joint is, by which the lines that hold for it are chosen. */
export type Joint = Pick<SheetPoint, 'gap' | 'substrate' | 'activator' | 'humidity'>;

const mostPoints = 100;
const longestCure = 366 * 86_400;

/** An untrusted data sheet. Throws `InputError` on `sheet` and below. */
export function readSheet(input: unknown): readonly SheetPoint[] {
  return requireList(input, 'sheet', { min: 1, max: mostPoints }).map((item, i) => {
    const path = `sheet[${i}]`;
    const given = requireRecord(item, path);
    const span = (name: string): number => readSpan(given[name], `${path}.${name}`);
    const point: SheetPoint = {
      temperature: toSi(requireQuantity(given['temperature'], 'temperature', `${path}.temperature`)),
      ...readJoint(given, path),
      ...(given['toHandle'] === undefined ? {} : { toHandle: span('toHandle') }),
      toLoad: span('toLoad'),
      full: span('full'),
    };
    refuseOrder(point, path);
    return point;
  });
}

/** Milliseconds. */
function readSpan(input: unknown, field: string): number {
  const seconds = toSi(requireQuantity(input, 'time', field, { zero: false }));
  if (seconds > longestCure) throw new InputError(`${field}.value`, 'No compound takes longer than a year.');
  return 1000 * seconds;
}

/** Gap, substrate, activator and humidity, each if given, of a line or of the joint. Throws `InputError`. */
export function readJoint(given: Readonly<Record<string, unknown>>, path?: string): Joint {
  const at = (name: string): string => (path === undefined ? name : `${path}.${name}`);
  const joint: { -readonly [K in keyof Joint]: Joint[K] } = {};
  if (given['gap'] !== undefined) joint.gap = toSi(requireQuantity(given['gap'], 'length', at('gap')));
  if (given['substrate'] !== undefined) {
    joint.substrate = requireText(given['substrate'], at('substrate'), { max: 60 }).trim();
  }
  if (given['humidity'] !== undefined) {
    joint.humidity = requireNumber(given['humidity'], at('humidity'), { min: 0, max: 100 });
  }
  const activator = given['activator'];
  if (activator !== undefined) {
    if (typeof activator !== 'boolean') {
      throw new InputError(at('activator'), 'This must be true or false.');
    }
    joint.activator = activator;
  }
  return joint;
}

function refuseOrder({ toHandle, toLoad, full }: SheetPoint, path: string): void {
  if (toHandle !== undefined && toHandle > toLoad) {
    throw new InputError(`${path}.toHandle`, 'Handling comes no later than loading.');
  }
  if (toLoad > full) throw new InputError(`${path}.toLoad`, 'Loading comes no later than full strength.');
}
