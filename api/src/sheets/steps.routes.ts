import { Router, type Request, type Response } from 'express';
import { allow } from '../platform/signing-in/authentication.js';
import { signedIn, type SignedIn } from '../platform/signing-in/signed-in.js';
import { parseBody } from '../platform/validation/parse-body.js';
import { parseId } from '../platform/validation/parse-id.js';
import { parseKey } from './once.service.js';
import { parseEntry, parseSecondReading } from './parse-content.js';
import type { SheetServices } from './sheet-services.js';
import type { StepAnswer } from './sheet-work.service.js';
import { NewCountersignatureDto, NewSnagDto, UnmarkCriticalDto } from './sheets.dto.js';

/** Who asks, and which step of which sheet the address names. */
type Place = readonly [who: SignedIn, sheetId: string, code: string];

function placeOf(request: Request): Place {
  const { id, code } = request.params;
  return [signedIn(request), parseId(id, 'sheet'), String(code)];
}

const keyOf = (request: Request): string => parseKey(request.get('idempotency-key'));

/** 201 for what is new; 200 when it was sent before. */
const answer = (response: Response, { isNew, detail }: StepAnswer): void => {
  response.status(isNew ? 201 : 200).json(detail);
};

/** `/sheets/:id/steps/:code`: one step, and what is recorded on it. Every answer is the step as it then stands. */
export function stepRoutes(services: SheetServices): Router {
  const { reading, entries, secondReadings, countersigning, snags, unmarking, calls } = services;
  const router = Router({ mergeParams: true });
  router.get('/', allow('sheets.read'), async (request, response) => {
    response.json(await reading.step(...placeOf(request)));
  });
  router.post('/entries', allow('entries.record'), async (request, response) => {
    const [place, key] = [placeOf(request), keyOf(request)];
    answer(response, await entries.record(...place, parseEntry(request.body), key));
  });
  router.post('/second-readings', allow('second-checks.make'), async (request, response) => {
    const [place, key] = [placeOf(request), keyOf(request)];
    answer(response, await secondReadings.keep(...place, parseSecondReading(request.body), key));
  });
  router.post('/countersignatures', allow('second-checks.make'), async (request, response) => {
    const [place, key] = [placeOf(request), keyOf(request)];
    const body = parseBody(NewCountersignatureDto, request.body);
    answer(response, await countersigning.countersign(...place, body, key));
  });
  router.post('/snags', allow('snags.raise'), async (request, response) => {
    answer(response, await snags.raise(...placeOf(request), parseBody(NewSnagDto, request.body)));
  });
  router.put('/unmarking', allow('sheets.unmark-critical'), async (request, response) => {
    const body = parseBody(UnmarkCriticalDto, request.body);
    const { detail } = await unmarking.unmark(...placeOf(request), body);
    response.json(detail);
  });
  router.post('/calls', allow('entries.record'), async (request, response) => {
    response.json(await calls.call(...placeOf(request)));
  });
  return router;
}
