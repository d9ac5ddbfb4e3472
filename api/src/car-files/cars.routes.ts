import { Router } from 'express';
import { allow } from '../platform/signing-in/authentication.js';
import { signedIn } from '../platform/signing-in/signed-in.js';
import { parsePaging } from '../platform/validation/paging.js';
import { parseId } from '../platform/validation/parse-id.js';
import type { CarsService } from './cars.service.js';

/** `/cars`: the car files. */
export function carRoutes(cars: CarsService): Router {
  const router = Router();
  router.get('/', allow('cars.read'), async (request, response) => {
    response.json(await cars.list(signedIn(request), parsePaging(request.query)));
  });
  router.get('/:id', allow('cars.read'), async (request, response) => {
    response.json(await cars.find(signedIn(request), parseId(request.params['id'], 'car')));
  });
  return router;
}
