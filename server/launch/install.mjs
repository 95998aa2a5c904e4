// Brings node_modules to what package-lock.json says and builds what is missing or older than its sources.
import fs from 'node:fs';
import path from 'node:path';
import { newestChange, ROOT, run, say } from './shell.mjs';

/** npm writes this file last, so that a broken install is done again. */
const INSTALLED = path.join(ROOT, 'node_modules/.package-lock.json');

export function installPackages() {
  const wanted = ['package.json', 'package-lock.json', 'server/package.json', 'client/package.json'].map((file) =>
    path.join(ROOT, file),
  );
  if (fs.existsSync(INSTALLED) && fs.statSync(INSTALLED).mtimeMs >= newestChange(wanted)) return;
  say('Installing packages …');
  run('npm', ['ci', '--include=dev', '--no-audit', '--no-fund']);
  // A checkout may bear dates later than the install; what is installed now is what the lock file says.
  fs.utimesSync(INSTALLED, new Date(), new Date());
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
