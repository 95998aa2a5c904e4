import { randomUUID } from 'node:crypto';
import pg from 'pg';
import { migrate } from '../src/database/migrate.js';

const TEMPLATE = 'diffolio_template';
/** Any number; it keeps two test workers from making the template at once. */
const TEMPLATE_LOCK = 4_280;

function serverUrl(): string {
  const url = process.env['TEST_DATABASE_SERVER'];
  if (!url)
    throw new Error('TEST_DATABASE_SERVER is not set; run the tests through npm test or jest with its global set-up.');
  return url;
}

function urlOf(database: string): string {
  const url = new URL(serverUrl());
  url.pathname = `/${database}`;
  return url.toString();
}

async function withServer<T>(work: (client: pg.Client) => Promise<T>): Promise<T> {
  const client = new pg.Client(serverUrl());
  await client.connect();
  try {
    return await work(client);
  } finally {
    await client.end();
  }
}

async function ensureTemplate(client: pg.Client): Promise<void> {
  await client.query('SELECT pg_advisory_lock($1)', [TEMPLATE_LOCK]);
  try {
    const { rowCount } = await client.query('SELECT FROM pg_database WHERE datname = $1', [TEMPLATE]);
    if (rowCount) return;
    const unfinished = `${TEMPLATE}_${randomUUID().slice(0, 8)}`;
    await client.query(`CREATE DATABASE "${unfinished}"`);
    await migrate(urlOf(unfinished));
    await client.query(`ALTER DATABASE "${unfinished}" RENAME TO ${TEMPLATE}`);
  } finally {
    await client.query('SELECT pg_advisory_unlock($1)', [TEMPLATE_LOCK]);
  }
}

export interface TestDatabase {
  readonly url: string;
  drop(): Promise<void>;
}

/** A database of its own for one test file, migrated, empty. */
export async function createTestDatabase(options: { migrated?: boolean } = {}): Promise<TestDatabase> {
  const name = `test_${randomUUID().replaceAll('-', '')}`;
  await withServer(async (client) => {
    if (options.migrated ?? true) {
      await ensureTemplate(client);
      // Two copies of one template cannot be made at once.
      await client.query('SELECT pg_advisory_lock($1)', [TEMPLATE_LOCK]);
      await client.query(`CREATE DATABASE ${name} TEMPLATE ${TEMPLATE}`);
      await client.query('SELECT pg_advisory_unlock($1)', [TEMPLATE_LOCK]);
    } else {
      await client.query(`CREATE DATABASE ${name}`);
    }
  });
  return {
    url: urlOf(name),
    drop: () => withServer(async (client) => void (await client.query(`DROP DATABASE IF EXISTS ${name} WITH (FORCE)`))),
  };
}
