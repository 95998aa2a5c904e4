import fs from 'node:fs';
import os from 'node:os';
import path from 'node:path';
import { defineConfig } from '@playwright/test';

const ROOT = path.resolve(import.meta.dirname, '../..');
const PORT = process.env['E2E_PORT'] ?? '4319';
const given = process.env['E2E_DATA_DIR'];
/** One folder for this run; the process of each worker reads the same name. */
const DATA = (process.env['E2E_DATA_DIR'] ??= fs.mkdtempSync(path.join(os.tmpdir(), 'diffolio-e2e-')));
// The process that made it outlives workers and service, and takes it away.
if (given === undefined) process.on('exit', () => fs.rmSync(DATA, { recursive: true, force: true }));
/** The first start makes a cluster and seeds the demo, beside whatever else a busy machine does. */
const START_MS = 300_000;

/** Debian's Chromium, kept from asking for anything beyond this machine. */
const CHROMIUM_ARGS = [
  '--headless',
  '--no-sandbox',
  '--disable-gpu',
  '--disable-quic',
  '--no-first-run',
  '--disable-background-networking',
  '--disable-component-update',
  '--disable-sync',
];

export default defineConfig({
  testDir: '.',
  outputDir: path.join(ROOT, 'test-results'),
  workers: 1,
  timeout: 360_000,
  expect: { timeout: 30_000 },
  forbidOnly: true,
  use: {
    baseURL: `http://127.0.0.1:${PORT}`,
    viewport: { width: 1440, height: 1000 },
    locale: 'en-GB',
    timezoneId: 'UTC',
    actionTimeout: 30_000,
    navigationTimeout: 30_000,
    screenshot: 'only-on-failure',
    launchOptions: { executablePath: process.env['CHROMIUM'] ?? '/usr/bin/chromium', args: CHROMIUM_ARGS },
  },
  webServer: {
    // The product as people start it, demo and all.
    command: 'exec node server/launch/start.mjs',
    cwd: ROOT,
    url: `http://127.0.0.1:${PORT}/health/ready`,
    env: { PORT, DIFFOLIO_DATA_DIR: DATA, LOG_LEVEL: 'warn' },
    timeout: START_MS,
    gracefulShutdown: { signal: 'SIGTERM', timeout: 15_000 },
  },
});
