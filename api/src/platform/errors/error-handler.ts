import type { ErrorRequestHandler, RequestHandler } from 'express';
import type { Logger } from 'pino';
import { notFound } from './http-problem.js';
import { toProblem } from './to-problem.js';

/** Every address under /api that nothing answers. */
export const unknownRoute: RequestHandler = () => {
  throw notFound('address');
};

/** Answers every error as Problem Details; what nobody foresaw goes to the log whole. */
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
      .send(JSON.stringify(problem.toProblem()));
  };
