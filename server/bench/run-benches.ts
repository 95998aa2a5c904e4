import { benchApi } from './api/bench-api.js';
import { type BenchRow } from './bench-row.js';
import { benchFirstLoad } from './first-load.js';
import { benchFits } from './fits.js';
import { benchImport } from './import.js';
import { benchPdf } from './pdf.js';

/** The tables by name, each on a database of its own where it needs one. */
const BENCHES: Record<string, (databaseUrl: (name: string) => string) => Promise<BenchRow[]>> = {
  fits: () => benchFits(),
  api: (databaseUrl) => benchApi(databaseUrl('bench_api')),
  import: (databaseUrl) => benchImport(databaseUrl('bench_import')),
  pdf: () => benchPdf(),
  'first-load': () => benchFirstLoad(),
};

function verdict({ gate, met }: BenchRow): string {
  if (gate === null) return '';
  return `  [${gate}: ${met ? 'met' : 'NOT MET'}]`;
}

/** Runs the benches named, or all of them, and prints each figure beside its gate. */
export async function runBenches(databaseUrl: (name: string) => string, names: readonly string[]): Promise<void> {
  for (const [name, bench] of Object.entries(BENCHES)) {
    if (names.length > 0 && !names.includes(name)) continue;
    console.log(`\n${name}`);
    for (const row of await bench(databaseUrl)) console.log(`  ${row.name.padEnd(62)} ${row.value}${verdict(row)}`);
  }
}
