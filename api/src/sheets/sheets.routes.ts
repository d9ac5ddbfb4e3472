import { Router, type Request } from 'express';
import { sheetStates } from '@second-spanner/shared/contracts/sheets';
import { badInput } from '../platform/errors/http-problem.js';
import { passwordLimit } from '../platform/http/rate-limits.js';
import { allow, signedInOnly } from '../platform/signing-in/authentication.js';
import { signedIn, type SignedIn } from '../platform/signing-in/signed-in.js';
import { byTime, parsePaging } from '../platform/validation/paging.js';
import { parseBody } from '../platform/validation/parse-body.js';
import { isId, parseId } from '../platform/validation/parse-id.js';
import { NewSheetDto, SendBackDto, SettleSnagDto, SignDto } from './sheets.dto.js';
import type { SheetServices } from './sheet-services.js';
import { stepRoutes } from './steps.routes.js';

/** `/sheets`: assembly sheets. */
export function sheetRoutes(services: SheetServices): Router {
  const { reading, history, layOut, start, snags, signing } = services;
  const router = Router();
  router.get('/', allow('sheets.read'), async (request, response) => {
    const paging = parsePaging(request.query, byTime);
    response.json(await reading.list(signedIn(request), parseFilter(request.query), paging));
  });
  router.post('/', allow('sheets.start'), async (request, response) => {
    const who = signedIn(request);
    const id = await layOut.layOut(who, parseBody(NewSheetDto, request.body));
    response.status(201).json(await reading.sheet(who, id));
  });
  router.get('/:id', allow('sheets.read'), async (request, response) => {
    const who = signedIn(request);
    const id = sheetId(request);
    const known = request.get('if-none-match');
    if (known !== undefined && known === etag(who, await reading.version(who, id))) {
      response.status(304).set('ETag', known).end();
      return;
    }
    const sheet = await reading.sheet(who, id);
    response.set('ETag', etag(who, sheet.version)).json(sheet);
  });
  router.post('/:id/start', allow('sheets.start'), async (request, response) => {
    const who = signedIn(request);
    await start.start(who, sheetId(request));
    response.json(await reading.sheet(who, sheetId(request)));
  });
  router.get('/:id/snags', allow('sheets.read'), async (request, response) => {
    response.json(await reading.snags(signedIn(request), sheetId(request)));
  });
  router.get('/:id/history', allow('sheets.read'), async (request, response) => {
    const paging = parsePaging(request.query);
    response.json(await history.lines(signedIn(request), sheetId(request), paging));
  });
  router.post('/:id/snags/:snagId/settlements', allow('snags.settle'), async (request, response) => {
    const [who, id] = [signedIn(request), sheetId(request)];
    const snagId = parseId(request.params['snagId'], 'snag');
    const { detail } = await snags.settle(who, id, snagId, parseBody(SettleSnagDto, request.body));
    response.json(detail);
  });
  router.post('/:id/signatures', signedInOnly, passwordLimit(), async (request, response) => {
    const [who, id] = [signedIn(request), sheetId(request)];
    await signing.sign(who, id, parseBody(SignDto, request.body));
    response.json(await reading.sheet(who, id));
  });
  router.post('/:id/send-back', allow('sheets.send-back'), async (request, response) => {
    const [who, id] = [signedIn(request), sheetId(request)];
    await signing.sendBack(who, id, parseBody(SendBackDto, request.body));
    response.json(await reading.sheet(who, id));
  });
  router.use('/:id/steps/:code', stepRoutes(services));
  return router;
}

/** A sheet reads otherwise for each person and role: what one may do on it, and what is covered from them. */
const etag = ({ person }: SignedIn, version: number): string => `"${version}-${person.id}-${person.role}"`;

export const sheetId = (request: Request): string => parseId(request.params['id'], 'sheet');

function parseFilter({ state, car }: Request['query']): Parameters<SheetServices['reading']['list']>[1] {
  const found = sheetStates.find((each) => each === state) ?? null;
  if (state !== undefined && found === null) {
    throw badInput({ field: 'state', message: `This must be one of ${sheetStates.join(', ')}.` });
  }
  if (car !== undefined && !isId(car))
    throw badInput({ field: 'car', message: 'This must be the id of a car.' });
  return { state: found, carId: car ?? null };
}
