import { Router, type Request } from 'express';
import { allow } from '../platform/signing-in/authentication.js';
import { signedIn } from '../platform/signing-in/signed-in.js';
import { byTime, parsePaging } from '../platform/validation/paging.js';
import { parseBody } from '../platform/validation/parse-body.js';
import { parseId } from '../platform/validation/parse-id.js';
import { KeepWorkingDto } from './kept-workings.dto.js';
import type { KeptWorkingsService } from './kept-workings.service.js';
import { sendPdf } from './send-pdf.js';
import type { WorkingPrints } from './working-prints.service.js';

const carOf = (request: Request): string => parseId(request.params['carId'], 'car');
const idOf = (request: Request): string => parseId(request.params['id'], 'working');

/** `/cars/:carId/workings`: workings kept with a car. */
export function keptWorkingRoutes(kept: KeptWorkingsService, prints: WorkingPrints): Router {
  const router = Router();
  router.get('/:carId/workings', allow('cars.read'), async (request, response) => {
    response.json(await kept.list(signedIn(request), carOf(request), parsePaging(request.query, byTime)));
  });
  router.post('/:carId/workings', allow('workings.keep'), async (request, response) => {
    const [who, carId] = [signedIn(request), carOf(request)];
    response.status(201).json(await kept.keep(who, carId, parseBody(KeepWorkingDto, request.body)));
  });
  router.get('/:carId/workings/:id', allow('cars.read'), async (request, response) => {
    response.json(await kept.find(signedIn(request), carOf(request), idOf(request)));
  });
  router.get('/:carId/workings/:id/pdf', allow('cars.read'), async (request, response) => {
    const place = { carId: carOf(request), id: idOf(request) };
    sendPdf(response, await prints.kept(signedIn(request), place, request.query['paper']));
  });
  return router;
}
