// Debian's Chromium and the tools the tests look at PDFs with.
import { spawnSync } from 'node:child_process';
import { installDebianPackages } from './shell.mjs';

const isThere = (command) => spawnSync('sh', ['-c', `command -v ${command}`]).status === 0;

/** Makes sure that Debian's Chromium and poppler's text extraction are there. */
export function requireBrowserTools() {
  const missing = [];
  if (!isThere('chromium')) missing.push('chromium');
  if (!isThere('pdftotext')) missing.push('poppler-utils');
  if (missing.length > 0) installDebianPackages(missing, missing.join(' and '));
}
