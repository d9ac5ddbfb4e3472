import type { Request, RequestHandler } from 'express';
import { may, type Permission } from '@second-spanner/shared/contracts/permissions';
import { forbidden } from '../errors/http-problem.js';
import type { AccessClaims, AccessTokens } from './access-token.js';
import type { SessionCookies } from './cookies.js';
import { signedIn, type SignedIn } from './signed-in.js';

/** Reads who a session belongs to, now; null once it has ended or the person is locked out. */
export type ReadSession = (claims: AccessClaims) => Promise<SignedIn | null>;

const claimsOf = new WeakMap<Request, AccessClaims>();

/** Checks the access token, without a look at the database: enough to tell whose requests to count. */
export const accessClaims =
  (tokens: AccessTokens, cookies: SessionCookies): RequestHandler =>
  (request, _response, next) => {
    const token = cookies.access(request);
    const claims = token === null ? null : tokens.read(token);
    if (claims) claimsOf.set(request, claims);
    next();
  };

/** The account that the request's token names, if it carries a valid one. */
export const accountOf = (request: Request): string | undefined => claimsOf.get(request)?.personId;

/** Finds out who asks. Whether that matters is each route's to say, through `allow`. */
export const authentication =
  (read: ReadSession): RequestHandler =>
  async (request, _response, next) => {
    const claims = claimsOf.get(request);
    const found = claims && (await read(claims));
    if (found) request.signedIn = found;
    next();
  };

/** Any signed-in person. */
export const signedInOnly: RequestHandler = (request, _response, next) => {
  signedIn(request);
  next();
};

/** Only people whose role may do this, by the table of permissions. */
export const allow =
  (permission: Permission): RequestHandler =>
  (request, _response, next) => {
    const { person } = signedIn(request);
    if (!may(person.role, permission)) {
      throw forbidden('This is not for your role in the shop.');
    }
    next();
  };
