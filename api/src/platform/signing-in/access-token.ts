import type { KeyObject } from 'node:crypto';
import jwt from 'jsonwebtoken';
import { isId } from '../validation/parse-id.js';

/** What an access token says. Everything else about a person is read anew. */
export interface AccessClaims {
  readonly sessionId: string;
  readonly shopId: string;
  readonly personId: string;
}

export const accessSeconds = 600;
const issuer = 'second-spanner';
const audience = 'second-spanner-api';

/** A signed token that lives ten minutes. */
export function signAccess({ sessionId, shopId, personId }: AccessClaims, secret: KeyObject): string {
  return jwt.sign({ sid: sessionId, shop: shopId }, secret, {
    algorithm: 'HS256',
    expiresIn: accessSeconds,
    subject: personId,
    issuer,
    audience,
  });
}

/** The claims of a token that we signed and that has not run out; otherwise null. */
export function readAccess(token: string, secret: KeyObject): AccessClaims | null {
  try {
    const payload = jwt.verify(token, secret, { algorithms: ['HS256'], issuer, audience });
    if (typeof payload === 'string') return null;
    const { sub: personId } = payload;
    const sessionId: unknown = payload['sid'];
    const shopId: unknown = payload['shop'];
    return isId(sessionId) && isId(shopId) && isId(personId) ? { sessionId, shopId, personId } : null;
  } catch {
    return null;
  }
}
