import { InputError } from '../contracts/input-error.js';
import type { Unit } from '../contracts/quantity.js';
import { toSi } from '../quantities/convert.js';
import { requireQuantity, requireRecord, requireText } from '../quantities/require.js';
import { rimPlanes, type Plane } from './pulley-plane.js';

/** Lengths in metres. */
export interface Driver {
  readonly name: string;
  readonly diameter: number;
  readonly groove: number | undefined;
}

/** A driven pulley with what was measured of it, metres. */
export interface Driven {
  readonly name: string;
  readonly diameter: number;
  readonly span: number;
  readonly unit: Unit;
  /** One set of gaps, or two a quarter turn apart. */
  readonly sets: readonly { readonly driver: Plane; readonly driven: Plane }[];
  /** How much further back of its rim its groove lies than the driver's. */
  readonly grooves: number;
  readonly isByGroove: boolean;
  readonly shim: number | undefined;
  readonly roomBehind: number | undefined;
  readonly roomInFront: number | undefined;
}

/**
 * A driven pulley of an unknown input.
 *
 * @throws InputError on `field` and below; on the `faceToGroove` that is missing where the other pulley has one
 */
export function readDriven(input: unknown, field: string, driver: Driver): Driven {
  const given = requireRecord(input, field);
  const length = (name: string): number =>
    toSi(requireQuantity(given[name], 'length', `${field}.${name}`, { zero: false }));
  const lengthIf = (name: string): number | undefined =>
    given[name] === undefined ? undefined : toSi(requireQuantity(given[name], 'length', `${field}.${name}`));
  const diameters = { driver: driver.diameter, driven: length('diameter') };
  const gaps = requireRecord(given['gaps'], `${field}.gaps`);
  const planes = rimPlanes(gaps, `${field}.gaps`, diameters);
  const turned = given['quarterTurn'];
  const groove = lengthIf('faceToGroove');
  refuseHalf(groove, driver.groove, field);
  return {
    name: requireText(given['name'], `${field}.name`, { max: 40 }),
    diameter: diameters.driven,
    span: length('span'),
    unit: requireQuantity(gaps['driverNear'], 'length', `${field}.gaps.driverNear`, { negative: true }).unit,
    sets: turned === undefined ? [planes] : [planes, rimPlanes(turned, `${field}.quarterTurn`, diameters)],
    grooves: groove === undefined || driver.groove === undefined ? 0 : groove - driver.groove,
    isByGroove: groove !== undefined,
    shim: given['shim'] === undefined ? undefined : length('shim'),
    roomBehind: lengthIf('roomBehind'),
    roomInFront: lengthIf('roomInFront'),
  };
}

function refuseHalf(driven: number | undefined, driver: number | undefined, field: string): void {
  if ((driven === undefined) === (driver === undefined)) return;
  throw new InputError(
    driven === undefined ? `${field}.faceToGroove` : 'driver.faceToGroove',
    'Give the distance from rim to groove of both pulleys, or of none.',
  );
}
