// Debian's Chromium, and the tools that the browser tests read a PDF and run the guide's examples with.
import { spawnSync } from 'node:child_process';
import { installDebianPackages } from './shell.mjs';

const isThere = (command) => spawnSync('sh', ['-c', `command -v ${command}`]).status === 0;

/** Makes sure that they are there. */
export function requireBrowserTools() {
  const missing = [];
  if (!isThere('chromium')) missing.push('chromium');
  if (!isThere('pdftotext')) missing.push('poppler-utils');
  if (!isThere('python3')) missing.push('python3');
  if (!isThere('curl')) missing.push('curl');
  if (missing.length > 0) installDebianPackages(missing, missing.join(', '));
}
