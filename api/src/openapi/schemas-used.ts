import { contractSchema } from '../platform/schemas/contract-schemas.js';
import { nameOfRef, type JsonSchema } from '../platform/schemas/json-schema.js';

/** The contract types that a part of a document refers to, and those that they refer to in turn, by name. */
export function schemasUsed(part: unknown): Readonly<Record<string, JsonSchema>> {
  const used = new Map<string, JsonSchema>();
  const follow = (value: unknown): void => {
    if (typeof value !== 'object' || value === null) return;
    if ('$ref' in value && typeof value.$ref === 'string') {
      const name = nameOfRef(value.$ref);
      if (used.has(name)) return;
      const schema = contractSchema(name);
      used.set(name, schema);
      follow(schema);
    }
    Object.values(value).forEach(follow);
  };
  follow(part);
  return Object.fromEntries([...used].sort(([a], [b]) => (a < b ? -1 : 1)));
}
