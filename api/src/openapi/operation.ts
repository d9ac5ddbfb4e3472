import type { Permission } from '@second-spanner/shared/contracts/permissions';
import { contractSchema } from '../platform/schemas/contract-schemas.js';
import { refTo, type JsonSchema } from '../platform/schemas/json-schema.js';

export type Method = 'get' | 'post' | 'put' | 'delete';

export interface Parameter {
  readonly name: string;
  readonly description: string;
  readonly schema: JsonSchema;
  readonly example: string;
  readonly required?: boolean;
}

/** What a request or an answer carries: JSON unless it says otherwise. */
export interface Content {
  readonly schema: JsonSchema;
  readonly media?: string;
  readonly example?: unknown;
}

export interface Answer {
  readonly description: string;
  readonly content?: Content;
  readonly headers?: Readonly<Record<string, string>>;
}

/** One route, as it is described to whoever writes against the api. */
export interface Operation {
  readonly method: Method;
  /** Under `/api`, parameters in braces. */
  readonly path: string;
  readonly tag: string;
  readonly summary: string;
  readonly description?: string;
  /** Who may: by the table of permissions, anybody who is signed in, or anybody at all. */
  readonly who: Permission | 'signed-in' | 'anyone';
  readonly query?: readonly Parameter[];
  readonly headers?: readonly Parameter[];
  readonly body?: Content;
  readonly answers: Readonly<Record<number, Answer>>;
  /** What refuses besides what refuses everywhere, by status. */
  readonly refusals?: Readonly<Record<number, string>>;
  /** Query parameters besides those that are named: any name, a text each. */
  readonly freeQuery?: { readonly description: string; readonly example: Readonly<Record<string, string>> };
}

/** A contract type as content, with an example that the compiler has checked. */
export function contract<T>(name: string, example: T): Content {
  // Looked up, so that a name that is no contract type is found at once.
  contractSchema(name);
  return { schema: refTo(name), example };
}

export const listOf = <T>(name: string, ...example: readonly T[]): Content => ({
  schema: { type: 'array', items: contract(name, null).schema },
  example,
});

/** One page of a list, with the cursor of the next. */
export const pageOf = <T>(name: string, ...items: readonly T[]): Content => ({
  schema: {
    type: 'object',
    required: ['items', 'next'],
    additionalProperties: false,
    properties: {
      items: { type: 'array', items: contract(name, null).schema },
      next: {
        type: ['string', 'null'],
        description: 'The cursor of the page after this one; null at the end.',
      },
    },
  },
  example: { items, next: null },
});

export const pdf: Content = {
  schema: { type: 'string', contentMediaType: 'application/pdf' },
  media: 'application/pdf',
};

/** How a list is asked for its pages. */
export const paging: readonly Parameter[] = [
  {
    name: 'limit',
    description: 'How many items a page has at most.',
    schema: { type: 'integer', minimum: 1, maximum: 200, default: 50 },
    example: '20',
  },
  {
    name: 'cursor',
    description: 'Where the page begins: `next` of the page before.',
    schema: { type: 'string', maxLength: 500 },
    example: 'WyJMTS1DMDEiXQ',
  },
];

export const paper: Parameter = {
  name: 'paper',
  description: 'The size of the paper.',
  schema: { type: 'string', enum: ['a4', 'letter'], default: 'a4' },
  example: 'letter',
};

export const idempotencyKey: Parameter = {
  name: 'Idempotency-Key',
  description: 'A UUID of your own making, the same whenever this request is sent again: it records once.',
  schema: { type: 'string', format: 'uuid' },
  example: '5f0a9c1e-6d0b-4f7e-9a53-0b1d6c2e8f47',
  required: true,
};
