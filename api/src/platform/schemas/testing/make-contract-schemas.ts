import { fileURLToPath } from 'node:url';
import { createGenerator } from 'ts-json-schema-generator';
import type { JsonSchema } from '../json-schema.js';

interface Draft7 extends Omit<JsonSchema, 'items' | 'anyOf' | 'properties' | 'additionalProperties'> {
  readonly definitions?: Readonly<Record<string, Draft7>>;
  readonly items?: Draft7 | readonly Draft7[];
  readonly anyOf?: readonly Draft7[];
  readonly allOf?: readonly Draft7[];
  readonly properties?: Readonly<Record<string, Draft7>>;
  readonly additionalProperties?: boolean | Draft7;
}

const shared = fileURLToPath(new URL('../../../../../shared/', import.meta.url));
/** A type that is written out by its name; what the generator names itself is put where it is used. */
const ownName = /^[A-Z]\w*$/;

/**
 * The schemas of all contract types, made from the types themselves: draft 7 as it comes, turned into 2020-12, and
 * references into those of an OpenAPI document.
 */
export function makeContractSchemas(): Record<string, JsonSchema> {
  const { definitions = {} } = createGenerator({
    ...{ path: `${shared}src/contracts/*.ts`, tsconfig: `${shared}tsconfig.json`, type: '*' },
    ...{
      expose: 'export',
      topRef: true,
      skipTypeCheck: true,
      additionalProperties: false,
      jsDoc: 'extended',
    },
  }).createSchema('*') as Draft7;
  const names = Object.keys(definitions)
    .filter((name) => ownName.test(name))
    .sort();
  return Object.fromEntries(names.map((name) => [name, turned(definitions[name] ?? {}, definitions)]));
}

function turned(schema: Draft7, definitions: Readonly<Record<string, Draft7>>): JsonSchema {
  const turn = (inner: Draft7): JsonSchema => turned(inner, definitions);
  const { $ref, items, anyOf, allOf, properties, additionalProperties, ...rest } = schema;
  if ($ref !== undefined) {
    const name = decodeURIComponent($ref.replace('#/definitions/', ''));
    if (!ownName.test(name)) return { ...turn(definitions[name] ?? {}), ...rest };
    return { $ref: `#/components/schemas/${name}`, ...rest };
  }
  // `NonNullable` is a type and `{}`, which says nothing.
  const says = allOf?.filter((part) => Object.keys(part.properties ?? { any: true }).length > 0);
  return {
    ...rest,
    ...says?.map(turn).reduce((all, part) => ({ ...all, ...part }), {}),
    ...(Array.isArray(items)
      ? { prefixItems: items.map(turn) }
      : items !== undefined && { items: turn(items as Draft7) }),
    ...(anyOf && { anyOf: anyOf.map(turn) }),
    ...(properties && {
      properties: Object.fromEntries(Object.entries(properties).map(([name, inner]) => [name, turn(inner)])),
    }),
    ...(additionalProperties !== undefined && {
      additionalProperties:
        typeof additionalProperties === 'boolean' ? additionalProperties : turn(additionalProperties),
    }),
  };
}
