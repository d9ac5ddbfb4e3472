import { HttpResponse, type HttpInterceptorFn } from '@angular/common/http';
import { inject } from '@angular/core';
import { catchError, tap, throwError } from 'rxjs';
import { toApiProblem } from './api-problem';
import { Network } from './network';

/** Every failed request ends in an `ApiProblem`; every answer tells whether there is a network. */
export const problemErrors: HttpInterceptorFn = (request, next) => {
  const network = inject(Network);
  return next(request).pipe(
    tap((event) => {
      if (event instanceof HttpResponse) network.answered();
    }),
    catchError((error: unknown) => {
      const problem = toApiProblem(error);
      if (problem.noNetwork) network.unanswered();
      else network.answered();
      return throwError(() => problem);
    }),
  );
};
