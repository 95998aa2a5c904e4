// A PostgreSQL cluster of Diffolio's own on loopback, from Debian's packages, run by an unprivileged user.
import { spawn, spawnSync } from 'node:child_process';
import fs from 'node:fs';
import net from 'node:net';
import path from 'node:path';
import { installDebianPackages, isRoot, LaunchError } from './shell.mjs';

const DEBIAN_BASE = '/usr/lib/postgresql';
const START_TIMEOUT_MS = 60_000;
const STOP_TIMEOUT_MS = 8_000;

function findBinaries() {
  if (!fs.existsSync(DEBIAN_BASE)) return null;
  const versions = fs.readdirSync(DEBIAN_BASE).sort((a, b) => Number(b) - Number(a));
  const version = versions.find((name) => fs.existsSync(`${DEBIAN_BASE}/${name}/bin/initdb`));
  return version ? `${DEBIAN_BASE}/${version}/bin` : null;
}

/**
 * Folder of PostgreSQL's programs; installs Debian's package when root, without Debian's own cluster.
 *
 * @throws {LaunchError} saying the command that installs it, when not root
 */
export function requirePostgres() {
  const found = findBinaries();
  if (found) return found;
  if (isRoot()) {
    // postgresql-common asks this file whether to make a cluster of its own.
    fs.mkdirSync('/etc/postgresql-common', { recursive: true });
    if (!fs.existsSync('/etc/postgresql-common/createcluster.conf')) {
      fs.writeFileSync('/etc/postgresql-common/createcluster.conf', 'create_main_cluster = false\n');
    }
  }
  installDebianPackages(['postgresql'], 'PostgreSQL');
  const installed = findBinaries();
  if (!installed) {
    // dpkg thinks it is there although its files are gone: put them back.
    installDebianPackages(['--reinstall', ...installedServerPackages()], 'PostgreSQL');
  }
  const repaired = findBinaries();
  if (!repaired)
    throw new LaunchError(`PostgreSQL's programs are not below ${DEBIAN_BASE} although Debian's package is installed.`);
  return repaired;
}

function installedServerPackages() {
  const listed = spawnSync(
    'dpkg-query',
    ['-W', '-f', '${Package} ${Status}\n', 'postgresql-[0-9]*', 'postgresql-client-[0-9]*'],
    {
      encoding: 'utf8',
    },
  );
  const names = (listed.stdout ?? '')
    .split('\n')
    .filter((line) => line.endsWith('install ok installed'))
    .map((line) => line.split(' ')[0]);
  return names.length > 0 ? names : ['postgresql'];
}

/** PostgreSQL refuses root: root runs it as Debian's `postgres`, else as `nobody`. */
function unprivilegedUser() {
  if (!isRoot()) return {};
  const accounts = fs.readFileSync('/etc/passwd', 'utf8').split('\n');
  for (const name of ['postgres', 'nobody']) {
    const fields = accounts.find((line) => line.startsWith(`${name}:`))?.split(':');
    if (fields) return { uid: Number(fields[2]), gid: Number(fields[3]) };
  }
  throw new LaunchError('There is no account "postgres" or "nobody" to run PostgreSQL as.');
}

function mayPass(folder, user) {
  const stat = fs.statSync(folder);
  if (stat.uid === user.uid) return (stat.mode & 0o100) !== 0;
  if (stat.gid === user.gid) return (stat.mode & 0o010) !== 0;
  return (stat.mode & 0o001) !== 0;
}

/**
 * Where the cluster lives: below the data folder. A closed data folder is opened for passing; where a parent is closed
 * too (such as root's home), the cluster goes below /var/lib, and the data folder notes where.
 */
function clusterFolder(dataFolder, user) {
  const note = path.join(dataFolder, 'cluster-location');
  if (fs.existsSync(note)) return fs.readFileSync(note, 'utf8').trim();
  fs.mkdirSync(dataFolder, { recursive: true });
  const inside = path.join(dataFolder, 'postgres');
  if (user.uid === undefined) return inside;
  if (!mayPass(dataFolder, user)) fs.chmodSync(dataFolder, fs.statSync(dataFolder).mode | 0o711);
  for (let parent = path.dirname(dataFolder); ; parent = path.dirname(parent)) {
    if (!mayPass(parent, user)) {
      fs.mkdirSync('/var/lib/diffolio', { recursive: true, mode: 0o711 });
      const elsewhere = fs.mkdtempSync('/var/lib/diffolio/cluster-');
      fs.chmodSync(elsewhere, 0o711);
      const folder = path.join(elsewhere, 'postgres');
      fs.writeFileSync(note, `${folder}\n`);
      return folder;
    }
    if (parent === path.dirname(parent)) return inside;
  }
}

export function freePort() {
  return new Promise((resolve, reject) => {
    const server = net.createServer();
    server.once('error', reject);
    server.listen(0, '127.0.0.1', () => {
      const { port } = server.address();
      server.close(() => resolve(port));
    });
  });
}

function isAlive(pid) {
  try {
    process.kill(pid, 0);
    return true;
  } catch (error) {
    return error.code === 'EPERM';
  }
}

const pause = (ms) => new Promise((resolve) => setTimeout(resolve, ms));

/** Is this process a PostgreSQL of this very cluster, and not one that was given the same number later? */
function servesCluster(pid, cluster) {
  try {
    return fs.readFileSync(`/proc/${pid}/cmdline`, 'utf8').split('\0').includes(cluster);
  } catch {
    return false;
  }
}

/** A start that finds a server of an earlier run still there stops it; a stale pid file is cleared. */
async function clearEarlierRun(cluster) {
  const pidFile = path.join(cluster, 'postmaster.pid');
  if (!fs.existsSync(pidFile)) return;
  const pid = Number(fs.readFileSync(pidFile, 'utf8').split('\n')[0]);
  if (pid > 0 && isAlive(pid) && servesCluster(pid, cluster)) {
    process.kill(pid, 'SIGINT');
    const until = Date.now() + STOP_TIMEOUT_MS;
    while (isAlive(pid) && Date.now() < until) await pause(50);
    if (isAlive(pid)) throw new LaunchError(`An earlier PostgreSQL (process ${pid}) on ${cluster} does not stop.`);
  }
  fs.rmSync(pidFile, { force: true });
}

/**
 * Starts the cluster below `dataFolder`, making it when it is not there.
 *
 * @param {string} dataFolder  absolute path
 * @param {{ durable?: boolean }} options  `durable: false` trades safety for speed, for tests
 * @returns {Promise<{ url: (database: string) => string, stop: () => Promise<void>, exited: Promise<void> }>}
 * @throws {LaunchError} when PostgreSQL is missing and cannot be installed, or does not start
 */
export async function startPostgres(dataFolder, { durable = true } = {}) {
  const bin = requirePostgres();
  const user = unprivilegedUser();
  const cluster = clusterFolder(dataFolder, user);
  const env = { PATH: process.env.PATH, LC_ALL: 'C.UTF-8', HOME: '/' };
  const asUser = { ...user, cwd: '/', env };

  if (!fs.existsSync(path.join(cluster, 'PG_VERSION'))) {
    fs.rmSync(cluster, { recursive: true, force: true });
    fs.mkdirSync(cluster, { recursive: true, mode: 0o700 });
    if (user.uid !== undefined) fs.chownSync(cluster, user.uid, user.gid);
    const args = [
      '-D',
      cluster,
      '-U',
      'diffolio',
      '-A',
      'trust',
      '-E',
      'UTF8',
      '--locale=C.UTF-8',
      ...(durable ? [] : ['-N']),
    ];
    const made = spawnSync(`${bin}/initdb`, args, { ...asUser, encoding: 'utf8' });
    if (made.status !== 0)
      throw new LaunchError(
        `PostgreSQL's cluster could not be made in ${cluster}:\n${made.error?.message ?? made.stderr}`,
      );
  }
  await clearEarlierRun(cluster);

  const port = await freePort();
  const settings = ['listen_addresses=127.0.0.1', 'unix_socket_directories=', 'max_connections=100'];
  if (!durable) settings.push('fsync=off', 'synchronous_commit=off', 'full_page_writes=off');
  const args = ['-D', cluster, '-p', String(port), ...settings.flatMap((setting) => ['-c', setting])];
  const log = fs.openSync(path.join(path.dirname(cluster), 'postgres.log'), 'a', 0o666);
  // The server dies with this process, however that ends. setpriv drops root itself, because changing
  // the user after asking for the signal would cancel it.
  const drop = user.uid === undefined ? [] : [`--reuid=${user.uid}`, `--regid=${user.gid}`, '--clear-groups'];
  const child = spawn('setpriv', [...drop, '--pdeathsig=INT', `${bin}/postgres`, ...args], {
    cwd: '/',
    env,
    stdio: ['ignore', log, log],
    detached: true,
  });
  fs.closeSync(log);
  let hasExited = false;
  const exited = new Promise((resolve) => {
    child.once('exit', () => {
      hasExited = true;
      resolve();
    });
    child.once('error', () => {
      hasExited = true;
      resolve();
    });
  });

  const url = (database) => `postgres://diffolio@127.0.0.1:${port}/${database}`;
  const psql = (sql) =>
    spawnSync(`${bin}/psql`, ['-X', '-v', 'ON_ERROR_STOP=1', '-qAtc', sql, url('postgres')], {
      ...asUser,
      encoding: 'utf8',
    });
  const until = Date.now() + START_TIMEOUT_MS;
  while (psql('select 1').status !== 0) {
    if (hasExited || Date.now() > until) {
      const tail = fs
        .readFileSync(path.join(path.dirname(cluster), 'postgres.log'), 'utf8')
        .split('\n')
        .slice(-12)
        .join('\n');
      throw new LaunchError(`PostgreSQL did not start:\n${tail}`);
    }
    await pause(50);
  }

  const stop = async () => {
    if (hasExited) return;
    child.kill('SIGINT');
    const forced = setTimeout(() => child.kill('SIGQUIT'), STOP_TIMEOUT_MS);
    await exited;
    clearTimeout(forced);
  };
  const ensureDatabase = (name) => {
    if (psql(`select 1 from pg_database where datname = '${name}'`).stdout.length > 0) return;
    const made = psql(`create database "${name}"`);
    if (made.status !== 0) throw new LaunchError(`The database could not be made: ${made.stderr}`);
  };
  return { url, stop, exited, ensureDatabase };
}
