import { timingSafeEqual } from 'node:crypto';
import type { RequestHandler } from 'express';
import { forbidden } from '../errors/http-problem.js';
import { xsrfCookie, xsrfHeader } from './cookies.js';

const harmless = new Set(['GET', 'HEAD', 'OPTIONS']);

/**
 * Refuses what another site could have made the browser send: whatever changes something must carry the
 * cookie's token in a header too. Signing in sets the cookie, so it goes without.
 */
export const xsrf: RequestHandler = (request, _response, next) => {
  const signsIn = request.method === 'POST' && /^\/session\/?$/i.test(request.path);
  if (!harmless.has(request.method) && !signsIn) {
    const cookies = request.cookies as Readonly<Record<string, unknown>>;
    const sent = request.get(xsrfHeader);
    if (!same(cookies[xsrfCookie], sent)) throw forbidden('The XSRF token is missing or not the right one.');
  }
  next();
};

function same(cookie: unknown, header: string | undefined): boolean {
  if (typeof cookie !== 'string' || cookie === '' || header === undefined) return false;
  const [a, b] = [Buffer.from(cookie), Buffer.from(header)];
  return a.length === b.length && timingSafeEqual(a, b);
}
