// npm run seed: empties the database and loads the demo again. A database with other shops in it is refused,
// unless --yes is given: npm run seed -- --yes
import { onNode } from './lib/node-version.js';

onNode(() => import('./lib/seed-run.js'));
