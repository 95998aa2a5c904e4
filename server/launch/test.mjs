// `npm test`: every check and test, from a bare checkout, ending with `N passed, N failed` over all of them.
// `npm test -- server test/auth` runs one part, the words after its name going to the part's own runner.
import fs from 'node:fs';
import os from 'node:os';
import path from 'node:path';
import { requireBrowserTools } from './chromium.mjs';
import { buildClient, buildServer, installPackages } from './install.mjs';
import { requirePostgres, startPostgres } from './postgres.mjs';
import { launch, LaunchError, ROOT, runAloud, say } from './shell.mjs';

const bin = (name) => path.join(ROOT, 'node_modules/.bin', name);
/** What must be stopped before this process leaves. */
const leaving = [];
const readJson = (file) => (fs.existsSync(file) ? JSON.parse(fs.readFileSync(file, 'utf8')) : null);

/** A check passes or fails as one. */
async function check(name, command, args) {
  const { code } = await runAloud(command, args);
  return { name, passed: code === 0 ? 1 : 0, failed: code === 0 ? 0 : 1 };
}

/** A part that ran no test, or whose runner failed beside its tests, counts as failed. */
function tally(name, code, passed, failed) {
  const isBroken = failed === 0 && (passed === 0 || code !== 0);
  return { name, passed, failed: isBroken ? 1 : failed };
}

async function lint() {
  const eslint = await check('lint', bin('eslint'), ['.']);
  const directions = await check('directions', bin('depcruise'), [
    '--config',
    '.dependency-cruiser.cjs',
    'server/src',
    'client/src',
  ]);
  return { name: 'lint', passed: eslint.passed + directions.passed, failed: eslint.failed + directions.failed };
}

async function types() {
  const results = [];
  for (const project of ['server/tsconfig.spec.json', 'client/tsconfig.json', 'client/tsconfig.e2e.json']) {
    results.push(await check('types', bin('tsc'), ['-p', project, '--noEmit']));
  }
  return results.reduce((a, b) => ({ name: 'types', passed: a.passed + b.passed, failed: a.failed + b.failed }));
}

async function codegen() {
  const { code, output } = await runAloud(bin('graphql-codegen'), ['--config', 'codegen.ts', '--check']);
  const isCurrent = code === 0 && !/stale files/i.test(output);
  if (!isCurrent) say('client/src/gql is not what codegen makes of schema and operations: run `npm run codegen`.');
  return { name: 'codegen', passed: isCurrent ? 1 : 0, failed: isCurrent ? 0 : 1 };
}

async function server(scratch, args) {
  const file = path.join(scratch, 'jest.json');
  const postgres = await startPostgres(path.join(scratch, 'data'), { durable: false });
  leaving.push(postgres.stop);
  const { code } = await runAloud(bin('jest'), ['--json', `--outputFile=${file}`, ...args], {
    cwd: path.join(ROOT, 'server'),
    env: {
      ...process.env,
      NODE_ENV: 'test',
      TEST_DATABASE_SERVER: postgres.url('postgres'),
      NODE_OPTIONS: '--experimental-vm-modules --disable-warning=ExperimentalWarning',
    },
  });
  const report = readJson(file);
  return tally(
    'server',
    code,
    report?.numPassedTests ?? 0,
    (report?.numFailedTests ?? 0) + (report?.numRuntimeErrorTestSuites ?? 0),
  );
}

async function client(scratch, args) {
  const file = path.join(scratch, 'vitest.json');
  const { code } = await runAloud(
    bin('vitest'),
    ['run', '--reporter=default', '--reporter=json', `--outputFile.json=${file}`, ...args],
    {
      cwd: path.join(ROOT, 'client'),
      env: { ...process.env, NODE_ENV: 'test' },
    },
  );
  const report = readJson(file);
  return tally('client', code, report?.numPassedTests ?? 0, report?.numFailedTests ?? 0);
}

async function browser(scratch, args) {
  requireBrowserTools();
  buildServer();
  buildClient();
  const file = path.join(scratch, 'playwright.json');
  const { code } = await runAloud(
    bin('playwright'),
    ['test', '--config', 'client/e2e/playwright.config.ts', '--reporter=list,json', ...args],
    {
      env: { ...process.env, PLAYWRIGHT_JSON_OUTPUT_NAME: file },
    },
  );
  const stats = readJson(file)?.stats;
  return tally('browser', code, (stats?.expected ?? 0) + (stats?.flaky ?? 0), stats?.unexpected ?? 0);
}

const PARTS = {
  format: () => check('format', bin('prettier'), ['--check', '--log-level', 'warn', '.']),
  lint,
  types,
  codegen,
  server,
  client,
  browser,
};

await launch(async () => {
  const [only, ...rest] = process.argv.slice(2);
  if (only && !(only in PARTS))
    throw new LaunchError(`There is no part "${only}"; there are ${Object.keys(PARTS).join(', ')}.`);
  if (!only || only === 'server' || only === 'browser') requirePostgres();
  installPackages();
  const scratch = fs.mkdtempSync(path.join(os.tmpdir(), 'diffolio-test-'));
  fs.chmodSync(scratch, 0o711);
  const clear = async () => {
    for (const stop of leaving) await stop();
    fs.rmSync(scratch, { recursive: true, force: true });
  };
  for (const signal of ['SIGINT', 'SIGTERM']) process.on(signal, () => void clear().then(() => process.exit(130)));

  const results = [];
  try {
    for (const [name, part] of Object.entries(PARTS)) {
      if (only && name !== only) continue;
      say(`\n── ${name} ──`);
      const start = Date.now();
      const result = await part(scratch, only ? rest : []);
      results.push({ ...result, seconds: Math.round((Date.now() - start) / 1000) });
    }
  } finally {
    await clear();
  }
  say('');
  for (const { name, passed, failed, seconds } of results) {
    say(
      `${name.padEnd(10)} ${String(passed).padStart(5)} passed ${String(failed).padStart(4)} failed ${String(seconds).padStart(5)} s`,
    );
  }
  const total = (key) => results.reduce((sum, result) => sum + result[key], 0);
  process.stdout.write(`${total('passed')} passed, ${total('failed')} failed\n`);
  process.exit(total('failed') === 0 ? 0 : 1);
});
