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
const mostRemembered = 1_000;

/** Signs and checks the tokens that live ten minutes. */
export class AccessTokens {
  /** Tokens that were found good: a page asks many things with the same one. Oldest first. */
  private readonly remembered = new Map<string, { readonly claims: AccessClaims; readonly until: number }>();

  constructor(private readonly secret: KeyObject) {}

  sign({ sessionId, shopId, personId }: AccessClaims): string {
    return jwt.sign({ sid: sessionId, shop: shopId }, this.secret, {
      algorithm: 'HS256',
      expiresIn: accessSeconds,
      subject: personId,
      issuer,
      audience,
    });
  }

  /** The claims of a token that we signed and that has not run out; otherwise null. */
  read(token: string): AccessClaims | null {
    const known = this.remembered.get(token);
    if (known) return known.until > Date.now() ? known.claims : null;
    const found = this.verify(token);
    if (!found) return null;
    this.remembered.set(token, found);
    if (this.remembered.size > mostRemembered) {
      const oldest = this.remembered.keys().next();
      if (!oldest.done) this.remembered.delete(oldest.value);
    }
    return found.claims;
  }

  private verify(token: string): { claims: AccessClaims; until: number } | null {
    try {
      const payload = jwt.verify(token, this.secret, { algorithms: ['HS256'], issuer, audience });
      if (typeof payload === 'string') return null;
      const { sub: personId, exp } = payload;
      const sessionId: unknown = payload['sid'];
      const shopId: unknown = payload['shop'];
      if (!isId(sessionId) || !isId(shopId) || !isId(personId) || exp === undefined) return null;
      return { claims: { sessionId, shopId, personId }, until: exp * 1000 };
    } catch {
      return null;
    }
  }
}
