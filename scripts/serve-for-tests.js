// Serves the built application for the browser tests at http://127.0.0.1:E2E_PORT: a fresh database with the demo,
// on the PostgreSQL that TEST_DATABASE_URL names or on a throw-away one. Started by client/playwright.config.ts.
import { onNode } from './lib/node-version.js';

onNode(() => import('./lib/serve-for-tests-run.js'));
