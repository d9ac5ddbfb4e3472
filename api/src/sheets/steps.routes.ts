import { Router, type Request, type Response } from 'express';
import { allow } from '../platform/signing-in/authentication.js';
import { signedIn, type SignedIn } from '../platform/signing-in/signed-in.js';
import { parseId } from '../platform/validation/parse-id.js';
import { parseKey } from './once.service.js';
import { parseEntry } from './parse-content.js';
import type { SheetServices } from './sheet-services.js';

/** Which step an address names, and who asks. */
interface Place {
  readonly who: SignedIn;
  readonly id: string;
  readonly code: string;
}

function placeOf(request: Request): Place {
  const { id, code } = request.params;
  return { who: signedIn(request), id: parseId(id, 'sheet'), code: String(code) };
}

/** `/sheets/:id/steps/:code`: one step, and what is recorded on it. */
export function stepRoutes({ reading, entries }: SheetServices): Router {
  const router = Router({ mergeParams: true });
  const answer = async (response: Response, { who, id, code }: Place, status: number): Promise<void> => {
    response.status(status).json(await reading.step(who, id, code));
  };
  router.get('/', allow('sheets.read'), async (request, response) => {
    await answer(response, placeOf(request), 200);
  });
  router.post('/entries', allow('entries.record'), async (request, response) => {
    const place = placeOf(request);
    const key = parseKey(request.get('idempotency-key'));
    const isNew = await entries.record(place.who, place.id, place.code, parseEntry(request.body), key);
    await answer(response, place, isNew ? 201 : 200);
  });
  return router;
}
