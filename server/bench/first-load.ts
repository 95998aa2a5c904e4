import fs from 'node:fs/promises';
import path from 'node:path';
import { gzipSync } from 'node:zlib';
import { type BenchRow } from './bench-row.js';

const LIMIT_KB = 250;
const ENTRIES = ['index.html', 'src/routes/sheet.tsx'];

interface Chunk {
  file: string;
  imports?: string[];
  css?: string[];
}

/** What a first visit to a released sheet's page loads before its figures are drawn: scripts and styles, gzip. */
export async function benchFirstLoad(): Promise<BenchRow[]> {
  const dist = path.resolve(import.meta.dirname, '../../../client/dist');
  const manifest = JSON.parse(await fs.readFile(path.join(dist, '.vite/manifest.json'), 'utf8')) as Record<
    string,
    Chunk
  >;
  const files = new Set<string>(['index.html']);
  const seen = new Set<string>();
  const visit = (name: string) => {
    const chunk = manifest[name];
    if (!chunk || seen.has(name)) return;
    seen.add(name);
    files.add(chunk.file);
    chunk.css?.forEach((file) => files.add(file));
    chunk.imports?.forEach(visit);
  };
  ENTRIES.forEach(visit);
  let bytes = 0;
  for (const file of files) bytes += gzipSync(await fs.readFile(path.join(dist, file))).length;
  const kilobytes = bytes / 1000;
  return [
    {
      name: 'first load of a released sheet’s page, scripts and styles',
      value: `${kilobytes.toFixed(0)} kB gzip in ${files.size} files`,
      gate: `≤ ${LIMIT_KB} kB`,
      met: kilobytes <= LIMIT_KB,
    },
  ];
}
