import { quadraticForm } from './matrices.js';

/**
 * Leverages (hat values) of the rows of a weighted design: w xᵀ (XᵀWX)⁻¹ x.
 *
 * @param design             column-major rows×columns
 * @param unscaledCovariance (XᵀWX)⁻¹
 */
export function leverages(design: Float64Array, weights: Float64Array, unscaledCovariance: number[][]): Float64Array {
  const rows = weights.length;
  const row = new Float64Array(unscaledCovariance.length);
  return weights.map((weight, i) => {
    for (let k = 0; k < row.length; k++) row[k] = design[k * rows + i]!;
    return weight * quadraticForm(unscaledCovariance, row);
  });
}
