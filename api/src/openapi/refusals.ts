import { STATUS_CODES } from 'node:http';
import { refTo } from '../platform/schemas/json-schema.js';
import type { Operation } from './operation.js';
import type { ResponseObject } from './document-types.js';

const everywhere: Readonly<Record<number, string>> = {
  400: 'Something asked cannot be used: `errors` names each field and says what would be right.',
  401: 'Nobody is signed in.',
  403: 'Not for this role, or the XSRF token is missing.',
  404: 'There is no such thing, or it is not this person’s to see: the answer is the same.',
  413: 'The request is too large.',
  415: 'The request is not of the type that is asked for.',
  429: 'Too many requests. `Retry-After` says when to come back.',
  503: 'The database is away just now.',
};

/** Whether a request must carry the XSRF token: whatever changes something but signing in, which sets it. */
export const needsXsrf = ({ method, path }: Operation): boolean =>
  method !== 'get' && !(method === 'post' && path === '/session');

/** Every way in which a route can refuse, by status. A 500 is in none of them: it is a fault of ours. */
export function refusalsOf(operation: Operation): Readonly<Record<string, ResponseObject>> {
  const said = { ...Object.fromEntries(statusesOf(operation).map((status) => [status, everywhere[status]])) };
  const own = Object.entries(operation.refusals ?? {});
  for (const [status, sentence] of own) said[status] = sentence;
  return Object.fromEntries(
    Object.entries(said).map(([status, sentence = '']) => [status, problemAnswer(Number(status), sentence)]),
  );
}

function statusesOf(operation: Operation): readonly number[] {
  const { method, path, who, query, headers, freeQuery } = operation;
  const ofRole = who !== 'anyone' && who !== 'signed-in';
  const writes = method !== 'get';
  const named = /\{/.test(path);
  const asks = named || writes || [query, headers, freeQuery].some((part) => part !== undefined);
  return [
    ...(asks ? [400] : []),
    ...(who === 'anyone' ? [] : [401]),
    ...(ofRole || needsXsrf(operation) ? [403] : []),
    ...(named ? [404] : []),
    ...(writes ? [413, 415] : []),
    ...(path === '/health' ? [] : [429]),
    503,
  ];
}

function problemAnswer(status: number, description: string): ResponseObject {
  const detail = description.split(/[.:;]/, 1)[0] ?? description;
  const example = {
    ...{ type: 'about:blank', title: STATUS_CODES[status] ?? '', status, detail: `${detail}.` },
    ...(status === 400 && { errors: [{ field: 'quantity.unit', message: 'This must be a unit.' }] }),
  };
  return { description, content: { 'application/problem+json': { schema: refTo('Problem'), example } } };
}
