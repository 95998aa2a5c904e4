import studentT from '@stdlib/stats-base-dists-t';
import { standardNormalQuantile } from './normal.js';

/**
 * Coverage factor k: the half-width, in standard uncertainties, of the symmetric interval that holds `coverage`.
 *
 * @param coverage         coverage probability, between 0 and 1
 * @param degreesOfFreedom ν of Student's t, > 0; null takes the normal distribution (GUM G.3)
 */
export function coverageFactor(coverage: number, degreesOfFreedom: number | null): number {
  const upper = (1 + coverage) / 2;
  return degreesOfFreedom === null ? standardNormalQuantile(upper) : studentT.quantile(upper, degreesOfFreedom);
}
