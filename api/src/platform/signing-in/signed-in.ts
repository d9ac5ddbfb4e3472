import type { Request } from 'express';
import type { Session } from '@second-spanner/shared/contracts/people';
import { notSignedIn } from '../errors/http-problem.js';

/** Who asks: read anew for every request, so that a change of role or a lock-out counts at once. */
export interface SignedIn extends Session {
  readonly sessionId: string;
}

declare module 'express-serve-static-core' {
  interface Request {
    /** Set by `authentication` where a valid session came with the request. */
    signedIn?: SignedIn;
  }
}

/** Who asks. Throws a 401 problem when nobody is signed in. */
export function signedIn(request: Request): SignedIn {
  if (!request.signedIn) throw notSignedIn();
  return request.signedIn;
}
