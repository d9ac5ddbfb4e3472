import { Router } from 'express';
import type { Database } from '../database/database.js';

/** `/health`: whether the api and its database answer. */
export function healthRoutes(database: Database): Router {
  const router = Router();
  router.get('/', async (_request, response) => {
    await database.ping();
    response.json({ status: 'ok' });
  });
  return router;
}
