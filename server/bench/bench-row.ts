/** One line of a benchmark table. */
export interface BenchRow {
  name: string;
  value: string;
  /** What is asked, in words; null where nothing is */
  gate: string | null;
  met: boolean | null;
}
