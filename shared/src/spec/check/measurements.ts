import type { Kind } from '../../contracts/quantity.js';
import {
  measurementPlaces,
  readingMethods,
  type BeltSpec,
  type CompoundSpec,
  type MeasurementSpec,
  type PartSpec,
} from '../../contracts/spec.js';
import { kindOf } from '../../quantities/convert.js';
import { requireAnyQuantity, requireRecord } from '../../quantities/require.js';
import {
  anyLimits,
  key,
  limits,
  list,
  object,
  oneOf,
  optional,
  quantity,
  sourced,
  text,
  trueOrFalse,
} from './shapes.js';

/** A measurement's limits say themselves what kind of figure it is. */
const kindOfLimits = (input: unknown, path: string): Kind => {
  const record = requireRecord(input, path);
  const side = record['low'] === undefined ? 'high' : 'low';
  return kindOf(requireAnyQuantity(record[side], `${path}.${side}`).unit);
};

export const measurement = object<MeasurementSpec>({
  key,
  place: oneOf(measurementPlaces),
  name: text,
  method: oneOf(readingMethods),
  limits: sourced(anyLimits(kindOfLimits)),
  at: list(text, { min: 1, max: 96 }),
  critical: trueOrFalse,
});

export const belt = object<BeltSpec>({
  span: sourced(quantity('length')),
  driverDiameter: sourced(quantity('length')),
  drivenDiameter: sourced(quantity('length')),
  deflection: sourced(limits('length')),
  offset: sourced(limits('length')),
});

const time = quantity('time');

export const compound = object<CompoundSpec>({
  key,
  name: text,
  use: text,
  curePoints: sourced(
    list(
      object({
        temperature: quantity('temperature'),
        gap: optional(quantity('length')),
        toHandle: optional(time),
        toLoad: time,
        full: time,
      }),
      { min: 1, max: 30 },
    ),
  ),
  openTime: sourced(time),
});

export const part = object<PartSpec>({ name: text, maker: sourced(text), note: optional(text) });
