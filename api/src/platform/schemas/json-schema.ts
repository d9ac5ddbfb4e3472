/** What is used here of JSON Schema 2020-12. */
export interface JsonSchema {
  readonly $ref?: string;
  readonly type?: string | readonly string[];
  readonly description?: string;
  readonly const?: unknown;
  readonly enum?: readonly unknown[];
  readonly anyOf?: readonly JsonSchema[];
  readonly properties?: Readonly<Record<string, JsonSchema>>;
  readonly required?: readonly string[];
  readonly additionalProperties?: boolean | JsonSchema;
  readonly items?: JsonSchema;
  readonly prefixItems?: readonly JsonSchema[];
  readonly minItems?: number;
  readonly maxItems?: number;
  readonly minimum?: number;
  readonly maximum?: number;
  readonly minLength?: number;
  readonly maxLength?: number;
  readonly pattern?: string;
  readonly format?: string;
  readonly default?: unknown;
  readonly contentMediaType?: string;
}

const refHead = '#/components/schemas/';

/** A reference to a schema by its name. */
export const refTo = (name: string): JsonSchema => ({ $ref: refHead + name });

/** The name that a reference goes to. */
export const nameOfRef = (ref: string): string => ref.slice(refHead.length);
