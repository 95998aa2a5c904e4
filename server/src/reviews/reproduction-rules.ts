import { type EvaluableCorrelation } from '../numerics/fitting/fit.types.js';

/** Relative agreement asked of a reproduction: 12 digits. */
const AGREEMENT = 1e-12;

export interface ReproducedNumber {
  name: string;
  stored: number;
  recomputed: number;
  agrees: boolean;
}

function compare(name: string, stored: number, recomputed: number): ReproducedNumber {
  const scale = Math.max(Math.abs(stored), Math.abs(recomputed));
  return { name, stored, recomputed, agrees: Math.abs(stored - recomputed) <= AGREEMENT * scale };
}

/** Each parameter and each covariance beside its recomputed value. */
export function compareToStored(stored: EvaluableCorrelation, recomputed: EvaluableCorrelation): ReproducedNumber[] {
  const parameters = stored.parameters.map((parameter, i) =>
    compare(parameter.symbol, parameter.value, recomputed.parameters[i]?.value ?? Number.NaN),
  );
  const covariances = stored.covariance.flatMap((row, i) =>
    row.slice(0, i + 1).map((value, j) => {
      const name = `cov(${stored.parameters[i]?.symbol}, ${stored.parameters[j]?.symbol})`;
      return compare(name, value, recomputed.covariance[i]?.[j] ?? Number.NaN);
    }),
  );
  return [...parameters, ...covariances];
}
