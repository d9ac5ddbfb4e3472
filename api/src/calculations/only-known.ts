import { badInput } from '../platform/errors/http-problem.js';

/** Every field that a request has, as keys, so that the compiler finds a forgotten one. */
export type FieldsOf<T> = Readonly<Record<keyof T, true>>;

/** Refuses a body that is no object, or has a field that the request does not know. The rest is left as it came. */
export function onlyKnown<T extends object>(body: unknown, fields: FieldsOf<T>): T {
  if (typeof body !== 'object' || body === null || Array.isArray(body)) {
    throw badInput({ field: '', message: 'The request must be a JSON object.' });
  }
  const known = Object.keys(fields);
  const unknown = Object.keys(body).filter((name) => !known.includes(name));
  if (unknown.length > 0) {
    const message = `This field is not known here; known are ${known.join(', ')}.`;
    throw badInput(...unknown.slice(0, 10).map((name) => ({ field: name.slice(0, 100), message })));
  }
  return body as T;
}
