// `npm start`: from a bare checkout to a running Diffolio.
import { spawn } from 'node:child_process';
import path from 'node:path';
import { buildClient, buildServer, installPackages } from './install.mjs';
import { freePort, requirePostgres, startPostgres } from './postgres.mjs';
import { launch, LaunchError, ROOT, say } from './shell.mjs';

const SERVER_STOP_TIMEOUT_MS = 6_000;

/** Starts the server and resolves with its address, or rejects when it ends before it is ready. */
function startServer(env) {
  const child = spawn(process.execPath, [path.join(ROOT, 'server/dist/src/main.js')], {
    cwd: ROOT,
    env,
    stdio: ['ignore', 2, 2, 'ipc'],
    // Ctrl-C reaches the whole process group; the launcher alone decides the order of leaving.
    detached: true,
  });
  const exited = new Promise((resolve) => child.once('exit', (code) => resolve(code ?? 1)));
  const ready = new Promise((resolve, reject) => {
    child.on('message', (message) => {
      if (message?.ready) resolve(message.ready);
    });
    void exited.then((code) =>
      reject(new LaunchError(`The server ended with code ${code}; its own words stand above.`)),
    );
  });
  const stop = async () => {
    if (child.exitCode !== null || child.signalCode !== null) return;
    child.kill('SIGTERM');
    const forced = setTimeout(() => child.kill('SIGKILL'), SERVER_STOP_TIMEOUT_MS);
    await exited;
    clearTimeout(forced);
  };
  return { ready, exited, stop };
}

await launch(async () => {
  const dataFolder = path.resolve(ROOT, process.env.DIFFOLIO_DATA_DIR || '.data');
  let postgres = null;
  let server = null;
  let leaving = false;
  const leave = async (code) => {
    if (leaving) return;
    leaving = true;
    await server?.stop();
    await postgres?.stop();
    process.exit(code);
  };
  // Registered before anything starts, so that an early signal leaves nothing behind; a repeated one is harmless.
  for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP']) process.on(signal, () => void leave(0));

  // What only somebody else can mend is said first, before minutes are spent on the rest.
  if (!process.env.DATABASE_URL) requirePostgres();
  installPackages();
  buildServer();
  buildClient();

  const env = { ...process.env, NODE_ENV: 'production', DIFFOLIO_DATA_DIR: dataFolder };
  if (env.PORT === '0') env.PORT = String(await freePort());
  if (!env.DATABASE_URL) {
    postgres = await startPostgres(dataFolder);
    postgres.ensureDatabase('diffolio');
    env.DATABASE_URL = postgres.url('diffolio');
    env.DIFFOLIO_DEMO ||= 'true';
    void postgres.exited.then(() => {
      if (leaving) return;
      say('PostgreSQL has ended unexpectedly; see postgres.log in the data folder.');
      void leave(1);
    });
  }
  try {
    server = startServer(env);
    const address = await server.ready;
    process.stdout.write(`Diffolio is ready at ${address}\n`);
    void server.exited.then((code) => {
      if (!leaving) say(`The server has ended with code ${code}.`);
      void leave(code === 0 ? 1 : code);
    });
  } catch (error) {
    if (leaving) return;
    await postgres?.stop();
    throw error;
  }
});
