import { type CorrelationForm, type ReferenceState } from '../correlations/form.js';
import { findForm } from '../correlations/forms.js';
import { propagated } from '../linear-algebra/matrices.js';
import { EngineError } from './engine-error.js';
import { type EvaluableCorrelation } from './fit.types.js';

/** Parameters at a reference state: D0 in m²/s, then the shape, with their covariance. */
export interface ParametersAt {
  readonly parameters: Float64Array;
  readonly covariance: number[][];
}

/**
 * The same function with D0 at another reference state, covariance included.
 *
 * @param beta       ln D0 at `from`, then the shape
 * @param covariance of beta
 */
export function restate(
  form: CorrelationForm,
  beta: Float64Array,
  covariance: readonly (readonly number[])[],
  from: ReferenceState,
  to: ReferenceState,
): ParametersAt {
  const shape = beta.subarray(1);
  const x = Math.log(to.temperature / from.temperature);
  const p = Math.log(to.pressure / from.pressure);
  const d0 = Math.exp(beta[0]! + form.lnRatio(shape, x, p, from));
  const gradient = new Float64Array(shape.length);
  form.lnRatioGradient(shape, x, p, from, gradient);
  const restated = form.restate(shape, from, to);
  const jacobian = [
    [d0, ...Array.from(gradient, (value) => d0 * value)],
    ...restated.jacobian.map((row) => [0, ...row]),
  ];
  return { parameters: new Float64Array([d0, ...restated.shape]), covariance: propagated(jacobian, covariance) };
}

/**
 * A correlation with D0 at another reference state: the same values and uncertainties at every state.
 *
 * @throws {EngineError} NOT_AVAILABLE when the engine does not know the form
 */
export function restateCorrelation(correlation: EvaluableCorrelation, to: ReferenceState): EvaluableCorrelation {
  const form = formOf(correlation);
  const values = Float64Array.from(correlation.parameters, ({ value }) => value);
  const toLn = values.map((value, k) => (k === 0 ? 1 / value : 1));
  const covariance = correlation.covariance.map((row, i) => row.map((value, j) => value * toLn[i]! * toLn[j]!));
  values[0] = Math.log(values[0]!);
  const restated = restate(form, values, covariance, referenceOf(correlation), to);
  return {
    ...correlation,
    parameters: correlation.parameters.map((parameter, k) => ({
      ...parameter,
      value: restated.parameters[k]!,
      standardUncertainty: Math.sqrt(restated.covariance[k]![k]!),
    })),
    covariance: restated.covariance,
    referenceTemperature: to.temperature,
    referencePressure: to.pressure,
  };
}

export function formOf({ form }: EvaluableCorrelation): CorrelationForm {
  const found = findForm(form);
  if (!found) throw new EngineError('NOT_AVAILABLE', `The form ${form} is not available yet`, 'form');
  return found;
}

export function referenceOf(correlation: EvaluableCorrelation): ReferenceState {
  return { temperature: correlation.referenceTemperature, pressure: correlation.referencePressure };
}
