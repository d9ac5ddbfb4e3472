import type { MediaType, OpenApiDocument, OperationObject } from '../document-types.js';
import { SchemaChecks } from './schema-checks.js';
import { testDocument } from './test-document.js';

/** A request and its answer, as a test saw them. */
export interface Exchange {
  readonly method: string;
  /** With its query, if it has one. */
  readonly path: string;
  readonly sent: unknown;
  readonly status: number;
  readonly type: string;
  readonly body: unknown;
}

const document = await testDocument();
const checks = new SchemaChecks(document);
const paths = Object.keys(document.paths)
  .map((path) => ({ path, pattern: new RegExp(`^/api${path.replaceAll(/\{\w+\}/g, '[^/]+')}/?$`, 'i') }))
  // What is written out goes before what a parameter stands for.
  .sort((a, b) => a.path.split('{').length - b.path.split('{').length);

/** What of an exchange is not as the document says, in a sentence; null when all is. */
export function exchangeTrouble(exchange: Exchange): string | null {
  const [address = ''] = exchange.path.split('?', 1);
  const path = paths.find(({ pattern }) => pattern.test(address))?.path;
  const method = exchange.method.toLowerCase() as keyof OpenApiDocument['paths'][string];
  const operation = path === undefined ? undefined : document.paths[path]?.[method];
  if (!/^\/api(?:\/|$)/.test(address)) return null;
  // An address or a method that is not there is answered without a route.
  if (path === undefined || !operation)
    return exchange.status < 300 ? 'This route is not in the document.' : null;
  const at = ['paths', path, method];
  return answerTrouble(exchange, operation, at) ?? requestTrouble(exchange, operation, at);
}

function answerTrouble(
  { status, type, body }: Exchange,
  { responses }: OperationObject,
  at: readonly string[],
): string | null {
  const response = responses[String(status)];
  if (!response) return `The status ${status} is not in the document.`;
  if (!response.content) return null;
  const media = response.content[type];
  if (!media) return `The document has no ${type} for ${status}.`;
  if (!type.endsWith('json')) return null;
  const place = [...at, 'responses', String(status), 'content', type, 'schema'];
  const trouble = checks.trouble('answers', place, body);
  return trouble && `The answer is off its schema: ${trouble}`;
}

function requestTrouble(
  { status, sent }: Exchange,
  { requestBody }: OperationObject,
  at: readonly string[],
): string | null {
  const media: MediaType | undefined = requestBody?.content['application/json'];
  if (status >= 300 || !media) return null;
  const place = [...at, 'requestBody', 'content', 'application/json', 'schema'];
  const value: unknown = typeof sent === 'string' ? JSON.parse(sent) : sent;
  const trouble = checks.trouble('requests', place, value);
  return trouble && `The request was taken though it is off its schema: ${trouble}`;
}
