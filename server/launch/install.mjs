// Brings node_modules to what package-lock.json says and builds what is missing or older than its sources.
import { createHash } from 'node:crypto';
import fs from 'node:fs';
import path from 'node:path';
import { newestChange, ROOT, run, say } from './shell.mjs';

/** Written after an install, so that a broken one is done again: the hash of the lock file it was made from. */
const INSTALLED = path.join(ROOT, 'node_modules/.installed-lock-sha256');

export function installPackages() {
  const lock = createHash('sha256')
    .update(fs.readFileSync(path.join(ROOT, 'package-lock.json')))
    .digest('hex');
  if (fs.existsSync(INSTALLED) && fs.readFileSync(INSTALLED, 'utf8') === lock) return;
  say('Installing packages …');
  run('npm', ['ci', '--include=dev', '--no-audit', '--no-fund', '--loglevel=error']);
  fs.writeFileSync(INSTALLED, lock);
}

const isTest = (file) => /\.(spec|e2e-spec)\.tsx?$/.test(file) || /\/(node_modules|dist|e2e)\//.test(file);

function isBuilt(product, sources) {
  return fs.existsSync(product) && fs.statSync(product).mtimeMs >= newestChange(sources, isTest);
}

const at = (...parts) => path.join(ROOT, ...parts);

export function buildServer() {
  const product = at('server/dist/src/main.js');
  const sources = [
    at('server/src'),
    at('server/seeds'),
    at('server/tsconfig.json'),
    at('tsconfig.json'),
    at('server/package.json'),
  ];
  if (isBuilt(product, sources)) return;
  say('Building the server …');
  fs.rmSync(at('server/dist'), { recursive: true, force: true });
  run('npm', ['run', 'build', '-w', 'server', '--silent']);
  fs.utimesSync(product, new Date(), new Date());
}

export function buildClient() {
  const product = at('client/dist/index.html');
  const sources = [
    at('client/src'),
    at('client/index.html'),
    at('client/graphql.html'),
    at('client/vite.config.ts'),
    at('client/package.json'),
    at('schema'),
  ];
  if (isBuilt(product, sources)) return;
  say('Building the pages …');
  run('npm', ['run', 'build', '-w', 'client', '--silent'], { env: { ...process.env, NODE_ENV: 'production' } });
  fs.utimesSync(product, new Date(), new Date());
}
