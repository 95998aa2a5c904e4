import { mkdir, rename, writeFile } from 'node:fs/promises';
import path from 'node:path';
import { type DoiMetadata, DoiRegistrar } from './doi-registrar.js';

/** Stands in for a registrar where none is set: it keeps each registration as a file. Nothing resolves such a DOI. */
export class LocalDoiRegistrar extends DoiRegistrar {
  constructor(private readonly folder: string) {
    super();
  }

  async register(doi: string, metadata: DoiMetadata): Promise<void> {
    await mkdir(this.folder, { recursive: true, mode: 0o700 });
    const target = path.join(this.folder, `${encodeURIComponent(doi)}.json`);
    await writeFile(`${target}.part`, `${JSON.stringify({ doi, ...metadata }, null, 2)}\n`);
    await rename(`${target}.part`, target);
  }
}
