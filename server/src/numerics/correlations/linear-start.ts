import { applyQTransposed, factorise, solveUpper } from '../linear-algebra/qr.js';
import { lnDesign, lnResidual } from './design.js';
import { type CorrelationForm, type ReducedData, type ReferenceState } from './form.js';

/** The shape that least squares with equal weights gives on ln D, for a form whose ln h is linear in the shape. */
export function linearStart(form: CorrelationForm, data: ReducedData, reference: ReferenceState): Float64Array {
  const origin = new Float64Array(form.parameters.length - 1);
  const right = lnResidual(form, origin, data, reference);
  const factors = factorise(lnDesign(form, origin, data, reference), right.length, form.parameters.length);
  applyQTransposed(factors, right);
  return solveUpper(factors, right).subarray(1);
}
