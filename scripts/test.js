// npm test: installs what is missing, then runs every check and every test against a throw-away PostgreSQL.
// Everything runs, whatever failed before it; the last line is `N passed, N failed`.
import { onNode } from './lib/node-version.js';

onNode(() => import('./lib/test-run.js'));
