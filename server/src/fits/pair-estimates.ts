import { type EstimateConstants, estimateConstants } from '../numerics/estimates/estimate-constants.js';
import { type Estimate, estimates } from '../numerics/estimates/estimates.js';
import { type Substance } from '../substances/substance.entity.js';
import { type PairEstimate } from './fit.types.js';

/** Estimates of one pair at one state, from the constants in the library. */
export function estimatesOf(
  a: Substance,
  b: Substance,
): (state: { temperature: number; pressure: number }) => Estimate[] {
  const first = constantsOf(a);
  const second = constantsOf(b);
  return (state) => estimates(first, second, state);
}

/** The estimates need plain values only. */
function constantsOf({ molarMass, constants }: Substance): EstimateConstants {
  const values = constants.flatMap(({ kind, unit, value, source }) =>
    value === null ? [] : [{ kind, unit, value, source }],
  );
  return estimateConstants(molarMass, values);
}

/** Each method's estimates along a column of temperatures, K, at one pressure, Pa; methods that reach every state. */
export function estimatesAlong(
  a: Substance,
  b: Substance,
  temperatures: Float64Array,
  pressure: number,
): PairEstimate[] {
  const at = estimatesOf(a, b);
  const byMethod = new Map<string, { first: Estimate; values: number[] }>();
  for (const temperature of temperatures) {
    for (const estimate of at({ temperature, pressure })) {
      const entry = byMethod.get(estimate.method) ?? { first: estimate, values: [] };
      byMethod.set(estimate.method, entry);
      entry.values.push(estimate.diffusivity);
    }
  }
  return [...byMethod.values()]
    .filter(({ values }) => values.length === temperatures.length)
    .map(({ first: { method, label, usualRelativeError, source }, values }) => ({
      method,
      label,
      usualRelativeError,
      source,
      diffusivities: Float64Array.from(values),
    }));
}
