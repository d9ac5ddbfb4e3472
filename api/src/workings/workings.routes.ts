import { Router } from 'express';
import { allow } from '../platform/signing-in/authentication.js';
import { signedIn } from '../platform/signing-in/signed-in.js';
import { sendPdf } from './send-pdf.js';
import type { WorkingPrints } from './working-prints.service.js';

/** `/workings/:key/pdf`: a working without a sheet, on paper. The case stands in the query. */
export function workingRoutes(prints: WorkingPrints): Router {
  const router = Router();
  router.get('/:key/pdf', allow('calculate'), async (request, response) => {
    const { paper, ...typed } = request.query;
    sendPdf(response, await prints.case(signedIn(request), String(request.params['key']), typed, paper));
  });
  return router;
}
