// `npm run bench`: the benchmark tables; `npm run bench -- fits` one of them.
import fs from 'node:fs';
import os from 'node:os';
import path from 'node:path';
import { pathToFileURL } from 'node:url';
import { buildClient, buildServer, installPackages } from './install.mjs';
import { startPostgres } from './postgres.mjs';
import { launch, ROOT } from './shell.mjs';

await launch(async () => {
  installPackages();
  buildServer();
  buildClient();
  const scratch = fs.mkdtempSync(path.join(os.tmpdir(), 'diffolio-bench-'));
  fs.chmodSync(scratch, 0o711);
  const postgres = await startPostgres(path.join(scratch, 'data'));
  try {
    const { runBenches } = await import(pathToFileURL(path.join(ROOT, 'server/dist/bench/run-benches.js')).href);
    await runBenches((name) => {
      postgres.ensureDatabase(name);
      return postgres.url(name);
    }, process.argv.slice(2));
  } finally {
    await postgres.stop();
    fs.rmSync(scratch, { recursive: true, force: true });
  }
  process.exit(0);
});
