import { createSecretKey } from 'node:crypto';
import { mkdtemp, rm } from 'node:fs/promises';
import { createServer } from 'node:http';
import type { AddressInfo } from 'node:net';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { createApp } from '../app.js';
import type { Mail } from '../mail/mailer.js';
import { Database } from '../platform/database/database.js';
import { SheetEvents } from '../platform/live-events/sheet-events.js';
import { createLog } from '../platform/log.js';
import { createTestDatabase, type TestDatabase } from '../platform/testing/test-database.js';
import { withMountedRoutes } from '../openapi/testing/mounted-routes.js';
import { createServices, type Services } from '../services.js';

export interface TestApp {
  /** Where the application listens: `http://127.0.0.1:…`. */
  readonly address: string;
  readonly db: TestDatabase;
  readonly database: Database;
  readonly services: Services;
  /** Every route that is served, such as `GET /api/cars/{id}`. */
  readonly routes: readonly string[];
  /** Mails that would have gone out. */
  readonly sent: readonly Mail[];
  close(): Promise<void>;
}

export interface TestAppOptions {
  readonly clientDir?: string;
  readonly publicUrl?: string;
  readonly requestsPerMinute?: number;
  /** The mail server refuses everything. */
  readonly mailFails?: boolean;
}

/** The whole application on a database of its own, listening on a free port. */
export async function startTestApp(options: TestAppOptions = {}): Promise<TestApp> {
  const db = await createTestDatabase();
  const log = createLog('silent');
  const config = {
    secret: createSecretKey(Buffer.from('a secret that only tests know, of 32 characters')),
    publicUrl: new URL(options.publicUrl ?? 'http://127.0.0.1'),
    clientDir: options.clientDir ?? null,
    trustedProxies: 0,
    requestsPerMinute: options.requestsPerMinute ?? 1_000_000,
    dataDir: await mkdtemp(join(tmpdir(), 'second-spanner-photos-')),
    // The least that bcrypt takes: these passwords guard nothing.
    passwordCost: 4,
  };
  const events = new SheetEvents(db.url, log);
  const database = new Database(db.dataSource, (changes) => {
    events.publish(changes);
  });
  await events.start();
  const sent: Mail[] = [];
  const services = createServices(config, database, {
    sendMail: (mail) => {
      sent.push(mail);
      return Promise.resolve(options.mailFails !== true);
    },
  });
  const { made: application, routes } = withMountedRoutes(() =>
    createApp({ config, log, database, services, events, heartbeatMs: 300 }),
  );
  const server = createServer(application);
  await new Promise<void>((listening) => {
    server.listen(0, '127.0.0.1', listening);
  });
  const { port } = server.address() as AddressInfo;
  return {
    ...{ db, database, services, routes, sent },
    address: `http://127.0.0.1:${port}`,
    close: async () => {
      await events.stop();
      server.closeAllConnections();
      await new Promise((closed) => {
        server.close(closed);
      });
      await rm(config.dataDir, { recursive: true, force: true });
      await db.drop();
    },
  };
}
