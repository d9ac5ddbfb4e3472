import { Router } from 'express';
import type { Database } from '../database/database.js';

const sharedForMs = 1_000;

/**
 * `/health`: whether the api and its database answer. It stands before every limit, so that a monitor always gets
 * through: those who ask within a second share one look at the database.
 */
export function healthRoutes(database: Pick<Database, 'ping'>, now = () => performance.now()): Router {
  const router = Router();
  let last = { at: -Infinity, ping: Promise.resolve() };
  router.get('/', async (_request, response) => {
    if (now() - last.at >= sharedForMs) last = { at: now(), ping: database.ping() };
    await last.ping;
    response.json({ status: 'ok' });
  });
  return router;
}
