import { Router, type RequestHandler } from 'express';
import { badInput } from '../platform/errors/http-problem.js';
import { unknownFieldsOf } from '../platform/schemas/known-fields.js';
import { allow } from '../platform/signing-in/authentication.js';
import { calculations } from './calculations.js';
import type { Calculation } from './define-calculation.js';

/** `/calculations`: the workings, without a sheet. Each calculation checks its own request. */
export function calculationRoutes(): Router {
  const router = Router();
  const mayCalculate = allow('calculate');
  for (const calculation of calculations) {
    router.post(`/${calculation.name}`, mayCalculate, answer(calculation));
  }
  return router;
}

function answer({ request: type, calculate }: Calculation): RequestHandler {
  const unknownFields = unknownFieldsOf(type);
  return async (request, response) => {
    const body: unknown = request.body;
    if (typeof body !== 'object' || body === null || Array.isArray(body)) {
      throw badInput({ field: '', message: 'The request must be a JSON object.' });
    }
    const unknown = unknownFields(body);
    if (unknown.length > 0) throw badInput(...unknown);
    response.json(await calculate(body));
  };
}
