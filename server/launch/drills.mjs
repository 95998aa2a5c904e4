// `npm run drills`: the long reliability drills, too slow for `npm test`.
import fs from 'node:fs';
import os from 'node:os';
import path from 'node:path';
import { buildServer, installPackages } from './install.mjs';
import { startPostgres } from './postgres.mjs';
import { launch, ROOT, runAloud } from './shell.mjs';

await launch(async () => {
  installPackages();
  buildServer();
  const scratch = fs.mkdtempSync(path.join(os.tmpdir(), 'diffolio-drills-'));
  fs.chmodSync(scratch, 0o711);
  const postgres = await startPostgres(path.join(scratch, 'data'), { durable: true });
  const file = path.join(scratch, 'jest.json');
  let code;
  try {
    ({ code } = await runAloud(
      path.join(ROOT, 'node_modules/.bin/jest'),
      ['--config', 'jest.drills.config.mjs', '--json', `--outputFile=${file}`],
      {
        cwd: path.join(ROOT, 'server'),
        env: {
          ...process.env,
          NODE_ENV: 'test',
          NODE_OPTIONS: '--experimental-vm-modules --disable-warning=ExperimentalWarning',
          TEST_DATABASE_SERVER: postgres.url('postgres'),
        },
      },
    ));
  } finally {
    await postgres.stop();
  }
  const report = fs.existsSync(file) ? JSON.parse(fs.readFileSync(file, 'utf8')) : null;
  fs.rmSync(scratch, { recursive: true, force: true });
  const passed = report?.numPassedTests ?? 0;
  const failed = (report?.numFailedTests ?? 0) + (report?.numRuntimeErrorTestSuites ?? 0);
  const isBroken = failed === 0 && (passed === 0 || code !== 0);
  process.stdout.write(`drills: ${passed} passed, ${isBroken ? 1 : failed} failed\n`);
  process.exit(failed === 0 && !isBroken ? 0 : 1);
});
