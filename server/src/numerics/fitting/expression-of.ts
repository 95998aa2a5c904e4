import { type EvaluableCorrelation } from './fit.types.js';
import { formOf, referenceOf } from './restate.js';

/** The correlation as plain text in T (K) and P (Pa), giving D in m²/s, with every digit of its numbers in place. */
export function expressionOf(correlation: EvaluableCorrelation): string {
  const values = correlation.parameters.map(({ value }) => value);
  return formOf(correlation).print(values, referenceOf(correlation));
}
