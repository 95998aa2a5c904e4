import { randomUUID } from 'node:crypto';
import fs from 'node:fs/promises';
import os from 'node:os';
import path from 'node:path';
import { type NestFastifyApplication } from '@nestjs/platform-fastify';
import { createApp } from '../src/app.js';
import { type Env, readEnv } from '../src/config/env.js';
import { createTestDatabase } from './database.js';

export interface TestApp {
  readonly app: NestFastifyApplication;
  readonly env: Env;
  readonly databaseUrl: string;
  close(): Promise<void>;
}

/** The whole server on a database and a data folder of its own, listening on a free port. */
export async function startTestApp(settings: Record<string, string> = {}): Promise<TestApp> {
  const database = await createTestDatabase();
  const dataFolder = await fs.mkdtemp(path.join(os.tmpdir(), `diffolio-${randomUUID().slice(0, 8)}-`));
  const env = readEnv({
    NODE_ENV: 'test',
    LOG_LEVEL: 'fatal',
    PORT: '0',
    PASSWORD_MEMORY_KIB: '64',
    DATABASE_URL: database.url,
    DIFFOLIO_DATA_DIR: dataFolder,
    ...settings,
  });
  const app = await createApp(env);
  await app.listen(0, '127.0.0.1');
  return {
    app,
    env,
    databaseUrl: database.url,
    close: async () => {
      await app.close();
      await database.drop();
      await fs.rm(dataFolder, { recursive: true, force: true });
    },
  };
}
