import { permissions } from '@second-spanner/shared/contracts/permissions';
import { xsrfCookie, xsrfHeader } from '../platform/signing-in/cookies.js';
import type {
  MediaType,
  OpenApiDocument,
  OperationObject,
  ParameterObject,
  PathItem,
} from './document-types.js';
import type { Content, Operation, Parameter } from './operation.js';
import { needsXsrf, refusalsOf } from './refusals.js';
import { schemasUsed } from './schemas-used.js';

const about = `The workshop's records and its calculations, over JSON.

Physical figures are quantities, \`{ "value": 27, "unit": "lbf·ft" }\`; angles are plain numbers in degrees. In requests a unit may be spelt as a workshop spells it (\`Nm\`, \`ft-lb\`, \`thou\`); answers have the symbols listed. Answers are not rounded. What judges carries a \`verdict\` and the \`reason\` for it.

Sign in with \`POST /session\`, which sets cookies; whatever changes something carries the value of the cookie \`${xsrfCookie}\` in the header \`${xsrfHeader}\`. Errors are Problem Details (RFC 9457) whose \`errors\` name each field by its path, such as \`posts[2].angle\`. Unknown fields are refused. A body may have 100 kB.`;

export interface DocumentPlace {
  /** The cookie that a session is told by. */
  readonly accessCookie: string;
}

/** The OpenAPI document of the routes. */
export function documentOf(
  operations: readonly Operation[],
  { accessCookie }: DocumentPlace,
): OpenApiDocument {
  const paths: Record<string, PathItem> = {};
  for (const operation of operations) {
    paths[operation.path] = { ...paths[operation.path], [operation.method]: operationObject(operation) };
  }
  return {
    openapi: '3.1.0',
    info: { title: 'Second Spanner', version: '1', description: about },
    servers: [{ url: '/api' }],
    tags: [...new Set(operations.map(({ tag }) => tag))].map((name) => ({ name })),
    paths,
    components: {
      schemas: schemasUsed(paths),
      securitySchemes: {
        session: { type: 'apiKey', in: 'cookie', name: accessCookie },
        xsrf: { type: 'apiKey', in: 'header', name: xsrfHeader },
      },
    },
  };
}

function operationObject(operation: Operation): OperationObject {
  const { method, path, tag, summary, body, who } = operation;
  const parameters = parametersOf(operation);
  const changes: Readonly<Record<string, readonly string[]>> = needsXsrf(operation) ? { xsrf: [] } : {};
  return {
    operationId: `${method}${path.replaceAll(/[^a-z0-9]+(.)?/gi, (_sign, next: string | undefined) => (next ?? '').toUpperCase())}`,
    ...{
      tags: [tag],
      summary,
      description: [operation.description, whoMay(who)].filter(Boolean).join('\n\n'),
    },
    security: who === 'anyone' ? [changes] : [{ session: [], ...changes }],
    ...(parameters.length > 0 && { parameters }),
    ...(body && { requestBody: { required: true, content: contentOf(body) } }),
    responses: {
      ...Object.fromEntries(
        Object.entries(operation.answers).map(([status, { description, content, headers }]) => [
          status,
          {
            description,
            ...(headers && { headers: headersOf(headers) }),
            ...(content && { content: contentOf(content) }),
          },
        ]),
      ),
      ...refusalsOf(operation),
    },
  };
}

const headersOf = (headers: Readonly<Record<string, string>>) =>
  Object.fromEntries(
    Object.entries(headers).map(([name, description]) => [name, { description, schema: { type: 'string' } }]),
  );

function whoMay(who: Operation['who']): string {
  if (who === 'anyone') return 'Needs no sign-in.';
  if (who === 'signed-in') return 'For anybody who is signed in.';
  return `For: ${permissions[who].map((role) => role.replace('-', ' ')).join(', ')}.`;
}

const contentOf = ({
  media = 'application/json',
  schema,
  example,
}: Content): Readonly<Record<string, MediaType>> => ({
  [media]: { schema, ...(example !== undefined && { example }) },
});

const pathExamples: Readonly<Record<string, string>> = { code: '1.2', number: '2', key: 'convert' };

function parametersOf({ path, query = [], headers = [], freeQuery }: Operation): readonly ParameterObject[] {
  const inPath = [...path.matchAll(/\{(\w+)\}/g)].map(([, name = '']): ParameterObject => ({
    ...{ name, in: 'path', required: true, schema: { type: 'string' } },
    description: path.startsWith('/verifications') ? 'The code on the paper.' : pathWords(name),
    example: path.startsWith('/verifications')
      ? '7K3F-Q9TD'
      : (pathExamples[name] ?? '40ce5f96-b14d-4acc-8ea0-4d5e6f708192'),
  }));
  const given =
    (place: 'query' | 'header') =>
    ({ name, description, schema, example, required = false }: Parameter): ParameterObject => ({
      ...{ name, in: place, description, required, schema, example },
    });
  const free: readonly ParameterObject[] = freeQuery
    ? [
        {
          ...{ name: 'typed', in: 'query', required: false, style: 'form', explode: true, ...freeQuery },
          schema: { type: 'object', additionalProperties: { type: 'string' } },
        },
      ]
    : [];
  return [...inPath, ...query.map(given('query')), ...free, ...headers.map(given('header'))];
}

function pathWords(name: string): string {
  if (name === 'code') return 'The step’s code on its sheet.';
  if (name === 'number') return 'The number of the edition.';
  if (name === 'key') return 'The key of the working.';
  return 'Its id, a UUID.';
}
