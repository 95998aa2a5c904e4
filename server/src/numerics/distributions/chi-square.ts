import chiSquare from '@stdlib/stats-base-dists-chisquare';

/** Probability that χ² with `degreesOfFreedom` (> 0) exceeds `value` (≥ 0). */
export function chiSquareExceedance(value: number, degreesOfFreedom: number): number {
  return 1 - chiSquare.cdf(value, degreesOfFreedom);
}
