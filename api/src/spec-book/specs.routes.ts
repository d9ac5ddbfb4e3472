import { Router } from 'express';
import { allow } from '../platform/signing-in/authentication.js';
import { signedIn } from '../platform/signing-in/signed-in.js';
import { parsePaging } from '../platform/validation/paging.js';
import { parseId, parseNumber } from '../platform/validation/parse-id.js';
import type { SpecsService } from './specs.service.js';

/** `/specs`: the spec book. */
export function specRoutes(specs: SpecsService): Router {
  const router = Router();
  router.get('/', allow('specs.read'), async (request, response) => {
    response.json(await specs.list(signedIn(request), parsePaging(request.query)));
  });
  router.get('/:id/editions/:number', allow('specs.read'), async (request, response) => {
    const specId = parseId(request.params['id'], 'spec');
    const number = parseNumber(request.params['number'], 'edition');
    response.json(await specs.edition(signedIn(request), specId, number));
  });
  return router;
}
