import { Router } from 'express';
import { allow } from '../platform/signing-in/authentication.js';
import { signedIn } from '../platform/signing-in/signed-in.js';
import type { ToolsService } from './tools.service.js';

/** `/tools`: the register of measuring tools. */
export function toolRoutes(tools: ToolsService): Router {
  const router = Router();
  router.get('/', allow('tools.read'), async (request, response) => {
    response.json(await tools.list(signedIn(request)));
  });
  return router;
}
