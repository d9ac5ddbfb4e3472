import 'reflect-metadata';
import { randomBytes } from 'node:crypto';
import { readConfig } from './config.js';
import { loadWholeDemo } from './demo/load-demo.js';
import { createDataSource } from './platform/database/data-source.js';
import { Database } from './platform/database/database.js';
import { refill } from './platform/database/loading.js';
import { createLog } from './platform/log.js';
import { sayWhy } from './say-why.js';
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
    const database = new Database(dataSource);
    await refill(dataSource, () => loadWholeDemo((now) => createServices(config, database, { now })));
  } finally {
    await dataSource.destroy();
  }
}

seed().catch(sayWhy);
