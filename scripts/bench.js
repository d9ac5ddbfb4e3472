// npm run bench: measures speed and size against their goals on a throw-away PostgreSQL that waits for its disk, and
// prints a table of goal, measured, verdict. Ratios are to a bare Express that answers a small JSON in the same run.
//   --full           the large shop in full (2,000 sheets, 800,000 steps, 2,000,000 entries) and not a tenth of it
//   --only=a,b       some parts: ratios, records, signing, bench-page, paper, sizes
//   --seconds=10     how long each load lasts
// Other work on the machine spoils the figures. They are no part of `npm test`.
import { onNode } from './lib/node-version.js';

onNode(() => import('./bench/run.js'));
