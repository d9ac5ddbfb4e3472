import compressionOf from 'compression';
import type { RequestHandler } from 'express';
import helmetOf from 'helmet';

/**
 * Security headers. Styles may stand in the page because Angular puts each component's own there; scripts
 * may not. Photos are drawn from blobs before they are sent.
 */
export const securityHeaders = (secure: boolean): RequestHandler =>
  helmetOf({
    contentSecurityPolicy: {
      useDefaults: false,
      directives: {
        defaultSrc: ["'self'"],
        baseUri: ["'self'"],
        connectSrc: ["'self'"],
        fontSrc: ["'self'"],
        formAction: ["'self'"],
        frameAncestors: ["'none'"],
        imgSrc: ["'self'", 'data:', 'blob:'],
        manifestSrc: ["'self'"],
        objectSrc: ["'none'"],
        scriptSrc: ["'self'"],
        scriptSrcAttr: ["'none'"],
        styleSrc: ["'self'", "'unsafe-inline'"],
        workerSrc: ["'self'"],
        ...(secure && { upgradeInsecureRequests: [] }),
      },
    },
    frameguard: { action: 'deny' },
    referrerPolicy: { policy: 'no-referrer' },
    strictTransportSecurity: secure && { maxAge: 31_536_000, includeSubDomains: true },
  });

/** Compresses what gains by it; a stream of events must not wait for a full buffer. */
export function compression(): RequestHandler {
  const compress = compressionOf({
    filter: (request, response) =>
      !String(response.getHeader('content-type')).startsWith('text/event-stream') &&
      compressionOf.filter(request, response),
  });
  return (request, response, next) => {
    if (request.headers['accept-encoding'] === undefined) next();
    else compress(request, response, next);
  };
}

/** Answers of the api belong to one person and one moment: no cache in between keeps them. */
export const noStore: RequestHandler = (_request, response, next) => {
  response.setHeader('Cache-Control', 'no-store');
  next();
};
