/** First quartile, median and third quartile. */
export interface Quartiles {
  lower: number;
  median: number;
  upper: number;
}

/**
 * Quartiles by linear interpolation between order statistics (definition 7 of Hyndman & Fan, The American Statistician 50
 * (1996) 361), over the finite values.
 *
 * @returns null when there is none
 */
export function quartiles(values: Iterable<number>): Quartiles | null {
  const sorted = Float64Array.from(values).filter(Number.isFinite).sort();
  if (sorted.length === 0) return null;
  const at = (share: number): number => {
    const place = share * (sorted.length - 1);
    const below = Math.floor(place);
    const low = sorted[below] ?? Number.NaN;
    const high = sorted[Math.min(below + 1, sorted.length - 1)] ?? low;
    return low + (place - below) * (high - low);
  };
  return { lower: at(0.25), median: at(0.5), upper: at(0.75) };
}

/** The span beyond which Tukey calls a value "far out": three interquartile ranges outside the quartiles (Exploratory Data Analysis, 1977). */
export function farOut({ lower, upper }: Quartiles, leastRange: number): { lowest: number; highest: number } {
  const range = Math.max(upper - lower, leastRange);
  return { lowest: lower - 3 * range, highest: upper + 3 * range };
}

/**
 * Median and median absolute deviation as quartiles of a symmetric distribution. Half of the values may be wrong before
 * these are, where a single one spoils the quartiles of four.
 */
export function sturdyQuartiles(values: Iterable<number>): Quartiles | null {
  const all = Float64Array.from(values);
  const median = quartiles(all)?.median;
  if (median === undefined) return null;
  const deviation = quartiles(all.map((value) => Math.abs(value - median)))?.median ?? 0;
  return { lower: median - deviation, median, upper: median + deviation };
}
