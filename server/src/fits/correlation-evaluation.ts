import { ApiError } from '../common/api-error.js';
import { evaluateCorrelation } from '../numerics/fitting/evaluate-correlation.js';
import { EngineError } from '../numerics/fitting/engine-error.js';
import { expressionOf } from '../numerics/fitting/expression-of.js';
import { type EvaluableCorrelation } from '../numerics/fitting/fit.types.js';
import { type Correlation, type Evaluation, type OutsideRange, type UncertaintyKind } from './correlation.types.js';

/** Most states of one evaluation. */
export const MOST_STATES = 10_000;

export interface EvaluationRequest {
  /** K */
  temperatures: Float64Array;
  /** Pa; one serves all temperatures */
  pressures: Float64Array;
  coverage: number;
  kind: `${UncertaintyKind}`;
  outsideRange: `${OutsideRange}`;
}

export function toCorrelation(evaluable: EvaluableCorrelation): Correlation {
  const { form, parameters, covariance, degreesOfFreedom, referenceTemperature, referencePressure, validity } =
    evaluable;
  return {
    form,
    expression: expressionOf(evaluable),
    parameters,
    covariance,
    degreesOfFreedom,
    referenceTemperature,
    referencePressure,
    validity,
    evaluable,
  };
}

/**
 * D, u and U at the asked states.
 *
 * @throws {ApiError} BAD_USER_INPUT for columns that do not fit or states that are not physical, OUT_OF_RANGE when
 *   outside and asked to refuse, NOT_AVAILABLE for a new series where nothing is known of the scatter between series
 */
export function evaluate(correlation: EvaluableCorrelation, request: EvaluationRequest): Evaluation {
  if (request.temperatures.length === 0) throw new ApiError('BAD_USER_INPUT', 'Give at least one temperature.');
  if (request.temperatures.length > MOST_STATES)
    throw new ApiError('BAD_USER_INPUT', `At most ${MOST_STATES} states at once.`);
  let evaluation: Evaluation;
  try {
    evaluation = evaluateCorrelation(correlation, request.temperatures, request.pressures, request);
  } catch (error) {
    if (!(error instanceof EngineError)) throw error;
    throw new ApiError(error.code === 'NOT_AVAILABLE' ? 'NOT_AVAILABLE' : 'BAD_USER_INPUT', error.message);
  }
  const first = evaluation.outside[0];
  if (request.outsideRange === 'REFUSE' && first !== undefined) {
    const { temperatureMinimum, temperatureMaximum, pressureMinimum, pressureMaximum } = correlation.validity;
    throw new ApiError(
      'OUT_OF_RANGE',
      `State ${first} lies outside the validity range: ${temperatureMinimum} K to ${temperatureMaximum} K, ${pressureMinimum} Pa to ${pressureMaximum} Pa.`,
    );
  }
  return evaluation;
}
