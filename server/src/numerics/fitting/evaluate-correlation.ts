import { coverageFactor } from '../distributions/student-t.js';
import { quadraticForm } from '../linear-algebra/matrices.js';
import { EngineError } from './engine-error.js';
import { type BetweenSeries, type EvaluableCorrelation, type Validity } from './fit.types.js';
import { formOf, referenceOf } from './restate.js';

export interface EvaluationOptions {
  /** Coverage probability of the expanded uncertainties, between 0 and 1 */
  coverage: number;
  /** MEAN: of the recommended value; NEW_SERIES: of the series of one new laboratory */
  kind: 'MEAN' | 'NEW_SERIES';
}

export interface EvaluatedStates {
  /** m²/s */
  diffusivities: Float64Array;
  /** m²/s */
  standardUncertainties: Float64Array;
  /** m²/s, k u */
  expandedUncertainties: Float64Array;
  coverageFactor: number;
  /** Indices of the states outside the range of validity */
  outside: number[];
}

/**
 * D and its uncertainty at many states: u² = gᵀ C g (GUM 5.2.2), U = k u with k from Student's t.
 *
 * @param temperatures K, > 0
 * @param pressures    Pa, > 0; as many as temperatures, or one for all of them
 * @throws {EngineError} BAD_INPUT for columns of unequal length, states that are not positive or a coverage outside
 *   (0, 1); NOT_AVAILABLE for NEW_SERIES where no between-series deviation is known
 */
export function evaluateCorrelation(
  correlation: EvaluableCorrelation,
  temperatures: ArrayLike<number>,
  pressures: ArrayLike<number>,
  { coverage, kind }: EvaluationOptions,
): EvaluatedStates {
  const form = formOf(correlation);
  const scatter = kind === 'NEW_SERIES' ? scatterOf(correlation) : null;
  requireStates(temperatures, pressures);
  if (!(coverage > 0 && coverage < 1))
    throw new EngineError('BAD_INPUT', 'The coverage must lie between 0 and 1', 'coverage');

  const reference = referenceOf(correlation);
  const d0 = correlation.parameters[0]!.value;
  const shape = Float64Array.from(correlation.parameters.slice(1), ({ value }) => value);
  const factor = coverageFactor(coverage, correlation.degreesOfFreedom);
  const count = temperatures.length;
  const result: EvaluatedStates = {
    diffusivities: new Float64Array(count),
    standardUncertainties: new Float64Array(count),
    expandedUncertainties: new Float64Array(count),
    coverageFactor: factor,
    outside: [],
  };
  const gradient = new Float64Array(shape.length + 1);
  const ofShape = gradient.subarray(1);
  // ln D is differentiated: ∂ ln D/∂D0 = 1/D0.
  gradient[0] = 1 / d0;
  for (let i = 0; i < count; i++) {
    const temperature = temperatures[i]!;
    const pressure = pressures[pressures.length === 1 ? 0 : i]!;
    const x = Math.log(temperature / reference.temperature);
    const p = Math.log(pressure / reference.pressure);
    form.lnRatioGradient(shape, x, p, reference, ofShape);
    const diffusivity = d0 * Math.exp(form.lnRatio(shape, x, p, reference));
    let variance = quadraticForm(correlation.covariance, gradient);
    if (scatter) variance += scatterAt(scatter, Math.log(temperature));
    const uncertainty = diffusivity * Math.sqrt(variance);
    result.diffusivities[i] = diffusivity;
    result.standardUncertainties[i] = uncertainty;
    result.expandedUncertainties[i] = factor * uncertainty;
    if (isOutside(correlation.validity, temperature, pressure)) result.outside.push(i);
  }
  return result;
}

/** Variance of ln D between laboratories at ln T. */
export function scatterAt(between: BetweenSeries, lnTemperature: number): number {
  const distance = lnTemperature - between.centre;
  return between.intercept + distance * (2 * between.covariance + distance * between.slope);
}

function scatterOf({ betweenSeries }: EvaluableCorrelation): BetweenSeries {
  if (betweenSeries) return betweenSeries;
  const message = 'No between-series deviation is known for this correlation, so nothing can be said of a new series';
  throw new EngineError('NOT_AVAILABLE', message, 'kind');
}

function isOutside(validity: Validity, temperature: number, pressure: number): boolean {
  return (
    temperature < validity.temperatureMinimum ||
    temperature > validity.temperatureMaximum ||
    pressure < validity.pressureMinimum ||
    pressure > validity.pressureMaximum
  );
}

function requireStates(temperatures: ArrayLike<number>, pressures: ArrayLike<number>): void {
  if (pressures.length !== temperatures.length && pressures.length !== 1) {
    const message = `${pressures.length} pressures for ${temperatures.length} temperatures: give as many, or one for all`;
    throw new EngineError('BAD_INPUT', message, 'pressures');
  }
  requirePositive(temperatures, 'temperatures', 'K');
  requirePositive(pressures, 'pressures', 'Pa');
}

function requirePositive(column: ArrayLike<number>, path: string, unit: string): void {
  for (let i = 0; i < column.length; i++) {
    if (!(column[i]! > 0 && column[i]! < Infinity)) {
      throw new EngineError('BAD_INPUT', `${column[i]} ${unit} is not a number above zero`, `${path}.${i}`);
    }
  }
}
