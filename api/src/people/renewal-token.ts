import { createHash, randomBytes } from 'node:crypto';
import { isId } from '../platform/validation/parse-id.js';

export interface RenewalToken {
  readonly shopId: string;
  readonly sessionId: string;
  readonly hash: string;
}

const hashOf = (secret: string): string => createHash('sha256').update(secret).digest('hex');

/** A new token of a session: the text for the browser, and the hash for the database. */
export function makeRenewalToken(
  shopId: string,
  sessionId: string,
): RenewalToken & { readonly text: string } {
  const secret = randomBytes(32).toString('base64url');
  return { shopId, sessionId, hash: hashOf(secret), text: `${shopId}.${sessionId}.${secret}` };
}

/** The parts of a token from a browser; null when it has not the form of one. */
export function readRenewalToken(text: string): RenewalToken | null {
  const [shopId, sessionId, secret, ...rest] = text.split('.');
  if (!isId(shopId) || !isId(sessionId) || !secret || rest.length > 0) return null;
  return { shopId, sessionId, hash: hashOf(secret) };
}
