import { DataSource } from 'typeorm';
import type { Logger } from 'pino';
import { entities } from './entities.js';
import { migrations } from './migrations/index.js';

export interface DataSourceOptions {
  readonly url: string;
  readonly poolSize: number;
  readonly log: Logger;
}

/** A data source on PostgreSQL. The schema comes from the migrations alone. */
export function createDataSource({ url, poolSize, log }: DataSourceOptions): DataSource {
  return new DataSource({
    type: 'postgres',
    url,
    poolSize,
    entities,
    migrations,
    synchronize: false,
    migrationsTransactionMode: 'all',
    applicationName: 'second-spanner',
    connectTimeoutMS: 5_000,
    // Without a listener an idle connection that PostgreSQL drops would end the process.
    poolErrorHandler: (error: unknown) => {
      log.warn({ err: error }, 'A database connection was lost.');
    },
  });
}
