import type { JsonSchema } from '../platform/schemas/json-schema.js';

export interface Reference {
  readonly $ref: string;
}

export interface MediaType {
  readonly schema: JsonSchema;
  readonly example?: unknown;
}

export interface ResponseObject {
  readonly description: string;
  readonly content?: Readonly<Record<string, MediaType>>;
  readonly headers?: Readonly<Record<string, { readonly description: string; readonly schema: JsonSchema }>>;
}

export interface ParameterObject {
  readonly name: string;
  readonly in: 'path' | 'query' | 'header';
  readonly description: string;
  readonly required: boolean;
  readonly schema: JsonSchema;
  readonly example?: unknown;
  readonly style?: 'form';
  readonly explode?: true;
}

export interface OperationObject {
  readonly operationId: string;
  readonly tags: readonly string[];
  readonly summary: string;
  readonly description: string;
  readonly security: readonly Readonly<Record<string, readonly string[]>>[];
  readonly parameters?: readonly ParameterObject[];
  readonly requestBody?: { readonly required: true; readonly content: Readonly<Record<string, MediaType>> };
  readonly responses: Readonly<Record<string, ResponseObject>>;
}

export type PathItem = Readonly<Partial<Record<'get' | 'post' | 'put' | 'delete', OperationObject>>>;

/** What is used here of an OpenAPI 3.1 document. */
export interface OpenApiDocument {
  readonly openapi: '3.1.0';
  readonly info: { readonly title: string; readonly version: string; readonly description: string };
  readonly servers: readonly { readonly url: string }[];
  readonly tags: readonly { readonly name: string }[];
  readonly paths: Readonly<Record<string, PathItem>>;
  readonly components: {
    readonly schemas: Readonly<Record<string, JsonSchema>>;
    readonly securitySchemes: Readonly<Record<string, object>>;
  };
}
