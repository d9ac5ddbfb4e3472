import type { SpecDocument } from '../contracts/spec.js';
import { checkAgreement } from './check/agreement.js';
import { fastenerGroup } from './check/fasteners.js';
import { belt, compound, measurement, part } from './check/measurements.js';
import { engine, ignition, keySpec, valveTrain } from './check/sections.js';
import { list, number, object, oneOf, sourced, text } from './check/shapes.js';

const shape = object<SpecDocument>({
  format: oneOf([1]),
  code: text,
  title: text,
  engine,
  ignition,
  valveTrain,
  fastenerGroups: list(fastenerGroup, { max: 64 }),
  measurements: list(measurement, { max: 200 }),
  keys: list(keySpec, { max: 16 }),
  belt,
  compounds: list(compound, { max: 16 }),
  consumables: list(sourced(text), { max: 64 }),
  parts: list(part, { max: 200 }),
  cautions: list(object({ stage: number({ min: 1, max: 14, integer: true }), text: sourced(text) }), {
    max: 64,
  }),
});

/**
 * An unknown input as a whole spec: every value of its kind, no unknown names, and the values in agreement with each
 * other. Units are made canonical. Throws `InputError` with the path of the first thing that is wrong, such as
 * `engine.bore.value.unit`.
 */
export function checkSpecDocument(input: unknown): SpecDocument {
  const document = shape(input, '');
  checkAgreement(document);
  return document;
}
