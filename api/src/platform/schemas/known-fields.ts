import type { FieldError } from '@second-spanner/shared/contracts/input-error';
import { contractSchema } from './contract-schemas.js';
import { nameOfRef, type JsonSchema } from './json-schema.js';

/** Where objects may stand in a value, and which fields they then have. */
interface Shape {
  /** More than one where there are several ways to say it. */
  readonly ways: ObjectShape[];
  readonly items: Shape[];
}

interface ObjectShape {
  readonly fields: ReadonlyMap<string, Shape>;
  /** What stands under names that are free to choose; null where there are none. */
  readonly free: Shape | null;
  /** Fields that tell this way from the others by their value. */
  readonly told: readonly (readonly [field: string, value: unknown])[];
}

const mostTold = 10;

/**
 * Looks through requests of a contract type for fields that it does not know, however deep, and tells their paths.
 * Whether what is known is also right, it does not ask.
 */
export function unknownFieldsOf(type: string): (request: unknown) => readonly FieldError[] {
  const shape = shapeOf(contractSchema(type), new Map());
  return (request) => {
    const found: FieldError[] = [];
    look(request, shape, '', found);
    return found.slice(0, mostTold);
  };
}

function shapeOf(schema: JsonSchema, named: Map<string, Shape>): Shape {
  const shape: Shape = { ways: [], items: [] };
  fill(shape, schema, named);
  return shape;
}

function fill(shape: Shape, schema: JsonSchema, named: Map<string, Shape>): void {
  if (schema.$ref !== undefined) {
    const { ways, items } = shapeNamed(nameOfRef(schema.$ref), named);
    shape.ways.push(...ways);
    shape.items.push(...items);
    return;
  }
  for (const way of schema.anyOf ?? []) fill(shape, way, named);
  if (schema.items) shape.items.push(shapeOf(schema.items, named));
  if (schema.properties || schema.additionalProperties !== undefined)
    shape.ways.push(objectOf(schema, named));
}

function shapeNamed(name: string, named: Map<string, Shape>): Shape {
  const known = named.get(name);
  if (known) return known;
  const shape = shapeOf(contractSchema(name), named);
  named.set(name, shape);
  return shape;
}

function objectOf(
  { properties = {}, additionalProperties }: JsonSchema,
  named: Map<string, Shape>,
): ObjectShape {
  const entries = Object.entries(properties);
  const free = typeof additionalProperties === 'object' ? shapeOf(additionalProperties, named) : null;
  return {
    fields: new Map(entries.map(([name, schema]) => [name, shapeOf(schema, named)])),
    free: additionalProperties === true ? { ways: [], items: [] } : free,
    told: entries.flatMap(([name, schema]) => ('const' in schema ? [[name, schema.const] as const] : [])),
  };
}

function look(value: unknown, shape: Shape, path: string, found: FieldError[]): void {
  if (typeof value !== 'object' || value === null || found.length >= mostTold) return;
  if (Array.isArray(value)) {
    if (shape.items.length === 0) return;
    value.forEach((item, index) => {
      leastOf(
        shape.items,
        (each, into) => {
          look(item, each, `${path}[${index}]`, into);
        },
        found,
      );
    });
    return;
  }
  const record = value as Readonly<Record<string, unknown>>;
  const meant = shape.ways.filter(({ told }) => told.every(([field, is]) => record[field] === is));
  const ways = meant.length > 0 ? meant : shape.ways;
  leastOf(
    ways,
    (way, into) => {
      lookInside(record, way, path, into);
    },
    found,
  );
}

/** Of several ways to say it, the one with the fewest unknown fields is taken to be meant. */
function leastOf<T>(
  ways: readonly T[],
  tell: (way: T, into: FieldError[]) => void,
  found: FieldError[],
): void {
  let least: FieldError[] | null = null;
  for (const way of ways) {
    const into: FieldError[] = [];
    tell(way, into);
    if (into.length === 0) return;
    if (!least || into.length < least.length) least = into;
  }
  if (least) found.push(...least);
}

function lookInside(
  record: Readonly<Record<string, unknown>>,
  { fields, free }: ObjectShape,
  path: string,
  found: FieldError[],
): void {
  for (const name of Object.keys(record)) {
    if (found.length >= mostTold) return;
    const field = `${path === '' ? '' : `${path}.`}${name.slice(0, 100)}`;
    const inner = fields.get(name) ?? free;
    if (inner) look(record[name], inner, field, found);
    else {
      const known = [...fields.keys()].join(', ');
      found.push({ field, message: `This field is not known here; known are ${known}.` });
    }
  }
}
