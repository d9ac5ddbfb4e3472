import type { HeatToAssemble, HeatToAssembleRequest } from '../contracts/fits.js';
import { InputError } from '../contracts/input-error.js';
import type { Quantity } from '../contracts/quantity.js';
import { fromSi, toSi } from '../quantities/convert.js';
import { requireOneOf, requireQuantity, requireRecord } from '../quantities/require.js';
import { coefficientOf } from './coefficient-of.js';
import { settled } from './fit-noise.js';
import { judgeHeat } from './judge-heat.js';
import { thermalGrowth } from './thermal-growth.js';

const ways = [
  'heating-hub',
  'cooling-shaft',
  'both',
] as const satisfies readonly HeatToAssembleRequest['by'][];
/** Above this metal is near melting or burning; no joint is put together so. */
const hottest = 1300;

interface Heat {
  readonly diameter: number;
  readonly interference: number;
  readonly clearance: number;
  readonly hub: number;
  readonly shaft: number;
  readonly room: Quantity;
  readonly by: HeatToAssembleRequest['by'];
  readonly coldest: number | undefined;
}

/**
 * How hot the hub or how cold the shaft must be for the joint to go together with the clearance wanted:
 * ΔT = (interference + clearance) / (α·d). With `both` the shaft is cooled to `coldest` first, and the hub makes
 * good what is left. Lengths of any unit; rises and drops are differences in K, temperatures are in the room's
 * unit, `clearanceThen` in the interference's. A material's coefficient is the least of its alloys in the table.
 *
 * `pass` and `fail` by the temperatures allowed; `not-judged` where none is given for a part that changes.
 *
 * @throws InputError on the request's fields; on `by` where no cold, or no heat that metal stands, is enough; on
 * `coldest` where it is needed and not there, or not below the room
 * Source: shrink-fit assembly ΔT = δ/(α·d) (`SHR` of the reference values); mean coefficients over the whole way.
 * Example: 30 mm, steel hub, 29.8 µm in all: 85 K over the room.
 */
export function heatToAssemble(request: HeatToAssembleRequest): HeatToAssemble {
  const given = requireRecord(request, 'request');
  const heat = readHeat(given);
  const { diameter, hub, shaft, interference, room } = heat;
  const hottestAllowed = temperatureIf(given, 'hottestAllowed');
  const coldestAllowed = temperatureIf(given, 'coldestAllowed');

  const needed = interference + heat.clearance;
  const drop = shaftDrop(heat, needed);
  const shrunk = thermalGrowth(diameter, shaft, drop);
  const rise =
    heat.by === 'cooling-shaft' ? 0 : Math.max(0, needed - shrunk) / thermalGrowth(diameter, hub, 1);
  const roomInK = toSi(room);
  refuseImpossible(roomInK + rise, roomInK - drop);
  const clearanceThen = settled(thermalGrowth(diameter, hub, rise) + shrunk - interference);

  return {
    ...judgeHeat({
      rise,
      drop,
      hub: fromSi(roomInK + rise, room.unit),
      shaft: fromSi(roomInK - drop, room.unit),
      hottestAllowed,
      coldestAllowed,
    }),
    hubRise: { value: rise, unit: 'K' },
    shaftDrop: { value: drop, unit: 'K' },
    hubTemperature: fromSi(roomInK + rise, room.unit),
    shaftTemperature: fromSi(roomInK - drop, room.unit),
    clearanceThen: fromSi(clearanceThen, unitOf(given['interference'])),
  };
}

function readHeat(given: Readonly<Record<string, unknown>>): Heat {
  const length = (name: string, zero: boolean): number =>
    toSi(requireQuantity(given[name], 'length', name, { zero }));
  const room = requireQuantity(given['room'], 'temperature', 'room');
  const by = requireOneOf(given['by'], ways, 'by');
  const coldest = temperatureIf(given, 'coldest');
  if (by === 'both') {
    if (coldest === undefined) {
      throw new InputError('coldest', 'Say how cold the inner part is made before the outer one is heated.');
    }
    if (toSi(coldest) >= toSi(room)) throw new InputError('coldest', 'This must be colder than the room.');
  }
  return {
    diameter: length('diameter', false),
    interference: length('interference', true),
    clearance: length('clearance', true),
    hub: coefficientOf(given['hub'], 'hub'),
    shaft: coefficientOf(given['shaft'], 'shaft'),
    room,
    by,
    coldest: coldest === undefined ? undefined : toSi(coldest),
  };
}

function temperatureIf(given: Readonly<Record<string, unknown>>, name: string): Quantity | undefined {
  return given[name] === undefined ? undefined : requireQuantity(given[name], 'temperature', name);
}

function shaftDrop({ by, coldest, room, diameter, shaft }: Heat, needed: number): number {
  if (by === 'cooling-shaft') return needed / thermalGrowth(diameter, shaft, 1);
  return by === 'both' && coldest !== undefined ? toSi(room) - coldest : 0;
}

function refuseImpossible(hub: number, shaft: number): void {
  if (shaft <= 0) {
    throw new InputError('by', 'No cold shrinks the inner part so far: heat the outer one, or do both.');
  }
  if (hub > hottest + 273.15) {
    throw new InputError(
      'by',
      `The outer part would have to be over ${hottest} °C: this interference is too large.`,
    );
  }
}

/** Its unit is known to be one of length: the interference was read. */
function unitOf(interference: unknown): Quantity['unit'] {
  return requireQuantity(interference, 'length', 'interference').unit;
}
