import 'reflect-metadata';
import { randomBytes } from 'node:crypto';
import { ConfigError, readConfig } from './config.js';
import { seedDemo } from './demo/seed-demo.js';
import { createDataSource } from './platform/database/data-source.js';
import { Database } from './platform/database/database.js';
import { refill } from './platform/database/loading.js';
import { createLog } from './platform/log.js';
import { createServices } from './services.js';

/** Empties the database and loads the demo. Nobody signs in meanwhile, so that any secret does. */
async function seed(): Promise<void> {
  const secret = process.env['JWT_SECRET'] ?? randomBytes(32).toString('hex');
  const config = readConfig({ ...process.env, JWT_SECRET: secret });
  const dataSource = createDataSource({
    url: config.databaseUrl,
    poolSize: config.poolSize,
    log: createLog(config.logLevel),
  });
  await dataSource.initialize();
  try {
    const services = createServices(config, new Database(dataSource));
    await refill(dataSource, () => seedDemo(services));
  } finally {
    await dataSource.destroy();
  }
}

seed().catch((error: unknown) => {
  const words = error instanceof ConfigError ? error.message : error;
  process.stderr.write(`${words instanceof Error ? (words.stack ?? words.message) : String(words)}\n`);
  process.exitCode = 1;
});
