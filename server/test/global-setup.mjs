// Names the PostgreSQL that the launcher started; without the launcher, starts one for this run.
import path from 'node:path';
import os from 'node:os';
import fs from 'node:fs';
import { startPostgres } from '../launch/postgres.mjs';

export default async function setup() {
  if (process.env.TEST_DATABASE_SERVER) return;
  const folder = fs.mkdtempSync(path.join(os.tmpdir(), 'diffolio-test-'));
  fs.chmodSync(folder, 0o711);
  const postgres = await startPostgres(folder, { durable: false });
  process.env.TEST_DATABASE_SERVER = postgres.url('postgres');
  globalThis.stopTestPostgres = async () => {
    await postgres.stop();
    fs.rmSync(folder, { recursive: true, force: true });
  };
}
