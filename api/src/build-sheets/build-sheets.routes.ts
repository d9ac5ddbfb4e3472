import { Router } from 'express';
import { allow } from '../platform/signing-in/authentication.js';
import { signedIn } from '../platform/signing-in/signed-in.js';
import { parseId } from '../platform/validation/parse-id.js';
import type { BuildSheetsService } from './build-sheets.service.js';

/** `/sheets/:id/build-sheet.pdf`: a sheet on paper. */
export function buildSheetRoutes(buildSheets: BuildSheetsService): Router {
  const router = Router();
  router.get('/:id/build-sheet.pdf', allow('build-sheets.read'), async (request, response) => {
    const id = parseId(request.params['id'], 'sheet');
    const { name, pdf } = await buildSheets.print(signedIn(request), id, request.query['paper']);
    response.type('application/pdf').set('Content-Disposition', `inline; filename="${name}"`).send(pdf);
  });
  return router;
}
