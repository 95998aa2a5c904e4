import { execFileSync } from 'node:child_process';
import { renderSheetPdf } from '../src/sheet-documents/pdf/render-sheet-pdf.js';
import { buildSheetContent } from '../src/sheet-documents/sheet-content.js';
import { sampleSheetFacts } from '../test/builders/sheet-facts.js';
import { type BenchRow } from './bench-row.js';
import { median } from './median.js';

const COLD_LIMIT_MS = 3_000;
const WARM_LIMIT_MS = 1_000;
const WARM_RUNS = 5;

/** A fresh process that loads the modules, as the server does at its start, and then measures its first sheet, ms of processor time. */
const COLD = `
  import { renderSheetPdf } from '${import.meta.resolve('../src/sheet-documents/pdf/render-sheet-pdf.js')}';
  import { buildSheetContent } from '${import.meta.resolve('../src/sheet-documents/sheet-content.js')}';
  import { sampleSheetFacts } from '${import.meta.resolve('../test/builders/sheet-facts.js')}';
  const before = process.cpuUsage();
  await renderSheetPdf(buildSheetContent(sampleSheetFacts()));
  const { user, system } = process.cpuUsage(before);
  process.stdout.write(String((user + system) / 1000));`;

const cold = (): number =>
  Number(execFileSync(process.execPath, ['--input-type=module', '--eval', COLD], { encoding: 'utf8' }));

/** Processor time in ms, which other work on the machine does not lengthen. */
async function warm(print: () => Promise<Buffer>): Promise<number> {
  const before = process.cpuUsage();
  await print();
  const { user, system } = process.cpuUsage(before);
  return (user + system) / 1000;
}

/** The printed sheet, eight series and two figures: once in a fresh process, then again and again. */
export async function benchPdf(): Promise<BenchRow[]> {
  const content = buildSheetContent(sampleSheetFacts());
  const print = () => renderSheetPdf(content);
  const bytes = (await print()).length;
  const first = cold();
  const again: number[] = [];
  for (let run = 0; run < WARM_RUNS; run += 1) again.push(await warm(print));
  const usual = median(again);
  return [
    {
      name: `PDF of a sheet, ${(bytes / 1000).toFixed(0)} kB, first of a process, CPU`,
      value: `${first.toFixed(0)} ms`,
      gate: `≤ ${COLD_LIMIT_MS} ms`,
      met: first <= COLD_LIMIT_MS,
    },
    {
      name: 'PDF of a sheet again, CPU',
      value: `${usual.toFixed(0)} ms`,
      gate: `≤ ${WARM_LIMIT_MS} ms`,
      met: usual <= WARM_LIMIT_MS,
    },
  ];
}
