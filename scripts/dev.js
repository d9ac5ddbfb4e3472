// npm run dev: as npm start, but everything is compiled again and reloaded when a source file changes.
import { onNode } from './lib/node-version.js';

onNode(() => import('./lib/dev-run.js'));
