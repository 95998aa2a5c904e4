import normal from '@stdlib/stats-base-dists-normal';

/** Quantile of the standard normal distribution; `probability` between 0 and 1. */
export function standardNormalQuantile(probability: number): number {
  return normal.quantile(probability, 0, 1);
}
