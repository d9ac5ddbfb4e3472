import { Router } from 'express';
import { publicLimit } from '../platform/http/rate-limits.js';
import type { VerificationService } from './verification.service.js';

/** `/verifications/:code`: whether a printed sheet is the one that was signed. Needs no sign-in. */
export function verificationRoutes(verification: VerificationService): Router {
  const router = Router();
  router.get('/:code', publicLimit(), async (request, response) => {
    response.json(await verification.verify(String(request.params['code'])));
  });
  return router;
}
