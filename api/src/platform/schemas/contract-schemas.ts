import { readFileSync } from 'node:fs';
import type { JsonSchema } from './json-schema.js';

/** Beside the package's folders, so that compiled code finds it too. Made from the contract types by its own test. */
const file = new URL('../../../schemas/contracts.json', import.meta.url);

/** A schema of each contract type, by its name. */
export const contractSchemas = JSON.parse(readFileSync(file, 'utf8')) as Readonly<Record<string, JsonSchema>>;

/** The schema of a contract type. */
export function contractSchema(name: string): JsonSchema {
  const schema = contractSchemas[name];
  if (!schema) throw new Error(`There is no contract type ${name}; are the schemas up to date?`);
  return schema;
}
