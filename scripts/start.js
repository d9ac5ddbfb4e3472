// npm start: installs what is missing, makes and starts a PostgreSQL cluster of its own, builds what is out of
// date, serves pages and api at http://127.0.0.1:4300 and a mailbox in place of the mail service.
// Settings: PORT, SECOND_SPANNER_DATA (folder for the data), DATABASE_URL (a PostgreSQL database to use instead),
// SMTP_URL and PUBLIC_URL (a real mail service and address), DEMO=0 (an empty database stays empty).
import { onNode } from './lib/node-version.js';

onNode(() => import('./lib/start-run.js'));
