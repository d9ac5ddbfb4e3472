import { Router } from 'express';
import { allow } from '../platform/signing-in/authentication.js';
import { signedIn } from '../platform/signing-in/signed-in.js';
import type { BenchService } from './bench.service.js';

/** `/bench`: what waits for the person. */
export function benchRoutes(bench: BenchService): Router {
  const router = Router();
  router.get('/', allow('sheets.read'), async (request, response) => {
    response.json(await bench.read(signedIn(request)));
  });
  return router;
}
