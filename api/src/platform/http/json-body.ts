import express, { type RequestHandler } from 'express';
import { HttpProblem } from '../errors/http-problem.js';

const parse = express.json({ limit: '100kb', strict: false });

/** Reads a JSON body of at most 100 kB. A body of another type is refused rather than left unread. */
export const jsonBody: RequestHandler = (request, response, next) => {
  const { 'content-length': length, 'transfer-encoding': encoding } = request.headers;
  const hasBody = encoding !== undefined || (length !== undefined && length !== '0');
  if (hasBody && !request.is('application/json')) {
    throw new HttpProblem('unsupported-type', 'The request must be JSON: content-type application/json.');
  }
  parse(request, response, next);
};
