import { HttpXsrfTokenExtractor, type HttpInterceptorFn, type HttpRequest } from '@angular/common/http';
import { inject } from '@angular/core';
import { catchError, switchMap, throwError } from 'rxjs';
import { SessionStore } from '../session/session-store';
import { ApiProblem } from './api-problem';
import { takesRefusal } from './without-renewal';

const xsrfHeader = 'X-XSRF-TOKEN';

/** A 401 from these means what it says: a wrong password, or a session that has run out or is over. */
const isFinal = (request: HttpRequest<unknown>): boolean =>
  request.context.get(takesRefusal) ||
  request.url.endsWith('/api/session/renewal') ||
  (request.url.endsWith('/api/session') && request.method !== 'GET');

/** After a 401 the session is renewed once and the request sent again; failing that, it is over. */
export const renewal: HttpInterceptorFn = (request, next) => {
  const sessions = inject(SessionStore);
  const xsrf = inject(HttpXsrfTokenExtractor);

  return next(request).pipe(
    catchError((error: unknown) => {
      const signedOut = error instanceof ApiProblem && error.status === 401;
      if (!signedOut || isFinal(request)) return throwError(() => error);
      return sessions.renew().pipe(
        catchError((renewalError: unknown) => {
          const over = renewalError instanceof ApiProblem && !renewalError.noNetwork;
          if (over && !request.url.endsWith('/api/session')) sessions.ended();
          return throwError(() => (over ? error : renewalError));
        }),
        switchMap(() => next(withFreshToken(request, xsrf.getToken()))),
      );
    }),
  );
};

/** The renewal may have changed the XSRF cookie after this request's header was written. */
function withFreshToken(request: HttpRequest<unknown>, token: string | null): HttpRequest<unknown> {
  if (token === null || !request.headers.has(xsrfHeader)) return request;
  return request.clone({ headers: request.headers.set(xsrfHeader, token) });
}
