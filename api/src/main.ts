import 'reflect-metadata';
import { createServer } from 'node:http';
import type { AddressInfo } from 'node:net';
import type { Logger } from 'pino';
import { createApp } from './app.js';
import { ConfigError, readConfig } from './config.js';
import { seedDemo } from './demo/seed-demo.js';
import { createDataSource } from './platform/database/data-source.js';
import { Database } from './platform/database/database.js';
import { fillWhenEmpty } from './platform/database/loading.js';
import { migrate, passesRowSecurity } from './platform/database/migrate.js';
import { closeGracefully } from './platform/http/close-gracefully.js';
import { SheetEvents } from './platform/live-events/sheet-events.js';
import { createLog } from './platform/log.js';
import { createServices, type Services } from './services.js';

async function main(): Promise<void> {
  const config = readConfig(process.env);
  const log = createLog(config.logLevel);
  const dataSource = createDataSource({ url: config.databaseUrl, poolSize: config.poolSize, log });
  await dataSource.initialize();
  await migrate(dataSource);
  if (await passesRowSecurity(dataSource)) {
    log.warn('The database role passes by row-level security. Use one that is no superuser.');
  }
  const events = new SheetEvents(config.databaseUrl, log);
  const database = new Database(dataSource, (changes) => {
    events.publish(changes);
  });
  await events.start();
  const services = createServices(config, database);
  if (config.demo) await loadDemo(dataSource, services, log);
  const server = createServer(createApp({ config, log, database, services }));
  closeGracefully(server, log, {
    endStreams: () => events.stop(),
    close: () => dataSource.destroy(),
  });
  server.listen(config.port, config.host, () => {
    const { port } = server.address() as AddressInfo;
    log.info({ host: config.host, port }, 'Listening.');
  });
}

type DataSource = ReturnType<typeof createDataSource>;

async function loadDemo(dataSource: DataSource, services: Services, log: Logger): Promise<void> {
  const { people } = services;
  const loaded = await fillWhenEmpty(
    dataSource,
    () => people.holding(),
    () => seedDemo(services),
  );
  if (loaded) log.info('The demo is loaded.');
}

main().catch((error: unknown) => {
  const words = error instanceof ConfigError ? error.message : error;
  process.stderr.write(`${words instanceof Error ? (words.stack ?? words.message) : String(words)}\n`);
  process.exitCode = 1;
});
