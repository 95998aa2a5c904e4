import { z } from 'zod';
import { ApiError } from '../common/api-error.js';
import { MOST_STATES, type EvaluationRequest } from '../fits/correlation-evaluation.js';

// Checked in one pass: a schema for each of 10,000 numbers would cost more than evaluating them.
const column = z.custom<number[]>(
  (value) => Array.isArray(value) && value.length > 0 && value.length <= MOST_STATES && value.every(Number.isFinite),
  `1 to ${MOST_STATES} finite numbers are expected`,
);

const schema = z.strictObject({
  temperatures: column,
  pressures: column,
  coverage: z.number().gt(0).lt(1).default(0.95),
  kind: z.enum(['MEAN', 'NEW_SERIES']).default('MEAN'),
  outsideRange: z.enum(['FLAG', 'REFUSE']).default('FLAG'),
});

/**
 * Reads the body of an evaluation: columns in K and Pa, and the choices of `Correlation.evaluate`.
 *
 * @throws {ApiError} BAD_USER_INPUT naming the member that does not fit
 */
export function readEvaluationRequest(body: unknown): EvaluationRequest {
  const read = schema.safeParse(body);
  if (!read.success) {
    const [issue] = read.error.issues;
    const path = issue?.path.join('.') ?? '';
    throw new ApiError('BAD_USER_INPUT', `${path === '' ? 'body' : path}: ${issue?.message ?? 'is not valid'}`);
  }
  const { temperatures, pressures, ...choices } = read.data;
  return { ...choices, temperatures: Float64Array.from(temperatures), pressures: Float64Array.from(pressures) };
}
