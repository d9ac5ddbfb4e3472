import 'reflect-metadata';
import { createServer, type Server } from 'node:http';
import type { AddressInfo } from 'node:net';
import type { Logger } from 'pino';
import { createApp } from './app.js';
import { printOnThread } from './printing/print-thread.js';
import { readConfig, type Config } from './config.js';
import { loadWholeDemo } from './demo/load-demo.js';
import { HashingThread } from './people/hashing-thread.js';
import { createMailer } from './mail/mailer.js';
import { createDataSource } from './platform/database/data-source.js';
import { Database } from './platform/database/database.js';
import { fillWhenEmpty } from './platform/database/loading.js';
import { migrate, passesRowSecurity } from './platform/database/migrate.js';
import { closeGracefully } from './platform/http/close-gracefully.js';
import { SheetEvents } from './platform/live-events/sheet-events.js';
import { createLog } from './platform/log.js';
import { sayWhy } from './say-why.js';
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
  const hashing = new HashingThread();
  const services = createServices({ ...config, hashing, print: printOnThread() }, database, {
    sendMail: createMailer(config.smtpUrl, config.publicUrl, log),
  });
  if (config.demo) {
    await loadDemo(dataSource, (now) => createServices({ ...config, hashing }, database, { now }), log);
  }
  const server = createServer(createApp({ config, log, database, services, events }));
  closeGracefully(server, log, {
    endStreams: () => events.stop(),
    close: () => dataSource.destroy(),
  });
  const port = await listen(server, config);
  log.info({ host: config.host, port }, 'Listening.');
}

async function listen(server: Server, { port, host }: Config): Promise<number> {
  await new Promise<void>((listening, refused) => {
    server.once('error', refused);
    server.listen(port, host, listening);
  });
  return (server.address() as AddressInfo).port;
}

type DataSource = ReturnType<typeof createDataSource>;

async function loadDemo(
  dataSource: DataSource,
  servicesBy: (now: () => Date) => Services,
  log: Logger,
): Promise<void> {
  const { people } = servicesBy(() => new Date());
  const loaded = await fillWhenEmpty(
    dataSource,
    () => people.holding(),
    () => loadWholeDemo(servicesBy),
  );
  if (loaded) log.info('The demo is loaded.');
}

main().catch(sayWhy);
