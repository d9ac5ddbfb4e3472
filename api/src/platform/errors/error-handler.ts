import type { ErrorRequestHandler, Request, RequestHandler } from 'express';
import type { Logger } from 'pino';
import type { Problem } from '@second-spanner/shared/contracts/problem';
import { tradeText } from '@second-spanner/shared/contracts/trade-words';
import { notFound } from './http-problem.js';
import { toProblem } from './to-problem.js';

/** Every address under /api that nothing answers. */
export const unknownRoute: RequestHandler = () => {
  throw notFound('address');
};

/** Answers every error as Problem Details; what nobody foresaw goes to the log. */
export const errorHandler =
  (log: Logger): ErrorRequestHandler =>
  (error: unknown, request, response, next) => {
    if (response.headersSent) {
      next(error);
      return;
    }
    const problem = toProblem(error);
    if (problem.status >= 500) log.error({ err: error, path: request.path }, 'A request failed.');
    response
      .status(problem.status)
      .type('application/problem+json')
      .send(JSON.stringify(inWordsOf(request, problem.toProblem())));
  };

/** The problem's sentences in the trade words of the person who asks. */
function inWordsOf({ signedIn }: Request, problem: Problem): Problem {
  const dialect = signedIn?.person.dialect ?? signedIn?.shop.dialect ?? 'british';
  const { detail, errors } = problem;
  return {
    ...problem,
    ...(detail !== undefined && { detail: tradeText(detail, dialect) }),
    ...(errors && {
      errors: errors.map(({ field, message }) => ({ field, message: tradeText(message, dialect) })),
    }),
  };
}
