import { readdirSync } from 'node:fs';
import path from 'node:path';
import { pathToFileURL } from 'node:url';
import { DataSource, type DataSourceOptions } from 'typeorm';

/** How long the server waits for PostgreSQL before it says so, ms. A database that hangs must not hang its callers. */
const CONNECT_TIMEOUT_MS = 5_000;
const STATEMENT_TIMEOUT_MS = 60_000;
const IDLE_IN_TRANSACTION_TIMEOUT_MS = 30_000;

type Constructor = new () => object;

/**
 * Entities and migrations by the names of their files, so that this inner folder imports no feature. They are imported
 * here and not by TypeORM, whose `Function('… import …')` a second test file of one process cannot run.
 */
const entities = await classesIn(path.join(import.meta.dirname, '..'), /\.entity\.[jt]s$/);
const migrations = await classesIn(path.join(import.meta.dirname, 'migrations'), /\d-[a-z-]+\.[jt]s$/);

async function classesIn(folder: string, name: RegExp): Promise<Constructor[]> {
  const files = readdirSync(folder, { recursive: true, encoding: 'utf8' }).filter((file) => name.test(file));
  const classes: Constructor[] = [];
  // One after another: entities import each other, and Jest links a module that is being linked badly.
  for (const file of files.sort()) {
    const module = (await import(pathToFileURL(path.join(folder, file)).href)) as Record<string, unknown>;
    classes.push(...(Object.values(module).filter((value) => typeof value === 'function') as Constructor[]));
  }
  return classes;
}

export function dataSourceOptions(url: string): DataSourceOptions {
  return {
    type: 'postgres',
    url,
    entities,
    migrations,
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
