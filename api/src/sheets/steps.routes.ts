import { Router, type Request, type Response } from 'express';
import type { CallAnswer } from '@second-spanner/shared/contracts/sheets';
import { allow } from '../platform/signing-in/authentication.js';
import { signedIn, type SignedIn } from '../platform/signing-in/signed-in.js';
import { parseBody } from '../platform/validation/parse-body.js';
import { parseId } from '../platform/validation/parse-id.js';
import { parseKey } from './once.service.js';
import { parseEntry, parseSecondReading } from './parse-content.js';
import type { SheetServices } from './sheet-services.js';
import { NewCountersignatureDto, NewSnagDto, UnmarkCriticalDto } from './sheets.dto.js';

/** Who asks, and which step of which sheet the address names. */
type Place = readonly [who: SignedIn, sheetId: string, code: string];

function placeOf(request: Request): Place {
  const { id, code } = request.params;
  return [signedIn(request), parseId(id, 'sheet'), String(code)];
}

const keyOf = (request: Request): string => parseKey(request.get('idempotency-key'));

/** 201 for what is new; 200 when it was sent before. */
const statusFor = (isNew: boolean): number => (isNew ? 201 : 200);

/** `/sheets/:id/steps/:code`: one step, and what is recorded on it. Every answer is the step as it then stands. */
export function stepRoutes(services: SheetServices): Router {
  const { reading, entries, secondReadings, countersigning, snags, unmarking, calls } = services;
  const router = Router({ mergeParams: true });
  const answer = async (response: Response, place: Place, status: number): Promise<void> => {
    response.status(status).json(await reading.step(...place));
  };
  router.get('/', allow('sheets.read'), async (request, response) => {
    await answer(response, placeOf(request), 200);
  });
  router.post('/entries', allow('entries.record'), async (request, response) => {
    const [place, key] = [placeOf(request), keyOf(request)];
    const isNew = await entries.record(...place, parseEntry(request.body), key);
    await answer(response, place, statusFor(isNew));
  });
  router.post('/second-readings', allow('second-checks.make'), async (request, response) => {
    const [place, key] = [placeOf(request), keyOf(request)];
    const isNew = await secondReadings.keep(...place, parseSecondReading(request.body), key);
    await answer(response, place, statusFor(isNew));
  });
  router.post('/countersignatures', allow('second-checks.make'), async (request, response) => {
    const [place, key] = [placeOf(request), keyOf(request)];
    const body = parseBody(NewCountersignatureDto, request.body);
    const isNew = await countersigning.countersign(...place, body, key);
    await answer(response, place, statusFor(isNew));
  });
  router.post('/snags', allow('snags.raise'), async (request, response) => {
    const place = placeOf(request);
    await snags.raise(...place, parseBody(NewSnagDto, request.body));
    await answer(response, place, 201);
  });
  router.put('/unmarking', allow('sheets.unmark-critical'), async (request, response) => {
    const place = placeOf(request);
    await unmarking.unmark(...place, parseBody(UnmarkCriticalDto, request.body));
    await answer(response, place, 200);
  });
  router.post('/calls', allow('entries.record'), async (request, response) => {
    const place = placeOf(request);
    const mailed = await calls.call(...place);
    const answered: CallAnswer = { ...(await reading.step(...place)), mailed };
    response.json(answered);
  });
  return router;
}
