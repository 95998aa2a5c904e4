import { DataSource, type DataSourceOptions } from 'typeorm';

/** How long the server waits for PostgreSQL before it says so, ms. A database that hangs must not hang its callers. */
const CONNECT_TIMEOUT_MS = 2_000;
const STATEMENT_TIMEOUT_MS = 60_000;
const IDLE_IN_TRANSACTION_TIMEOUT_MS = 30_000;

/** Entities and migrations by glob, so that this inner folder imports no feature. */
export function dataSourceOptions(url: string): DataSourceOptions {
  const here = import.meta.dirname;
  return {
    type: 'postgres',
    url,
    entities: [`${here}/../**/*.entity.{ts,js}`],
    migrations: [`${here}/migrations/*.{ts,js}`],
    migrationsRun: false,
    synchronize: false,
    installExtensions: false,
    logging: false,
    poolSize: 10,
    extra: {
      connectionTimeoutMillis: CONNECT_TIMEOUT_MS,
      query_timeout: STATEMENT_TIMEOUT_MS + CONNECT_TIMEOUT_MS,
      statement_timeout: STATEMENT_TIMEOUT_MS,
      idle_in_transaction_session_timeout: IDLE_IN_TRANSACTION_TIMEOUT_MS,
      keepAlive: true,
    },
  };
}

export function createDataSource(url: string): DataSource {
  return new DataSource(dataSourceOptions(url));
}
