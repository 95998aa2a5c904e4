// What the launchers share: running commands and saying what happens. Plain Node, no packages.
import { spawn, spawnSync } from 'node:child_process';
import fs from 'node:fs';
import path from 'node:path';

/** The top of the checkout. */
export const ROOT = path.resolve(import.meta.dirname, '../..');

/** Something the person at the terminal can mend: printed without a stack trace, exit code 1. */
export class LaunchError extends Error {}

export function say(line) {
  process.stderr.write(`${line}\n`);
}

/** Runs a launcher; what can be mended is said in words. */
export async function launch(main) {
  try {
    await main();
  } catch (error) {
    say(error instanceof LaunchError ? error.message : (error?.stack ?? String(error)));
    process.exit(1);
  }
}

/** Runs a command to its end with its output on stderr, or throws. */
export function run(command, args, options = {}) {
  const result = spawnSync(command, args, { cwd: ROOT, stdio: ['ignore', 2, 2], ...options });
  if (result.error || result.status !== 0) {
    throw new LaunchError(`${command} ${args.join(' ')} failed${result.error ? `: ${result.error.message}` : ''}`);
  }
}

/** Runs a command and gives its exit code and its output, which also passes to the terminal. */
export function runAloud(command, args, options = {}) {
  return new Promise((resolve) => {
    const child = spawn(command, args, { cwd: ROOT, stdio: ['ignore', 'pipe', 'pipe'], ...options });
    let output = '';
    for (const stream of [child.stdout, child.stderr]) {
      stream.setEncoding('utf8');
      stream.on('data', (text) => {
        output += text;
        process.stderr.write(text);
      });
    }
    child.on('error', (error) => resolve({ code: 1, output: `${output}\n${error.message}` }));
    child.on('close', (code) => resolve({ code: code ?? 1, output }));
  });
}

export function isRoot() {
  return process.getuid?.() === 0;
}

/** Installs Debian packages when root; else says the command. */
export function installDebianPackages(packages, what) {
  const command = `apt-get install --yes --no-install-recommends ${packages.join(' ')}`;
  if (!isRoot()) {
    throw new LaunchError(
      `${what} is not installed. Install it with\n\n    sudo ${command}\n\nand run the same command again.`,
    );
  }
  say(`${what} is missing; installing it from Debian's packages …`);
  const env = { ...process.env, DEBIAN_FRONTEND: 'noninteractive' };
  run('apt-get', ['update', '-qq'], { env });
  run('apt-get', ['install', '-y', '-qq', '--no-install-recommends', ...packages], { env });
}

/** Newest modification time below `paths`, ms; 0 where nothing is there. */
export function newestChange(paths, isSkipped = () => false) {
  let newest = 0;
  for (const start of paths) {
    if (!fs.existsSync(start)) continue;
    const stat = fs.statSync(start);
    if (!stat.isDirectory()) {
      newest = Math.max(newest, stat.mtimeMs);
      continue;
    }
    for (const entry of fs.readdirSync(start, { recursive: true, withFileTypes: true })) {
      const file = path.join(entry.parentPath ?? entry.path, entry.name);
      if (entry.isFile() && !isSkipped(file)) newest = Math.max(newest, fs.statSync(file).mtimeMs);
    }
  }
  return newest;
}
