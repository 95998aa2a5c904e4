import { evaluateCorrelation } from '../numerics/fitting/evaluate-correlation.js';
import type { EvaluableCorrelation } from '../numerics/fitting/fit.types.js';

/** Level of confidence of every expanded uncertainty on a sheet. */
const COVERAGE = 0.95;

/** Columns of equal length, m²/s. */
export interface RecommendedColumns {
  readonly diffusivities: number[];
  readonly standardUncertainties: number[];
  readonly expandedUncertainties: number[];
  /** k */
  readonly coverageFactor: number;
}

/**
 * Recommended values with their uncertainties at a level of confidence of 95 %.
 *
 * @param temperatures K
 * @param pressures Pa; a single one serves all temperatures
 */
export function recommendedAt(
  correlation: EvaluableCorrelation,
  temperatures: readonly number[],
  pressures: readonly number[],
): RecommendedColumns {
  const evaluation = evaluateCorrelation(correlation, temperatures, pressures, { coverage: COVERAGE, kind: 'MEAN' });
  return {
    diffusivities: Array.from(evaluation.diffusivities),
    standardUncertainties: Array.from(evaluation.standardUncertainties),
    expandedUncertainties: Array.from(evaluation.expandedUncertainties),
    coverageFactor: evaluation.coverageFactor,
  };
}

/**
 * Half-widths of the interval for one new laboratory at the reference pressure, m²/s; null where there is no deviation between
 * series to predict with.
 */
export function newLaboratoryHalfWidths(
  correlation: EvaluableCorrelation,
  temperatures: readonly number[],
): number[] | null {
  if (correlation.betweenSeries === null) return null;
  const pressures = [correlation.referencePressure];
  const options = { coverage: COVERAGE, kind: 'NEW_SERIES' } as const;
  return Array.from(evaluateCorrelation(correlation, temperatures, pressures, options).expandedUncertainties);
}
