import { type CorrelationForm, type ReducedData, type ReferenceState } from './form.js';

/**
 * ∂ ln D/∂(ln D0, shape) at each state, column-major with one column for ln D0 and one for each shape parameter.
 *
 * @param shape at which the derivatives are taken; of no influence for linear forms
 */
export function lnDesign(
  form: CorrelationForm,
  shape: ArrayLike<number>,
  data: Pick<ReducedData, 'x' | 'p'>,
  reference: ReferenceState,
): Float64Array {
  const rows = data.x.length;
  const shapeCount = form.parameters.length - 1;
  const design = new Float64Array(rows * (shapeCount + 1)).fill(1, 0, rows);
  const gradient = new Float64Array(shapeCount);
  for (let i = 0; i < rows; i++) {
    form.lnRatioGradient(shape, data.x[i]!, data.p[i]!, reference, gradient);
    for (let k = 0; k < shapeCount; k++) design[(k + 1) * rows + i] = gradient[k]!;
  }
  return design;
}

/** ln D − ln h at the given shape: what ln D0 alone would have to explain. */
export function lnResidual(
  form: CorrelationForm,
  shape: ArrayLike<number>,
  data: ReducedData,
  reference: ReferenceState,
): Float64Array {
  const rows = data.x.length;
  const residuals = new Float64Array(rows);
  for (let i = 0; i < rows; i++) {
    residuals[i] = data.lnDiffusivity[i]! - form.lnRatio(shape, data.x[i]!, data.p[i]!, reference);
  }
  return residuals;
}
