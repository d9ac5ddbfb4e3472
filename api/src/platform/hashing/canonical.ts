import { createHash } from 'node:crypto';
import canonicalize from 'canonicalize';

/** JSON in the one form of RFC 8785, so that the same content always has the same hash. */
export function canonicalJson(value: unknown): string {
  const text = canonicalize(value);
  if (text === undefined) throw new TypeError('This value has no JSON form.');
  return text;
}

/** SHA-256 of a text in UTF-8, as 64 hexadecimal digits. */
export const sha256 = (text: string): string => createHash('sha256').update(text, 'utf8').digest('hex');

/** SHA-256 over a value's canonical JSON. */
export const canonicalHash = (value: unknown): string => sha256(canonicalJson(value));
