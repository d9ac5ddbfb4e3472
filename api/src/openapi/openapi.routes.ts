import { Router } from 'express';
import type { ApiDocument } from './api-document.js';
import { docsPolicy } from './docs/style.js';

/** `/openapi.json` and `/docs`: what the api can do, for machines and for people. Need no sign-in. */
export function openApiRoutes(document: ApiDocument): Router {
  const router = Router();
  router.get('/openapi.json', async (_request, response) => {
    response.json(await document.asJson());
  });
  router.get('/docs', async (_request, response) => {
    response
      .set('Content-Security-Policy', docsPolicy)
      .type('html')
      .send(await document.asPage());
  });
  return router;
}
