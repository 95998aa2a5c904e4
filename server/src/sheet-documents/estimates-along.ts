import type { Estimate } from '../numerics/estimates/estimates.js';
import type { EstimatesAt } from './sheet-facts.js';

/** One method of estimation at the temperatures it reaches. Columns of equal length. */
export interface EstimateColumn {
  readonly method: string;
  readonly usualRelativeError: number;
  readonly source: string;
  /** K */
  readonly temperatures: number[];
  /** m²/s */
  readonly diffusivities: number[];
}

/** The estimates at many temperatures (K) and one pressure (Pa), a column for each method that reaches any of them. */
export function estimatesAlong(
  estimatesAt: EstimatesAt,
  temperatures: readonly number[],
  pressure: number,
): EstimateColumn[] {
  const columns = new Map<Estimate['method'], EstimateColumn>();
  for (const temperature of temperatures) {
    for (const estimate of estimatesAt({ temperature, pressure })) {
      const column = columns.get(estimate.method) ?? emptyColumn(estimate);
      column.temperatures.push(temperature);
      column.diffusivities.push(estimate.diffusivity);
      columns.set(estimate.method, column);
    }
  }
  return [...columns.values()];
}

const emptyColumn = ({ label, usualRelativeError, source }: Estimate): EstimateColumn => ({
  method: label,
  usualRelativeError,
  source,
  temperatures: [],
  diffusivities: [],
});
